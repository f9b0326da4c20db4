import { phib } from './factors.ts';

/**
 * Factored shear resistance of one bolt in a bearing-type joint, N.
 *
 *   V_r = 0.60 phi_b m A_b f_ub, times 0.70 when a shear plane cuts the threads
 *
 * m number of shear planes; A_b = pi d^2/4, nominal shank area, mm2; f_ub minimum tensile strength, MPa.
 * Not for slip-critical joints. With several planes all are taken as cut when one may be (errs low).
 * Factored. SANS 10162-1:2011, 13.12.1.1.
 */
export function boltShearResistance(i: {
  m: number;
  Ab: number;
  fub: number;
  threadsIntercepted: boolean;
}): number {
  return 0.6 * phib * i.m * i.Ab * i.fub * (i.threadsIntercepted ? 0.7 : 1);
}

/**
 * Reduction for a long joint: `1.075 - 0.005 L/d`, not below 0.75, for L > 15 d; otherwise 1.
 *
 * L between the end bolts along the force, mm; d bolt diameter, mm. At L = 15 d the expression is exactly 1.
 * SANS 10162-1:2011, 13.12.1.1.
 */
export function longJointFactor(L: number, d: number): number {
  if (L <= 15 * d) return 1;
  return Math.max(0.75, 1.075 - (0.005 * L) / d);
}
