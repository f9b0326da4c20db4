import { boltGroup, boltPattern } from '../../engine/groups/bolt-group.ts';
import { type BoltIcOptions, type BoltIcSolution, boltGroupIc } from '../../engine/groups/bolt-group-ic.ts';
import type { GroupLoad } from '../../engine/groups/group-load.ts';
import { type Check, printed, type Printed, threeFigures } from '../check.ts';
import { type BoltEntry, momentAlone, oneLine, twoLines } from './bolt-table-rows.ts';

/** Bolts of `lines` of `n`, `pitch` apart along the lines and `gauge` across. */
export interface Bolts {
  readonly n: number;
  readonly lines: number;
  readonly pitch: number;
  readonly gauge: number;
}

/** @throws when the engine finds no centre */
export function solve(bolts: Bolts, load: GroupLoad, options: BoltIcOptions = {}): BoltIcSolution {
  const { n, lines, pitch, gauge } = bolts;
  const found = boltGroupIc(boltGroup(boltPattern(n, lines, pitch, gauge)), load, options);
  if (!found.ok) throw new Error(found.reason);
  return found;
}

/** Coefficient for a load at `degrees` from the lines, `ex` across them from the middle. */
export function coefficient(bolts: Bolts, ex: number, degrees = 0): number {
  const angle = (degrees * Math.PI) / 180;
  const [fx, fy] = [Math.sin(angle), Math.cos(angle)];
  return solve(bolts, { fx, fy, moment: ex * fy }).multiplier;
}

/** Table 7-6: one line of bolts at 3 in. */
export const inOneLine = (n: number): Bolts => ({ n, lines: 1, pitch: 3, gauge: 0 });
/** Table 7-7: two lines 3 in apart, bolts at 3 in. */
export const inTwoLines = (n: number): Bolts => ({ n, lines: 2, pitch: 3, gauge: 3 });

/** The tables print three figures, and two decimals below 1. */
export function printedCoefficient(C: number): Printed {
  return C < 1 ? printed(C.toFixed(2)) : threeFigures(C);
}

const common = {
  basis: 'aisc-360-2022-lrfd',
  clause: 'Manual Part 7, instantaneous centre',
  evidence: 'from memory',
} as const;
const table = (name: string) => `AISC Steel Construction Manual, 13th to 16th editions, ${name}`;

const entries = (
  id: string,
  name: string,
  rows: readonly BoltEntry[],
  bolts: (n: number) => Bolts,
  lines: string,
) =>
  rows.map(([ex, n, C]): Check => ({
    ...common,
    id: `${id}-${ex}-${n}`,
    source: table(name),
    inputs: `${lines} ${n} bolts at 3 in, e_x ${ex} in`,
    published: printedCoefficient(C),
    unit: '',
    ours: () => coefficient(bolts(n), ex),
  }));

/** Eccentric bolt groups against published tables. */
export const boltTables: readonly Check[] = [
  ...entries('IC-76', 'Table 7-6', oneLine, inOneLine, 'a line of'),
  ...entries('IC-77', 'Table 7-7', twoLines, inTwoLines, 'two lines 3 in apart of'),
  ...momentAlone.map(([n, C]): Check => ({
    ...common,
    id: `IC-76-M-${n}`,
    source: table("Table 7-6, C'"),
    inputs: `a line of ${n} bolts at 3 in, moment alone`,
    published: threeFigures(C),
    unit: 'in',
    ours: () => solve(inOneLine(n), { fx: 0, fy: 0, moment: 1 }).multiplier,
  })),
];
