import * as sans from '../../engine/standards/sans-10162-1-2011/index.ts';
import { type Check, printed } from '../check.ts';
import { pryingByHand } from '../prying-by-hand.ts';

const evaluated = (id: string, clause: string, inputs: string, text: string, ours: () => number): Check => ({
  id: `SR-${id}`,
  basis: 'sans-10162-1-2011',
  clause,
  source: 'formula of the clause, worked by hand',
  evidence: 'rule evaluation',
  inputs,
  published: printed(text),
  unit: 'kN',
  ours,
});

/** Tension beside shear, plates in shear and prying by the formulas of SANS 10162-1. */
export const sansTension: readonly Check[] = [
  evaluated('tension-line', '13.12.1.3', '156.5 (1.4 − 60/87.6), the line below the circle', '112', () =>
    sans.tensionBesideShear(156.5, 60 / 87.6),
  ),
  evaluated('tension-circle', '13.12.1.3', '156.5 √(1 − 0.9²), the circle below the line', '68.2', () =>
    sans.tensionBesideShear(156.5, 0.9),
  ),
  evaluated(
    'plate-shear',
    '13.4, 13.11',
    '0.60 × 0.9 × 10 × 300 × 350',
    '567.0',
    () => sans.shearYield(3000, 350) / 1000,
  ),
  evaluated(
    'plate-shear-net',
    '13.11',
    '0.60 × 0.9 × 10 (300 − 4 × 24) × 450',
    '495.7',
    () => sans.shearRupture(10 * (300 - 4 * 24), 450) / 1000,
  ),
  ...pryingByHand('sans-10162-1-2011', 'SR', '13.12.1.2'),
];
