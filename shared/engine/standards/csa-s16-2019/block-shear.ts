import type { BlockPull } from '../basis.ts';
import { phiu } from './factors.ts';

/** Yield stress above which the mean of yield and tensile strength is not used, MPa. */
const HIGH_YIELD = 460;

/**
 * Efficiency U_t of the tension plane: 1.0 where the pull is even, 0.6 by one leg of an angle or by a block at one
 * side, 0.9 at a coped beam end with one line of bolts, 0.3 with two (from memory). CSA S16:19, 13.11.
 */
export const tensionEfficiency: Readonly<Record<BlockPull, number>> = {
  even: 1,
  uneven: 0.6,
  'coped-one-line': 0.9,
  'coped-two-lines': 0.3,
};

/**
 * Mean shear stress that a gross plane reaches, MPa: `0.60 (F_y + F_u)/2`, with F_y in place of the mean where
 * F_y > 460 MPa. CSA S16:19, 13.11.
 */
export function shearPlaneStress(Fy: number, Fu: number): number {
  return 0.6 * (Fy > HIGH_YIELD ? Fy : (Fy + Fu) / 2);
}

/**
 * Factored resistance of a tension-and-shear block, N: `phi_u [U_t A_n F_u + 0.60 A_gv (F_y + F_u)/2]`.
 *
 * A_n net area in tension, A_gv gross area in shear, mm2; F_y, F_u MPa; U_t from `tensionEfficiency`. With A_n = 0 it
 * is the tear-out of bolts along two planes each. CSA S16:19, 13.11.
 */
export function blockResistance(Ut: number, An: number, Agv: number, Fy: number, Fu: number): number {
  return phiu * (Ut * An * Fu + Agv * shearPlaneStress(Fy, Fu));
}
