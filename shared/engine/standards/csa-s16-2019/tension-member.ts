import { phi, phiu } from './factors.ts';

/** Factored yield resistance of a gross section, N: `phi A_g F_y`. mm2, MPa. CSA S16:19, 13.2(a)(i). */
export function grossYield(Ag: number, Fy: number): number {
  return phi * Ag * Fy;
}

/**
 * Factored resistance of an effective net section, N: `phi_u A_ne F_u`.
 * A_ne already reduced for shear lag, mm2; F_u MPa. CSA S16:19, 13.2(a)(iii).
 */
export function netSectionResistance(Ane: number, Fu: number): number {
  return phiu * Ane * Fu;
}

/**
 * Part of the net area that counts for an angle bolted by one leg: 0.80 with four or more rows of bolts along the
 * force, 0.60 with fewer. CSA S16:19, 12.3.3.2.
 */
export function oneLegFactor(rows: number): number {
  return rows >= 4 ? 0.8 : 0.6;
}

/**
 * Part of the width of a plate that counts when it is welded along both sides only: all of it where the welds are at
 * least twice as long as it is wide, `0.50 w + 0.25 L` down to L = w, `0.75 L` below.
 * L length of each weld, w between them, mm; returns an effective width, mm. CSA S16:19, 12.3.3.3.
 */
export function sideWeldedWidth(L: number, w: number): number {
  if (L >= 2 * w) return w;
  return L >= w ? 0.5 * w + 0.25 * L : 0.75 * L;
}
