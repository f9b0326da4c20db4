import type { Dimension } from './dimensions.ts';

/** Measures of the table on the screen, px. */
export const ROW = 32;
export const COLUMN = 104;
export const HEAD_LINE = 30;
export const HEAD = HEAD_LINE + 52;
const LETTER = 8;

/** The width of a heading column: as wide as its longest title, within reason. */
export function headWidth({ titles, label }: Pick<Dimension, 'titles' | 'label'>): number {
  const longest = titles.reduce((most, { length }) => Math.max(most, length), 0);
  // A label breaks over two lines, so half of it must fit.
  const words = Math.max(longest, Math.ceil(label.length / 2) + 1);
  return Math.min(180, Math.max(72, words * LETTER + 20));
}

/** Where each heading column starts, and how wide all are together. */
export function headColumns(down: readonly Dimension[]) {
  let left = 0;
  const columns = down.map((dimension) => {
    const column = { dimension, left, width: headWidth(dimension) };
    left += column.width;
    return column;
  });
  return { columns, width: left };
}
