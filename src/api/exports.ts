import { exportListResponse, type exportRequest } from '@shared/contracts/exports.ts';
import type { z } from 'zod';
import { call, get } from './http.ts';

export const fetchExports = (signal?: AbortSignal) =>
  get(exportListResponse, '/api/exports', signal ? { signal } : {}).then(({ exports }) => exports);

/** The name that the server gives the file: `filename*` of RFC 6266 first, then `filename`. */
function fileName(disposition: string | null): string {
  const extended = /filename\*=UTF-8''([^;]+)/i.exec(disposition ?? '')?.[1];
  if (extended) return decodeURIComponent(extended);
  return /filename="?([^";]+)"?/i.exec(disposition ?? '')?.[1] ?? 'table.xlsx';
}

/** Makes a table, enters it in the register, and hands back the file. */
export async function makeExport(body: z.input<typeof exportRequest>): Promise<{ name: string; file: Blob }> {
  const response = await call('POST', '/api/exports', { body });
  return { name: fileName(response.headers.get('content-disposition')), file: await response.blob() };
}

/** Gives a file to the browser to keep. */
export function saveFile({ name, file }: { name: string; file: Blob }): void {
  const address = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
