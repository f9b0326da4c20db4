import { phi } from './factors.ts';

/**
 * Factored resistance of a gross section of a plate or web in shear, N: `0.60 phi A_gv f_y`, the shear term of a block;
 * a web alone would take 0.66 (errs low). mm2, MPa. SANS 10162-1:2011, 13.4.1.1, 13.11.
 */
export function shearYield(Agv: number, fy: number): number {
  return 0.6 * phi * Agv * fy;
}

/** Factored resistance of a net section in shear, N: `0.60 phi A_nv f_u`. mm2, MPa. SANS 10162-1:2011, 13.11. */
export function shearRupture(Anv: number, fu: number): number {
  return 0.6 * phi * Anv * fu;
}
