/**
 * Directional increase of a fillet's strength: `k_ds = 1.0 + 0.50 sin^1.5 theta`.
 *
 * sinTheta of the angle between the force and the weld's axis. For linear groups of one leg size loaded through their
 * middle, or inside the instantaneous-centre method; 1.0 otherwise. ANSI/AISC 360-22, J2.4(a), (J2-5).
 */
export function directionalIncrease(sinTheta: number): number {
  return 1 + 0.5 * sinTheta * Math.sqrt(sinTheta);
}

/**
 * Nominal strength of the weld metal per length of fillet, N/mm: `0.60 F_EXX (w/sqrt 2) k_ds`.
 * w leg, mm; F_EXX MPa. Nominal. ANSI/AISC 360-22, J2.4(a), (J2-4).
 */
export function nominalFillet(i: { w: number; FEXX: number; kds: number }): number {
  return ((0.6 * i.FEXX * i.w) / Math.SQRT2) * i.kds;
}

/**
 * Part of the length of a long end-loaded fillet that counts: 1 up to 100 w, `1.2 - 0.002 l/w` beyond it, and
 * `180 w/l` beyond 300 w. l length, w leg, mm. ANSI/AISC 360-22, J2.2b(d), (J2-1).
 */
export function endLoadedFactor(l: number, w: number): number {
  if (l > 300 * w) return (180 * w) / l;
  return Math.min(1, 1.2 - (0.002 * l) / w);
}

/**
 * Fillets of different direction in one concentrically loaded group, N: the greater of `R_wl + R_wt` and
 * `0.85 R_wl + 1.5 R_wt`, each taken without a directional increase. ANSI/AISC 360-22, J2.4(b), (J2-6).
 */
export function mixedGroup(Rwl: number, Rwt: number): number {
  return Math.max(Rwl + Rwt, 0.85 * Rwl + 1.5 * Rwt);
}

/**
 * Thickness at which the base metal is as strong in shear rupture as the fillets on it, mm:
 * `fillets x 0.60 F_EXX (w/sqrt 2)/(0.60 F_u)`. w leg, mm; F_EXX, F_u MPa. From J2.4(a) and J4.2(b) of ANSI/AISC 360-22.
 */
export function matchingThickness(i: { w: number; FEXX: number; Fu: number; fillets: number }): number {
  return (i.fillets * nominalFillet({ w: i.w, FEXX: i.FEXX, kds: 1 })) / (0.6 * i.Fu);
}
