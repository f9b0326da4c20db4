/**
 * Shear lag factor of an angle bolted by one leg: `U = 1 - x/l`, not below the share of the connected leg in the
 * gross area.
 *
 * x from the plane of the connection to the centroid, mm; l between the end bolts along the force, mm; with one row
 * (l = 0) the share of the connected leg alone. Case 8 of the table (0.80 with four bolts in a line, 0.60 with three)
 * may be used where it is larger; it is left out (errs low). ANSI/AISC 360-22, D3 and Table D3.1, case 2.
 */
export function shearLagFactor(x: number, l: number, connectedShare: number): number {
  const byLength = l > 0 ? 1 - x / l : 0;
  return Math.min(1, Math.max(byLength, connectedShare));
}
