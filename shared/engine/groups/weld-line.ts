/**
 * Two fillets of length L, one each side of the plate, on the line x = 0 from y = -L/2 to L/2,
 * taken elastically: forces per millimetre of ONE fillet, N/mm.
 */

/** Pull across the weld line at height y: `N/(2L) + M y/(2 L^3/12)`. N, N mm, mm. */
export function pullPerMillimetre(n: number, m: number, length: number, y: number): number {
  return n / (2 * length) + (6 * m * y) / (length * length * length);
}

/** Shear along the weld line: `V/(2L)`, the same at every millimetre. */
export function shearPerMillimetre(v: number, length: number): number {
  return v / (2 * length);
}

/**
 * Height y of the millimetre with the least pull in magnitude: where the pull changes sign if that lies on the
 * weld, otherwise the end with the lesser magnitude. A weld whose strength rises with the angle of the force
 * can be weakest here, so it is checked beside the two ends.
 */
export function heightOfLeastPull(n: number, m: number, length: number): number {
  if (m === 0) return 0;
  const y = (-n * length * length) / (12 * m);
  return Math.max(-length / 2, Math.min(length / 2, y));
}
