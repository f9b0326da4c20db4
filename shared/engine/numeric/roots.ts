const RELATIVE_TOLERANCE = 1e-12;
const MOST_STEPS = 60;

/**
 * The positive root R of `a R + b R^2 + c R^4 = 1`, with a, b, c not negative and not all zero.
 *
 * The upper bound is the least R at which one term alone reaches 1; Newton's steps from there fall
 * monotonically on the root, because the left side is convex and rising. Every step stays in the bracket.
 * @returns Infinity when all three coefficients are zero
 */
export function rootOfInteraction(a: number, b: number, c: number): number {
  let high = Infinity;
  if (a > 0) high = Math.min(high, 1 / a);
  if (b > 0) high = Math.min(high, 1 / Math.sqrt(b));
  if (c > 0) high = Math.min(high, 1 / Math.sqrt(Math.sqrt(c)));
  if (high === Infinity) return Infinity;
  let low = 0;
  let r = high;
  for (let step = 0; step < MOST_STEPS; step++) {
    const excess = a * r + b * r * r + c * r * r * r * r - 1;
    if (excess > 0) high = r;
    else low = r;
    let next = r - excess / (a + 2 * b * r + 4 * c * r * r * r);
    if (!(next >= low && next <= high)) next = (low + high) / 2;
    if (Math.abs(next - r) <= RELATIVE_TOLERANCE * r) return next;
    r = next;
  }
  return low;
}
