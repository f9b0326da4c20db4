import { phi } from './factors.ts';

/**
 * Factored resistance of a tension-and-shear block, N: the lesser of
 *
 *   phi A_nt f_u + 0.60 phi A_gv f_y   and   phi A_nt f_u + 0.60 phi A_nv f_u
 *
 * A_nt net area in tension, A_gv and A_nv gross and net areas in shear, mm2; f_y, f_u MPa. At a coped beam end
 * the tension term takes 0.5, which the caller asks for. SANS 10162-1:2011, 13.11.
 */
export function blockTearing(
  Ant: number,
  Agv: number,
  Anv: number,
  fy: number,
  fu: number,
  tensionFactor = 1,
): number {
  return tensionFactor * phi * Ant * fu + 0.6 * phi * Math.min(Agv * fy, Anv * fu);
}
