import { createHash } from 'node:crypto';
import ExcelJS from 'exceljs';
import type { Response } from 'supertest';
import type { Agent } from '../harness.ts';

/** The answer to a request for a table, its body as bytes. */
export function askForTable(agent: Agent, body: object) {
  return agent
    .post('/api/exports')
    .send(body)
    .buffer(true)
    .parse((res, done) => {
      const chunks: Buffer[] = [];
      res.on('data', (chunk: Buffer) => chunks.push(chunk));
      res.on('end', () => done(null, Buffer.concat(chunks)));
    });
}

export const sha256 = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

/** The problem in an answer whose body was read as bytes. */
export const problemIn = (response: Response): unknown =>
  JSON.parse((response.body as Buffer).toString('utf8'));

export async function readWorkbook(bytes: Buffer): Promise<ExcelJS.Workbook> {
  const workbook = new ExcelJS.Workbook();
  await workbook.xlsx.load(bytes as never);
  return workbook;
}

/** Every text of a sheet's first column. */
export function firstColumn(sheet: ExcelJS.Worksheet): string[] {
  const texts: string[] = [];
  sheet.eachRow((row) => void texts.push(String(row.getCell(1).value ?? '')));
  return texts;
}

/** The row under the header whose first cell is this title. */
export function rowUnder(sheet: ExcelJS.Worksheet, title: string): number {
  for (let row = 1; row <= sheet.rowCount; row++) {
    if (sheet.getCell(row, 1).value === title) return row + 1;
  }
  throw new Error(`No header "${title}"`);
}
