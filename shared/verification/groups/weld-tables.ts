import { weldGroup, type WeldGroup, type WeldSegment } from '../../engine/groups/weld-group.ts';
import { weldGroupIc } from '../../engine/groups/weld-group-ic.ts';
import { mixedGroup } from '../../engine/standards/aisc-360-2022/fillet-weld.ts';
import { type Check, rounding, threeFigures } from '../check.ts';
import { channel, channelInMiddle, pair } from './weld-table-rows.ts';

/** Longitudinal strength of a sixteenth of leg in E70, kip/in: 0.60 · 70 · 0.7071/16. */
const SIXTEENTH = (0.6 * 70 * Math.SQRT1_2) / 16;
/** LRFD, in the older tables' entries. */
const PHI = 0.75;

const line = (x0: number, y0: number, x1: number, y1: number): WeldSegment => ({
  from: { x: x0, y: y0 },
  to: { x: x1, y: y1 },
});

/** A C of welds: its line of length `l` at the left, two of `k` towards the load. */
export const channelOf = (k: number, l = 1): WeldGroup =>
  weldGroup([line(0, 0, 0, l), line(0, 0, k, 0), line(0, l, k, l)]);
const pairOf = (k: number): WeldGroup => weldGroup([line(0, 0, 0, 1), line(k, 0, k, 1)]);

/** C for a load along the long line, `a` lengths from the centroid. */
function coefficient(group: WeldGroup, a: number): number {
  const found = weldGroupIc(group, { fx: 0, fy: 1, moment: group.centroid.x + a });
  if (!found.ok) throw new Error(found.reason);
  return SIXTEENTH * found.multiplier;
}

/** Table 8-8. */
export const ofChannel = (a: number, k: number): number => coefficient(channelOf(k), a);
/** Table 8-38. */
export const ofPair = (a: number, k: number): number => PHI * coefficient(pairOf(k), a);

const common = {
  basis: 'aisc-360-2022-lrfd',
  clause: 'Manual Part 8, instantaneous centre',
  evidence: 'found in text',
  unit: 'kip/in',
} as const;
const table88 = 'AISC Steel Construction Manual, 13th/14th editions, Table 8-8, C of welds';

/** Eccentric weld groups against published tables. */
export const weldTables: readonly Check[] = [
  ...channelInMiddle.map(([k, C]): Check => ({
    ...common,
    id: `IC-88-0-${k}`,
    clause: 'J2.4(b)',
    source: table88,
    inputs: `k ${k}, loaded through the middle, a sixteenth of leg, E70, nominal`,
    published: threeFigures(C),
    roundedFirst: rounding('a sixteenth of leg', 1.856, SIXTEENTH),
    ours: () => mixedGroup(SIXTEENTH, 2 * k * SIXTEENTH),
  })),
  ...channel.map(([a, k, C]): Check => ({
    ...common,
    id: `IC-88-${a}-${k}`,
    source: table88,
    inputs: `k ${k}, a ${a}, a sixteenth of leg, E70, nominal`,
    published: threeFigures(C),
    ours: () => ofChannel(a, k),
  })),
  ...pair.map(([a, k, C]): Check => ({
    ...common,
    id: `IC-838-${a}-${k}`,
    source: 'AISC LRFD Metric Manual, 2nd edition, Table 8-38, two lines of weld',
    inputs: `k ${k}, a ${a}, a sixteenth of leg, E70, with φ ${PHI}`,
    published: threeFigures(C),
    ours: () => ofPair(a, k),
  })),
];
