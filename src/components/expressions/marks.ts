/** A stretch of an expression, at fault or not. */
export interface Stretch {
  readonly text: string;
  readonly faulty: boolean;
}

interface Placed {
  readonly place?: { readonly start: number; readonly end: number };
}

/** The expression cut at its faults. A fault at the very end, or at an empty place, is marked on a blank of its own. */
export function stretchesOf(text: string, faults: readonly Placed[]): Stretch[] {
  const places = faults
    .flatMap(({ place }) => (place && place.start <= text.length ? [place] : []))
    .sort((one, other) => one.start - other.start);
  const stretches: Stretch[] = [];
  let at = 0;
  for (const { start, end } of places) {
    const from = Math.max(start, at);
    const to = Math.min(Math.max(end, from), text.length);
    if (from > at) stretches.push({ text: text.slice(at, from), faulty: false });
    if (to > from) stretches.push({ text: text.slice(from, to), faulty: true });
    else if (start === text.length) stretches.push({ text: ' ', faulty: true });
    at = Math.max(to, at);
  }
  if (at < text.length) stretches.push({ text: text.slice(at), faulty: false });
  return stretches;
}
