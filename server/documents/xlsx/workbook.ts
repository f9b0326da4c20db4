import { PassThrough } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import ExcelJS from 'exceljs';
import { writeBasisSheet, writeLegendSheet } from './reference-sheets.ts';
import { writeTableSheet } from './table-sheet.ts';
import type { TableDocument } from './types.ts';

/**
 * A workbook of tables, whole: nothing is handed on until its last row is written. Rows are packed as they come, so
 * that only the packed file is held.
 */
export async function writeWorkbook(document: TableDocument): Promise<Buffer> {
  const stream = new PassThrough();
  const file = buffer(stream);
  const workbook = new ExcelJS.stream.xlsx.WorkbookWriter({
    stream,
    useStyles: true,
    useSharedStrings: true,
  });
  Object.assign(workbook, {
    creator: 'Backmark',
    lastModifiedBy: 'Backmark',
    created: document.created,
    modified: document.created,
  });
  try {
    for (const sheet of document.sheets) await writeTableSheet(workbook, document, sheet);
    writeLegendSheet(workbook, document);
    writeBasisSheet(workbook, document);
    await workbook.commit();
  } catch (error) {
    stream.destroy();
    await file.catch(() => undefined);
    throw error;
  }
  return file;
}
