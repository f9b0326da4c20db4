import { phi } from './factors.ts';

/** Factored yield resistance of a gross section, N: `phi A_g f_y`. mm2, MPa. SANS 10162-1:2011, 13.2(a)(i). */
export function grossYield(Ag: number, fy: number): number {
  return phi * Ag * fy;
}

/**
 * Factored resistance of an effective net section, N: `0.85 phi A_ne f_u`.
 * A_ne already reduced for shear lag, mm2; f_u MPa. SANS 10162-1:2011, 13.2(a)(ii).
 */
export function netSectionResistance(Ane: number, fu: number): number {
  return 0.85 * phi * Ane * fu;
}

/**
 * Part of the net area that counts for an angle bolted by one leg: 0.80 with four or more rows of bolts along
 * the force, 0.60 with fewer. SANS 10162-1:2011, 12.3.3.2.
 */
export function oneLegFactor(rows: number): number {
  return rows >= 4 ? 0.8 : 0.6;
}
