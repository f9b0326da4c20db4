/**
 * Plate-buckling factor of a beam's web at a cope in one flange: `k_1 = f k`, not below 1.61, with f = 2c/d, or 1 + c/d
 * where c > d, and k = 2.2 (h_0/c)^1.65, or 2.2 h_0/c where c > h_0. AISC Manual, Part 9, from memory.
 * @param depth d of the beam, `left` h_0 below or above the cope, `length` c of the cope, mm
 */
export function copePlateFactor(depth: number, left: number, length: number): number {
  const f = length <= depth ? (2 * length) / depth : 1 + length / depth;
  const ratio = left / length;
  const k = 2.2 * (length <= left ? ratio ** 1.65 : ratio);
  return Math.max(f * k, 1.61);
}

/** Stress at which the web buckles at a cope in one flange, MPa: `0.903 E k_1/(h_0/t_w)^2`. AISC Manual, Part 9. */
export function oneCopeCriticalStress(
  modulus: number,
  depth: number,
  left: number,
  length: number,
  web: number,
): number {
  const slenderness = left / web;
  return (0.903 * modulus * copePlateFactor(depth, left, length)) / (slenderness * slenderness);
}

/**
 * Stress at which a web coped at both flanges buckles sideways, MPa: that of a rectangular bar,
 * `1.9 E C_b t_w^2/(c h_0)` with C_b = 1, where handbooks take 1.84 and more (errs low). ANSI/AISC 360-22, F11.2(c).
 */
export function twoCopesCriticalStress(modulus: number, left: number, length: number, web: number): number {
  return (1.9 * modulus * web * web) / (length * left);
}

/** Area, centroid and least elastic modulus of one flange and the web left beside it. mm, mm2, mm3. */
export interface ReducedSection {
  readonly area: number;
  /** From the coped edge to the centroid. */
  readonly centroid: number;
  readonly modulus: number;
}

/** A web `left` deep with a flange at its far edge, or with none where `flangeThickness` is 0; root fillets left out. */
export function reducedSection(
  left: number,
  web: number,
  flangeWidth: number,
  flangeThickness: number,
): ReducedSection {
  const clear = left - flangeThickness;
  const webArea = clear * web;
  const flangeArea = flangeWidth * flangeThickness;
  const area = webArea + flangeArea;
  const flangeAt = left - flangeThickness / 2;
  const centroid = (webArea * (clear / 2) + flangeArea * flangeAt) / area;
  const inertia =
    (webArea * clear * clear + flangeArea * flangeThickness * flangeThickness) / 12 +
    webArea * (centroid - clear / 2) ** 2 +
    flangeArea * (flangeAt - centroid) ** 2;
  return { area, centroid, modulus: inertia / Math.max(centroid, left - centroid) };
}
