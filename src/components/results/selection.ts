import type { Table } from './layout.ts';

export interface Spot {
  readonly row: number;
  readonly column: number;
}

/** A block of cells between two corners; they may be the same cell. */
export interface Selection {
  readonly anchor: Spot;
  readonly focus: Spot;
}

export interface Bounds {
  readonly top: number;
  readonly bottom: number;
  readonly left: number;
  readonly right: number;
}

export const boundsOfSelection = ({ anchor, focus }: Selection): Bounds => ({
  top: Math.min(anchor.row, focus.row),
  bottom: Math.max(anchor.row, focus.row),
  left: Math.min(anchor.column, focus.column),
  right: Math.max(anchor.column, focus.column),
});

export const isOneCell = ({ anchor, focus }: Selection): boolean =>
  anchor.row === focus.row && anchor.column === focus.column;

export const wholeTable = (table: Table): Bounds => ({
  top: 0,
  bottom: table.rows - 1,
  left: 0,
  right: table.columns - 1,
});

/** Where a key leads from a cell, or null for a key that does not move. */
export function moved(from: Spot, key: string, control: boolean, table: Table, page: number): Spot | null {
  const last = { row: table.rows - 1, column: table.columns - 1 };
  const steps: Record<string, Spot> = {
    ArrowUp: { row: control ? 0 : from.row - 1, column: from.column },
    ArrowDown: { row: control ? last.row : from.row + 1, column: from.column },
    ArrowLeft: { row: from.row, column: control ? 0 : from.column - 1 },
    ArrowRight: { row: from.row, column: control ? last.column : from.column + 1 },
    Home: { row: control ? 0 : from.row, column: 0 },
    End: { row: control ? last.row : from.row, column: last.column },
    PageUp: { row: from.row - page, column: from.column },
    PageDown: { row: from.row + page, column: from.column },
  };
  const to = steps[key];
  if (!to) return null;
  const within = (value: number, most: number) => Math.min(most, Math.max(0, value));
  return { row: within(to.row, last.row), column: within(to.column, last.column) };
}

const heading = ({ label, unit }: { label: string; unit: string }) => (unit ? `${label} (${unit})` : label);
/** No tab or line end inside a value. */
const plain = (text: string) => text.replace(/[\t\r\n]+/g, ' ').replace(/\u202f/g, '');

/**
 * Cells with their headings as tab-separated text, ready for a spreadsheet.
 * @param caption what the numbers are, with their unit
 * @param textOf capacity as plain digits, or the mark of a rejected cell
 */
export function tsvOf(
  table: Table,
  { top, bottom, left, right }: Bounds,
  caption: string,
  textOf: (row: number, column: number) => string,
): string {
  const columns = Array.from({ length: right - left + 1 }, (_, at) => left + at);
  const blank = table.down.slice(1).map(() => '');
  const lines = [[caption]];
  if (table.across.name) lines.push([...blank, '', heading(table.across)]);
  lines.push([
    ...table.down.map(heading),
    ...columns.map((column) => table.across.titles[column] || heading(table.across)),
  ]);
  for (let row = top; row <= bottom; row++)
    lines.push([...table.rowTitles(row), ...columns.map((column) => textOf(row, column))]);
  return lines.map((line) => line.map(plain).join('\t')).join('\n');
}
