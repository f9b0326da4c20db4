import { phib } from './factors.ts';

/** From this length between the end bolts on, a splice takes 0.50 in place of 0.60, mm. */
const LONG = 760;

/**
 * Coefficient on the tensile strength of a bolt in shear: 0.60, or 0.50 where the joint is 760 mm or longer.
 * L between the end bolts along the force, mm. CSA S16:19, 13.12.1.2(c).
 */
export function shearCoefficient(L: number): number {
  return L >= LONG ? 0.5 : 0.6;
}

/**
 * Factored shear resistance of one bolt in a bearing-type joint, N.
 *
 *   V_r = 0.60 phi_b m A_b F_u, times 0.70 when a shear plane cuts the threads
 *
 * m number of shear planes; A_b = pi d^2/4, nominal shank area, mm2; F_u minimum tensile strength, MPa; L between the
 * end bolts, mm: from 760 mm on 0.50 stands in place of 0.60. Not for slip-critical joints. With several planes all
 * are taken as cut when one may be (errs low). Factored. CSA S16:19, 13.12.1.2(c).
 */
export function boltShearResistance(i: {
  m: number;
  Ab: number;
  Fu: number;
  threadsIntercepted: boolean;
  L: number;
}): number {
  return shearCoefficient(i.L) * phib * i.m * i.Ab * i.Fu * (i.threadsIntercepted ? 0.7 : 1);
}
