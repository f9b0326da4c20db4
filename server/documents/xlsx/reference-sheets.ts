import type { stream } from 'exceljs';
import { BOLD, LARGE, LOUD, pageOf } from './page.ts';
import { SheetWriter } from './sheet-writer.ts';
import type { TableDocument } from './types.ts';

const flowing = { rows: 0, columns: 0 };

function begin(workbook: stream.xlsx.WorkbookWriter, document: TableDocument, name: string): SheetWriter {
  const writer = new SheetWriter(workbook.addWorksheet(name, pageOf(document, flowing)));
  writer.widths([44, 44, 40]);
  if (document.warning) writer.line(document.warning, LOUD);
  writer.line(`${document.heading}: ${name.toLowerCase()}`, LARGE);
  return writer;
}

/** What the codes and the numbers of the tables mean. */
export function writeLegendSheet(workbook: stream.xlsx.WorkbookWriter, document: TableDocument): void {
  const writer = begin(workbook, document, 'Legend');
  writer.row(['Code', 'Limit state', 'Clause'], BOLD);
  for (const { code, title, clause } of document.limitStates) writer.row([code, title, clause]);
  writer.line('');
  writer.row(['Rule', 'n/p: a cell that the rule of this number does not permit', 'Clause'], BOLD);
  for (const { number, title, clause } of document.rules) writer.row([number, title, clause]);
  writer.end();
}

/** Cautions first, then what was assumed, and what the tables were made of. */
export function writeBasisSheet(workbook: stream.xlsx.WorkbookWriter, document: TableDocument): void {
  const writer = begin(workbook, document, 'Basis and cautions');
  writer.line('Cautions', BOLD);
  for (const caution of document.cautions) writer.line(caution);
  writer.line('');
  writer.line('Notes', BOLD);
  for (const note of document.notes) writer.line(note);
  writer.line('');
  writer.row(['What the tables were made of', 'Value', 'Unit'], BOLD);
  for (const [name, value, unit] of document.facts) writer.row([name, value, unit]);
  writer.end();
}
