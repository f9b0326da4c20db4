import { weldGroup, type WeldSegment } from '../../engine/groups/weld-group.ts';
import { worstElasticWeld } from '../../engine/groups/weld-group-elastic.ts';
import { weldGroupIc } from '../../engine/groups/weld-group-ic.ts';
import { type Check, printed, rounding, threeFigures } from '../check.ts';
import { channel, pair } from './weld-table-rows.ts';

/** Longitudinal strength of a sixteenth of leg in E70, kip/in: 0.60 · 70 · 0.7071/16. */
const SIXTEENTH = (0.6 * 70 * Math.SQRT1_2) / 16;

const line = (x0: number, y0: number, x1: number, y1: number): WeldSegment => ({
  from: { x: x0, y: y0 },
  to: { x: x1, y: y1 },
});

/** A C of welds, its long line of length 1 at the left, its short ones towards the load. */
const channelOf = (k: number) =>
  weldGroup([line(0, 0, 0, 1), ...(k > 0 ? [line(0, 0, k, 0), line(0, 1, k, 1)] : [])]);
const pairOf = (k: number) => weldGroup([line(0, 0, 0, 1), line(k, 0, k, 1)]);

/** C for a load along the long line, `a` lengths from the centroid. */
function coefficient(group: ReturnType<typeof weldGroup>, a: number): number {
  const found = weldGroupIc(group, { fx: 0, fy: 1, moment: group.centroid.x + a });
  if (!found.ok) throw new Error(found.reason);
  return SIXTEENTH * found.multiplier;
}

const common = {
  basis: 'aisc-360-2022-lrfd',
  clause: 'Manual Part 8, instantaneous centre',
  unit: 'kip/in',
} as const;

const tables: readonly Check[] = [
  ...channel.map(([a, k, C]): Check => ({
    ...common,
    id: `IC-88-${a}-${k}`,
    source: 'AISC Steel Construction Manual, 13th/14th editions, Table 8-8, C of welds',
    evidence: 'found in text',
    inputs: `k ${k}, a ${a}, a sixteenth of leg, E70, nominal`,
    published: threeFigures(C),
    ours: () => coefficient(channelOf(k), a),
  })),
  ...pair.map(([a, k, C]): Check => ({
    ...common,
    id: `IC-838-${a}-${k}`,
    source: 'AISC LRFD Metric Manual, 2nd edition, Table 8-38, two lines of weld',
    evidence: 'found in text',
    inputs: `k ${k}, a ${a}, a sixteenth of leg, E70, with φ 0.75`,
    published: threeFigures(C),
    ours: () => 0.75 * coefficient(pairOf(k), a),
  })),
];

/** The C of Example II.A-27: 10 in and twice 5 in, load 8.75 in from the centroid, elastic. */
const example = weldGroup([line(0, 0, 0, 10), line(0, 0, 5, 0), line(0, 10, 5, 10)]);
const elastic = (id: string, inputs: string, published: string, unit: string, ours: () => number): Check => ({
  basis: 'aisc-360-2022-lrfd',
  clause: 'Manual Part 8, elastic method',
  source:
    'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, Version 16.0, Example II.A-27',
  evidence: 'found in text',
  id,
  inputs,
  published: printed(published),
  unit,
  ours,
});

/** Eccentric weld groups against published tables and a worked example. */
export const weldTables: readonly Check[] = [
  ...tables,
  elastic('EL-IIA27-Ix', 'C 10 × 5 in', '333', 'in³', () => example.ix),
  elastic('EL-IIA27-Iy', 'C 10 × 5 in', '52.1', 'in³', () => example.iy),
  elastic('EL-IIA27-Ip', 'C 10 × 5 in', '385', 'in³', () => example.ip),
  {
    ...elastic('EL-IIA27-f', 'C 10 × 5 in, load 8.75 in from the centroid', '0.177', '1/in', () =>
      worstElasticWeld(example, { fx: 0, fy: 1, moment: example.centroid.x + 8.75 }),
    ),
    roundedFirst: rounding('I_p', 385, 385.417),
  },
];
