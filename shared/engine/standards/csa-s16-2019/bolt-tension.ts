import { phib } from './factors.ts';

/**
 * Factored tensile resistance of one bolt, N: `T_r = 0.75 phi_b A_b F_u`.
 *
 * A_b nominal shank area, mm2; F_u minimum tensile strength, MPa. Prying is added to the load by the caller.
 * CSA S16:19, 13.12.1.3.
 */
export function boltTensionResistance(i: { Ab: number; Fu: number }): number {
  return 0.75 * phib * i.Ab * i.Fu;
}

/**
 * Tension that a bolt takes beside a shear, N: `T_r sqrt(1 - v^2)`, 0 from v = 1 on. v = V/V_r; T_r N.
 * CSA S16:19, 13.12.1.4.
 */
export function tensionBesideShear(Tr: number, v: number): number {
  return Tr * Math.sqrt(Math.max(0, 1 - v * v));
}

/**
 * Utilisation of a bolt in shear and tension together, as a share of the resultant: `sqrt((V/V_r)^2 + (T/T_r)^2)`.
 * The standard limits the sum of squares to 1. Forces and resistances in the same unit. CSA S16:19, 13.12.1.4.
 */
export function shearTensionUtilisation(i: { V: number; Vr: number; T: number; Tr: number }): number {
  return Math.hypot(i.V / i.Vr, i.T / i.Tr);
}
