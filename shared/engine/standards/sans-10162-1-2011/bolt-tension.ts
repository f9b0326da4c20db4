import { phib } from './factors.ts';

/**
 * Factored tensile resistance of one bolt, N: `T_r = 0.75 phi_b A_b f_ub`.
 *
 * A_b nominal shank area, mm2; f_ub minimum tensile strength, MPa. Prying is added to the load by the caller.
 * SANS 10162-1:2011, 13.12.1.2.
 */
export function boltTensionResistance(i: { Ab: number; fub: number }): number {
  return 0.75 * phib * i.Ab * i.fub;
}

/**
 * Tension that a bolt takes beside a shear, N: `T_r min(1, 1.4 - v, sqrt(1 - v^2))`, not below 0.
 *
 * v = V/V_r; T_r N. The straight line is the lower from v = 0.6 to 0.8, the circle elsewhere.
 * See `shearTensionUtilisation`. SANS 10162-1:2011, 13.12.1.3.
 */
export function tensionBesideShear(Tr: number, v: number): number {
  return Tr * Math.max(0, Math.min(1, 1.4 - v, Math.sqrt(Math.max(0, 1 - v * v))));
}

/**
 * Utilisation of a bolt in shear and tension together: the greatest of V/V_r, T/T_r, their sum over 1.4, and
 * the circle `sqrt((V/V_r)^2 + (T/T_r)^2)`.
 *
 * Both the straight line and the circle are found in practice, and neither lies inside the other everywhere,
 * so the worse is taken. Forces and resistances in the same unit. SANS 10162-1:2011, 13.12.1.3.
 */
export function shearTensionUtilisation(i: { V: number; Vr: number; T: number; Tr: number }): number {
  const v = i.V / i.Vr;
  const t = i.T / i.Tr;
  return Math.max(v, t, (v + t) / 1.4, Math.hypot(v, t));
}
