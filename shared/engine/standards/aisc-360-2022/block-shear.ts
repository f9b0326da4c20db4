import type { BlockPull } from '../basis.ts';

/**
 * Factor U_bs on the tension plane: 1.0 where the tension is uniform, 0.5 where it is not. The Commentary (Fig.
 * C-J4.2) counts gusset plates, angles and beam ends with one line of bolts as uniform, coped beam ends with two or
 * more lines as not. ANSI/AISC 360-22, J4.3.
 */
export const uniformity: Readonly<Record<BlockPull, number>> = {
  even: 1,
  uneven: 1,
  'coped-one-line': 1,
  'coped-two-lines': 0.5,
};

/**
 * Nominal block shear strength, N: `0.60 F_u A_nv + U_bs F_u A_nt <= 0.60 F_y A_gv + U_bs F_u A_nt`.
 *
 * A_nt net area in tension, A_gv and A_nv gross and net areas in shear, mm2; F_y, F_u MPa; U_bs from `uniformity`.
 * Nominal. ANSI/AISC 360-22, J4.3, equation (J4-5).
 */
export function nominalBlockShear(
  Ant: number,
  Agv: number,
  Anv: number,
  Fy: number,
  Fu: number,
  Ubs: number,
): number {
  return 0.6 * Math.min(Fu * Anv, Fy * Agv) + Ubs * Fu * Ant;
}
