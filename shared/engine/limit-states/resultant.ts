/**
 * The resultant R at which a strength against one of its components is used up: V = R sin, N = R cos. N.
 * Infinity where the component is 0.
 */
export function byComponent(strength: number, component: number): number {
  const part = Math.abs(component);
  return part > 0 ? strength / part : Infinity;
}

/** The resultant at which `sqrt((V/R_v)^2 + (N/R_n)^2) = 1`, N: the project's method for two strengths together. */
export function byBoth(alongFace: number, acrossFace: number, cos: number, sin: number): number {
  // A strength of 0 is no matter to a component of 0.
  const v = sin === 0 ? 0 : sin / alongFace;
  const n = cos === 0 ? 0 : cos / acrossFace;
  const used = Math.sqrt(v * v + n * n);
  return used > 0 ? 1 / used : Infinity;
}
