import type { BasisId } from '../engine/index.ts';
import { createBasis } from '../engine/standards/registry.ts';
import { bolt } from './bases.ts';
import { type Check, printed } from './check.ts';

/*
 * M20, b 45, a 35, p 75, hole 22, F_y 300, B 156.451 kN, worked by hand:
 * b' = 45 − 10 = 35, a' = 35 + 10 = 45, ρ = 0.7778, δ = 1 − 22/75 = 0.7067, K = 0.9 × 300 × 75 t²/(4 × 35) = 144.643 t².
 */
const rows = [
  [12, '35.5', 'the flange alone, 1.7067 K, K = 20.829 kN'],
  [25, '127.6', 'both, (B + 0.7778 K)/1.7778, K = 90.402 kN'],
  [40, '156.5', 'the bolt alone, K = 231.4 kN is above B'],
] as const;

/** The published prying method by hand: the same in CSA S16 and SANS 10162-1, both with 0.9 F_y. */
export function pryingByHand(basis: BasisId, prefix: string, clause: string): Check[] {
  return rows.map(([thickness, text, inputs]) => ({
    id: `${prefix}-prying-${thickness}`,
    basis,
    clause,
    source: 'published prying method, worked by hand',
    evidence: 'rule evaluation',
    inputs: `M20, b 45, a 35, p 75, t ${thickness}, F_y 300, B 156.45 kN: ${inputs}`,
    published: printed(text),
    unit: 'kN',
    ours: () => {
      const stub = {
        thickness,
        steel: { name: '', fy: 300, fu: 450 },
        byTensile: false,
        bolt: bolt(20),
        bolts: 1,
        holeDiameter: 22,
        boltToWeb: 45,
        m: 45,
        edge: 35,
        leff1: 75,
        leff2: 75,
        tributary: 75,
      };
      return (createBasis(basis)?.tStub(stub, 156_451, null) ?? 0) / 1000;
    },
  }));
}
