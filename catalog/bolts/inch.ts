import type { BoltSizeRecord } from '../types.ts';

const INCH = 25.4;

/** Name, d, threads an inch, A_s in2, across flats, least across corners, normal and oversize hole of AISC; inches. */
type Row = readonly [string, number, number, number, number, number, number, number];

const rows: readonly Row[] = [
  ['1/2 in', 1 / 2, 13, 0.142, 7 / 8, 0.969, 9 / 16, 5 / 8],
  ['5/8 in', 5 / 8, 11, 0.226, 17 / 16, 1.175, 11 / 16, 13 / 16],
  ['3/4 in', 3 / 4, 10, 0.334, 5 / 4, 1.383, 13 / 16, 15 / 16],
  ['7/8 in', 7 / 8, 9, 0.462, 23 / 16, 1.589, 15 / 16, 17 / 16],
  ['1 in', 1, 8, 0.606, 13 / 8, 1.796, 9 / 8, 5 / 4],
  ['1-1/8 in', 9 / 8, 7, 0.763, 29 / 16, 2.002, 5 / 4, 23 / 16],
  ['1-1/4 in', 5 / 4, 7, 0.969, 2, 2.209, 11 / 8, 25 / 16],
  ['1-1/2 in', 3 / 2, 6, 1.41, 19 / 8, 2.622, 13 / 8, 29 / 16],
];

const source =
  'Thread and A_s: ASME B1.1, coarse series. Head: ASME B18.2.6, heavy hex. ' +
  'Holes: ANSI/AISC 360 Table J3.3 (aisc); CSA S16 22.3.5, d + 2 mm (csa).';
const edition = 'ASME B1.1-2019; ASME B18.2.6-2019; ANSI/AISC 360-22; CSA S16:19';
const evidence =
  'from memory; A_s confirmed within 1 % by pi/4 (d - 0.9743/n)^2, across corners as 1.10 times the width across flats; converted from inches';

const reason = (standard: string) =>
  `${standard} does not list inch sizes; its rule for the diameter is used`;
const missing = [
  { field: 'holes.normal.en', reason: reason('EN 1090-2') },
  { field: 'holes.normal.sans', reason: reason('SANS 2001-CS1') },
  { field: 'holes.oversize.en', reason: reason('EN 1090-2') },
  { field: 'holes.oversize.sans', reason: reason('SANS 2001-CS1') },
  { field: 'holes.oversize.csa', reason: 'CSA S16 22.3.5 gives oversize holes for metric sizes' },
];

/** To a hundredth of a millimetre. */
const mm = (inches: number): number => Math.round(inches * INCH * 100) / 100;

function record([name, d, threads, As, flats, corners, normal, oversize]: Row): BoltSizeRecord {
  return {
    name,
    d: Math.round(d * INCH * 1000) / 1000,
    pitch: mm(1 / threads),
    As: Math.round(As * INCH * INCH * 10) / 10,
    headAcrossFlats: mm(flats),
    headAcrossCorners: mm(corners),
    holes: {
      normal: { en: null, sans: null, csa: mm(d) + 2, aisc: mm(normal) },
      oversize: { en: null, sans: null, csa: null, aisc: mm(oversize) },
    },
    source,
    edition,
    evidence,
    missing,
  };
}

/** Inch bolts 1/2 in to 1-1/2 in. mm, mm2. */
export const inchBolts: readonly BoltSizeRecord[] = rows.map(record);
