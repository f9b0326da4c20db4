import { phi, phiu } from './factors.ts';

/**
 * Factored resistance of a gross section of a plate or web in shear, N: `0.60 phi A_gv F_y`; a web alone would take
 * 0.66 (errs low). mm2, MPa. CSA S16:19, 13.4.1.1.
 */
export function shearYield(Agv: number, Fy: number): number {
  return 0.6 * phi * Agv * Fy;
}

/**
 * Factored resistance of a net section in shear, N: `0.60 phi_u A_nv F_u`. The clause for blocks takes the gross plane
 * with the mean of yield and tensile strength; the net plane at its rupture is checked besides (errs low). mm2, MPa.
 * CSA S16:19, 13.11.
 */
export function shearRupture(Anv: number, Fu: number): number {
  return 0.6 * phiu * Anv * Fu;
}
