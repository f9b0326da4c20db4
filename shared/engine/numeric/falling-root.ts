/** A function that falls from a value above zero at 0. */
export interface Falling {
  at(x: number): number;
}

const RELATIVE_TOLERANCE = 1e-12;
const MOST_STEPS = 80;

/**
 * The x in 0 … `high` at which a falling function reaches 0, from below, or `high` when it has not fallen so far there.
 * False position with halving of the value that stays (Illinois), and bisection whenever a step does not halve the
 * bracket: it cannot leave the bracket and always ends. Returns the lower end, so that a capacity errs low.
 */
export function rootOfFalling(falling: Falling, high: number): number {
  let low = 0;
  let top = high;
  let fHigh = falling.at(top);
  if (fHigh >= 0) return top;
  let fLow = falling.at(low);
  let width = top;
  for (let step = 0; step < MOST_STEPS && top - low > RELATIVE_TOLERANCE * top; step++) {
    const slow = top - low > width / 2;
    width = top - low;
    let x = slow ? (low + top) / 2 : low + (width * fLow) / (fLow - fHigh);
    if (!(x > low && x < top)) x = (low + top) / 2;
    const f = falling.at(x);
    if (f >= 0) {
      low = x;
      fLow = f;
      fHigh = slow ? fHigh : fHigh / 2;
    } else {
      top = x;
      fHigh = f;
      fLow = slow ? fLow : fLow / 2;
    }
  }
  return low;
}
