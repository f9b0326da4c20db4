/** Density of steel, kg/m3 (EN 1993-1-1 3.2.6 and EN 10056-1 take 7850). */
const DENSITY = 7850;

/** Mass of a bar in kg/m from its area in mm2, to the hundredth. */
export function massPerMetre(area: number): number {
  return Math.round(area * DENSITY * 1e-4) / 100;
}
