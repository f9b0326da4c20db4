import type { stream } from 'exceljs';
import { BOLD, LARGE, LOUD, pageOf } from './page.ts';
import { SheetWriter } from './sheet-writer.ts';
import type { HeaderValue, TableCell, TableDocument, TableSheet } from './types.ts';

const LABEL_WIDTH = 16;
const CAPACITY_WIDTH = 9;
const CODE_WIDTH = 4.5;
/** What a rejected cell says in the place of its capacity. */
export const NOT_PERMITTED_TEXT = 'n/p';

/** The title block, line by line. */
function titleBlock(document: TableDocument, sheet: TableSheet) {
  const { warning, firm, heading, titleLines } = document;
  return [
    ...(warning ? [[warning, LOUD] as const] : []),
    [firm, BOLD] as const,
    [heading, LARGE] as const,
    ...titleLines.map((line) => [line] as const),
    [sheet.holds.join('   ')] as const,
  ];
}

const pairOf = (cell: TableCell): [HeaderValue, HeaderValue] =>
  cell.capacity === null ? [NOT_PERMITTED_TEXT, cell.rule] : [cell.capacity, cell.code];

/** Writes one sheet: title block, header, capacities with what governs, and the rules that reject cells of it. */
export async function writeTableSheet(
  workbook: stream.xlsx.WorkbookWriter,
  document: TableDocument,
  sheet: TableSheet,
): Promise<void> {
  const { down, across } = sheet;
  const title = titleBlock(document, sheet);
  const frozen = { rows: title.length + 2, columns: down.length };
  const writer = new SheetWriter(workbook.addWorksheet(sheet.name, pageOf(document, frozen)));
  writer.widths([
    ...down.map(() => LABEL_WIDTH),
    ...across.values.flatMap(() => [CAPACITY_WIDTH, CODE_WIDTH]),
  ]);
  for (const [text, font] of title) writer.line(text, font);
  const beside = down.slice(1).map(() => null);
  writer.row(['Capacity in kN', ...beside, across.title], BOLD);
  writer.row([...down, ...across.values.flatMap((value) => [value, 'by'])], BOLD);
  const rules = await writeRows(writer, document, sheet);
  writeBelow(writer, document, rules);
  writer.end();
}

/** The numbers of the rules that reject a cell of this sheet. */
async function writeRows(
  writer: SheetWriter,
  document: TableDocument,
  sheet: TableSheet,
): Promise<Set<number>> {
  const rules = new Set<number>();
  const format = document.decimals > 0 ? `0.${'0'.repeat(document.decimals)}` : '0';
  for await (const row of sheet.rows()) {
    for (const cell of row.cells) if (cell.capacity === null) rules.add(cell.rule);
    writer.cells(row.labels, row.cells.map(pairOf), format);
  }
  return rules;
}

function writeBelow(
  writer: SheetWriter,
  { rules, cautions }: TableDocument,
  used: ReadonlySet<number>,
): void {
  writer.line('');
  if (used.size > 0) writer.line(`${NOT_PERMITTED_TEXT}: not permitted, by the rule of that number`, BOLD);
  for (const { number, title, clause } of rules) {
    if (used.has(number)) writer.line(`${number}  ${title}${clause && ` (${clause})`}`);
  }
  if (used.size > 0) writer.line('');
  for (const caution of cautions) writer.line(caution);
}
