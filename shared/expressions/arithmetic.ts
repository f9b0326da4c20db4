/** Floating-point noise that tells no two numbers apart: a billionth, and for large numbers a share of their size. */
const NOISE = 1e-9;
const SHARE = 1e-12;

const noiseOf = (a: number, b: number): number => Math.max(NOISE, SHARE * Math.abs(a), SHARE * Math.abs(b));

/** Equal but for noise: 0.1 + 0.2 is 0.3. */
export const isEqual = (a: number, b: number): boolean => Math.abs(a - b) <= noiseOf(a, b);
/** Below by more than noise. */
export const isBelow = (a: number, b: number): boolean => b - a > noiseOf(a, b);

type Rounding = (value: number) => number;

/** Halves away from zero; what is a half but for noise is one, as it would be by hand. */
const toNearest: Rounding = (value) => Math.sign(value) * Math.floor(Math.abs(value) + 0.5 + NOISE);

/** Free of floating-point noise: three steps of 0.1 are 0.3, not 0.30000000000000004; adding 0 makes -0 plain. */
export const tidy = (value: number): number =>
  (Math.abs(value) < 1e6 ? Math.round(value * 1e9) / 1e9 : value) + 0;

/** Rounds to whole multiples of a step; noise costs no whole step: 70 × 1.1 rounds up to 77, not to 78. */
function toStep(value: number, step: number, rounding: Rounding): number {
  const steps = value / step;
  const whole = Math.round(steps);
  const count = isEqual(steps, whole) ? whole : rounding(steps);
  return tidy(count * step);
}

/** The three ways to round, each to multiples of a step above 0. */
export const roundings: Readonly<
  Record<'round' | 'ceil' | 'floor', (value: number, step: number) => number>
> = {
  round: (value, step) => toStep(value, step, toNearest),
  ceil: (value, step) => toStep(value, step, Math.ceil),
  floor: (value, step) => toStep(value, step, Math.floor),
};
