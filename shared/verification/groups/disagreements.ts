import type { Disagreement } from '../check.ts';
import { oneLineBeyond } from './bolt-table-rows.ts';
import { channelBeyond, pairBeyond } from './weld-table-rows.ts';

type Entry = readonly [first: number, second: number, C: number];
const list = (entries: readonly Entry[], names: readonly [string, string]): string =>
  entries.map(([one, other, C]) => `${C} (${names[0]} ${one}, ${names[1]} ${other})`).join(', ');

/** Entries and steps of published group analyses that the engine does not give. */
export const groupDisagreements: readonly Disagreement[] = [
  {
    id: 'IC-76-beyond',
    published: `${list(oneLineBeyond, ['e_x', 'n'])}: AISC Manual Table 7-6, from memory`,
    reason:
      'The exact coefficients end in 49 (2.2249, 9.2049, 2.9549, 2.5849) and so round to one unit less: the tables were made with a search that stops early.',
  },
  {
    id: 'IC-88-beyond',
    published: `${list(channelBeyond, ['a', 'k'])}: AISC Manual Table 8-8`,
    reason:
      'Beyond rounding by a tenth of a unit at most. Lines cut into 120 pieces, each taken at its middle, give them and miss a dozen others; here the very end of a line is the first to reach its greatest deformation, which errs low by up to 0.06 %.',
  },
  {
    id: 'IC-88-0-0.7',
    published: '5.47, k 0.7 loaded through the middle: AISC Manual Table 8-8',
    reason: 'By J2.4(b) it is (0.85 + 1.5 · 1.4) · 1.8562 = 5.4757 kip/in, which rounds to 5.48.',
  },
  {
    id: 'IC-838-beyond',
    published: `${list(pairBeyond, ['a', 'k'])}: AISC LRFD Metric Manual, 2nd edition, Table 8-38`,
    reason:
      'The first four, 2.78, are 2 · 1.392 kip/in, the strength without eccentricity, at which the table stops; the exact coefficients are 2.786 to 2.795. The others are beyond rounding by a tenth of a unit at most.',
  },
  {
    id: 'IC-A17B',
    published: '4.07, five bolts at 3 in, between e_x 2 and 3 in, load at 30° (Design Examples, II.A-17B)',
    reason: 'Between 4.295 and 3.828 lies 4.06; the exact coefficient at 2.5 in is 4.06 too.',
  },
  {
    id: 'IC-ECC1-r0',
    published: 'r_0 36.4 mm and 215.2 kN in the inner bolts (course notes to CSA S16, example ECCENT-1)',
    reason:
      'The trial of the notes stops at 36.4 mm; forces and moment balance at 36.33 mm, with 215.1 kN. The load, 567 kN, is the same.',
  },
];
