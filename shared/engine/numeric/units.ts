/** Conversions used at the edges alone; inside the engine everything is N, mm, MPa and radians. */

/** Degrees to radians. */
export function toRadians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}

/** Radians to degrees. */
export function toDegrees(radians: number): number {
  return (radians * 180) / Math.PI;
}

/** Newtons to kilonewtons. */
export function kilonewtons(newtons: number): number {
  return newtons / 1000;
}
