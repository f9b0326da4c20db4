import type { BoltSizeRecord, MissingValue } from '../types.ts';

/** d, pitch, A_s, across flats, across corners, holes normal [en sans csa aisc], holes oversize [en sans csa aisc]. */
type Holes = readonly [number | null, number | null, number | null, number | null];
type Row = readonly [number, number, number, number, number, Holes, Holes];

const rows: readonly Row[] = [
  [12, 1.75, 84.3, 18, 19.85, [13, 14, 14, 14], [15, 16, 16, 16]],
  [14, 2, 115, 21, 22.78, [15, 16, 16, null], [17, 18, 18, null]],
  [16, 2, 157, 24, 26.17, [18, 18, 18, 18], [20, 20, 20, 20]],
  [18, 2.5, 192, 27, 29.56, [20, 20, 20, null], [22, 22, 22, null]],
  [20, 2.5, 245, 30, 32.95, [22, 22, 22, 22], [24, 24, 24, 24]],
  [22, 2.5, 303, 34, 37.29, [24, 24, 24, 24], [26, 26, 26, 28]],
  [24, 3, 353, 36, 39.55, [26, 26, 26, 27], [30, 30, 30, 30]],
  [27, 3, 459, 41, 45.2, [30, 30, 29, 30], [35, 35, 35, 35]],
  [30, 3.5, 561, 46, 50.85, [33, 33, 32, 33], [38, 38, 38, 38]],
  [33, 3.5, 694, 50, 55.37, [36, 36, 35, null], [41, 41, 41, null]],
  [36, 4, 817, 55, 60.79, [39, 39, 38, 39], [44, 44, 44, 44]],
];

const source =
  'Thread and A_s: ISO 898-1 and ISO 724. Head: ISO 4014, product grade B. ' +
  'Holes: EN 1090-2 Table 11 (en); SANS 2001-CS1 practice, d + 2, d + 3 from M27 (sans); ' +
  'CSA S16 22.3.5, d + 2 (csa); ANSI/AISC 360 Table J3.3M (aisc). Oversize in sans and csa: d + 4 to M22, d + 6 M24, d + 8 above.';
const edition =
  'ISO 898-1:2013; ISO 4014:2011; EN 1090-2:2018; SANS 2001-CS1:2005; CSA S16:19; ANSI/AISC 360-22';
const evidence =
  'A_s from memory, confirmed within 0.5 % by pi/4 (d - 0.9382 P)^2; AISC holes read in the standard; ' +
  'heads and other holes from memory, across corners confirmed as 1.13 times the least width across flats';

const noAiscSize = 'ANSI/AISC 360 Table J3.3M does not list this size';

function record([d, pitch, As, headAcrossFlats, headAcrossCorners, normal, oversize]: Row): BoltSizeRecord {
  const missing: MissingValue[] = [];
  if (normal[3] === null) missing.push({ field: 'holes.normal.aisc', reason: noAiscSize });
  if (oversize[3] === null) missing.push({ field: 'holes.oversize.aisc', reason: noAiscSize });
  return {
    name: `M${d}`,
    d,
    pitch,
    As,
    headAcrossFlats,
    headAcrossCorners,
    holes: { normal: byPractice(normal), oversize: byPractice(oversize) },
    source,
    edition,
    evidence,
    missing,
  };
}

function byPractice([en, sans, csa, aisc]: Holes) {
  return { en, sans, csa, aisc };
}

/** Metric bolts M12 to M36. mm, mm2. */
export const metricBolts: readonly BoltSizeRecord[] = rows.map(record);
