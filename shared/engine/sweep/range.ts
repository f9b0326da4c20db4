/** Steps closer to a whole number than this share of a step are whole: 0.1 + 0.2 must not lose an end. */
const WHOLE = 1e-9;

/** Number of values from `from` to `to` inclusive, or 0 when the range is not one. */
export function countOfRange(from: number, to: number, step: number): number {
  if (![from, to, step].every(Number.isFinite) || step <= 0 || to < from) return 0;
  return Math.floor((to - from) / step + WHOLE) + 1;
}

/** The values of a range, free of float noise to a millionth. */
export function valuesOfRange(from: number, to: number, step: number): number[] {
  const count = countOfRange(from, to, step);
  return Array.from({ length: count }, (_, index) => Math.round((from + index * step) * 1e6) / 1e6);
}
