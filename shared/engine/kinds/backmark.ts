/** Heel to the only line of bolts, by leg length, mm: common practice of the United Kingdom (from memory). */
const oneLine: readonly (readonly [leg: number, mark: number])[] = [
  [40, 23],
  [45, 25],
  [50, 28],
  [60, 35],
  [65, 35],
  [70, 40],
  [75, 45],
  [80, 45],
  [90, 50],
  [100, 55],
];
/** Heel to the first of two lines, by leg length, mm: common practice of the United Kingdom (from memory). */
const twoLines: readonly (readonly [leg: number, mark: number])[] = [
  [125, 45],
  [150, 55],
  [200, 75],
];

/**
 * The usual back mark of a leg, mm. Legs between the rows take the next shorter row; above the table one line
 * stands 0.55 and the first of two lines 0.37 of the leg from the heel; below it 0.57.
 */
export function usualBackmark(leg: number, lines: number): number {
  const table = lines === 1 ? oneLine : twoLines;
  const last = table.at(-1);
  if (last !== undefined && leg > last[0]) return Math.round(leg * (lines === 1 ? 0.55 : 0.37));
  const row = table.findLast(([size]) => size <= leg);
  return row === undefined ? Math.round(leg * (lines === 1 ? 0.57 : 0.37)) : row[1];
}
