import * as csa from '../../engine/standards/csa-s16-2019/index.ts';
import { type Check, printed } from '../check.ts';
import { pryingByHand } from '../prying-by-hand.ts';

const evaluated = (id: string, clause: string, inputs: string, text: string, ours: () => number): Check => ({
  id: `csa-rule-${id}`,
  basis: 'csa-s16-2019',
  clause: `CSA S16 ${clause}`,
  source: 'formula of the clause, worked by hand',
  evidence: 'rule evaluation',
  inputs,
  published: printed(text),
  unit: 'kN',
  ours,
});

/** Tension beside shear, plates in shear and prying by the formulas of CSA S16. */
export const tensionByHand: readonly Check[] = [
  evaluated('shear-tension', '13.12.1.4', '156.5 √(1 − (60/87.6)²)', '114', () =>
    csa.tensionBesideShear(156.5, 60 / 87.6),
  ),
  evaluated(
    'plate-shear',
    '13.4',
    '0.60 × 0.9 × 10 × 300 × 350',
    '567.0',
    () => csa.shearYield(3000, 350) / 1000,
  ),
  evaluated(
    'plate-shear-net',
    '13.11',
    '0.60 × 0.75 × 10 (300 − 4 × 24) × 450',
    '413.1',
    () => csa.shearRupture(10 * (300 - 4 * 24), 450) / 1000,
  ),
  ...pryingByHand('csa-s16-2019', 'csa-rule', 'CSA S16 13.12.1.3'),
];
