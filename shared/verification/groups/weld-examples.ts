import { worstElasticWeld } from '../../engine/groups/weld-group-elastic.ts';
import { type Check, printed, rounding, threeFigures } from '../check.ts';
import { channelOf, ofChannel } from './weld-tables.ts';

const common = {
  basis: 'aisc-360-2022-lrfd',
  evidence: 'found in text',
} as const;
const companion = 'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, Version 16.0';

/** An entry of Table 8-8 as it is printed: three figures. */
function entry(a: number, k: number): number {
  const exact = ofChannel(a, k);
  const { place } = threeFigures(exact);
  return Math.round(exact / place) * place;
}

/** What a reader finds between the entries at a multiple of 0.1 and the next, both ways. */
function between(a: number, k: number): number {
  const [a0, k0] = [Math.floor(a * 10) / 10, Math.floor(k * 10) / 10];
  const [u, v] = [(a - a0) * 10, (k - k0) * 10];
  const along = (at: number) => (u === 0 ? entry(a0, at) : (1 - u) * entry(a0, at) + u * entry(a0 + 0.1, at));
  return v === 0 ? along(k0) : (1 - v) * along(k0) + v * along(k0 + 0.1);
}

const coefficient = (id: string, example: string, a: number, k: number, text: string): Check => ({
  ...common,
  id,
  clause: 'Manual Part 8, instantaneous centre',
  source: `${companion}, Example ${example}`,
  inputs: `Table 8-8 between its entries, k ${k}, a ${a}`,
  published: printed(text),
  unit: 'kip/in',
  ours: () => between(a, k),
});

/** The C of Example II.A-27: 10 in and twice 5 in, load 8.75 in from the centroid, elastic. */
const group = channelOf(5, 10);
const perInch = () => worstElasticWeld(group, { fx: 0, fy: 1, moment: group.centroid.x + 8.75 });
/** By hand: √((8.75 · 5/385.42)² + (1/20 + 8.75 · 3.75/385.42)²) = √(0.11351² + 0.13513²) = 0.17648. */
const chain = rounding('the resultant for a load of 1', 0.177, 0.17648);
const elastic = (id: string, inputs: string, text: string, unit: string, ours: () => number): Check => ({
  ...common,
  id,
  clause: 'Manual Part 8, elastic method',
  source: `${companion}, Example II.A-27`,
  inputs,
  published: printed(text),
  unit,
  ours,
});
const loaded = 'C 10 × 5 in, load 8.75 in from the centroid';

/** Eccentric weld groups in published worked examples. */
export const weldExamples: readonly Check[] = [
  coefficient('IC-A26A', 'II.A-26 A', 0.875, 0.5, '1.88'),
  coefficient('IC-A23', 'II.A-23', 0.606, 0.167, '1.46'),
  coefficient('IC-C1', 'II.C-1', 0.644, 0.204, '1.50'),
  elastic('EL-IIA27-Ix', 'C 10 × 5 in', '333', 'in³', () => group.ix),
  elastic('EL-IIA27-Iy', 'C 10 × 5 in', '52.1', 'in³', () => group.iy),
  elastic('EL-IIA27-Ip', 'C 10 × 5 in', '385', 'in³', () => group.ip),
  { ...elastic('EL-IIA27-f', loaded, '0.177', '1/in', perInch), roundedFirst: rounding('I_p', 385, 385.417) },
  {
    ...elastic('EL-IIA27-LRFD', `${loaded}, leg 6/16 in`, '47.2', 'kips', () => (1.392 * 6) / perInch()),
    roundedFirst: chain,
  },
  {
    ...elastic('EL-IIA27-ASD', `${loaded}, leg 6/16 in`, '31.5', 'kips', () => (0.928 * 6) / perInch()),
    basis: 'aisc-360-2022-asd',
    roundedFirst: chain,
  },
];
