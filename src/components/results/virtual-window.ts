/** The part of a long list that is on the screen: first, and one past the last. */
export interface Stretch {
  readonly first: number;
  readonly end: number;
}

/** Browsers refuse boxes much taller than this, px; a longer list scrolls faster than the bar instead. */
export const TALLEST = 12_000_000;

/** Length of the scrolled box for so many items of a size, px. */
export const lengthOf = (count: number, size: number): number => Math.min(count * size, TALLEST);

/**
 * Which items a viewport shows, with a few more at each end.
 * @param scrolled how far the box is scrolled, px
 * @param viewport what is seen of it, px
 */
export function windowOf(scrolled: number, viewport: number, size: number, count: number, more = 4): Stretch {
  const start = itemAt(scrolled, viewport, size, count);
  const first = Math.max(0, Math.floor(start) - more);
  const end = Math.min(count, Math.ceil(start + viewport / size) + more);
  return { first: Math.min(first, end), end };
}

/** The item, with its fraction, at the start of the viewport. */
export function itemAt(scrolled: number, viewport: number, size: number, count: number): number {
  const length = lengthOf(count, size);
  if (length === count * size) return Math.max(0, scrolled / size);
  const share = Math.min(1, Math.max(0, scrolled / Math.max(1, length - viewport)));
  return share * Math.max(0, count - viewport / size);
}

/** Where an item stands in the scrolled box, px; in a squeezed list it depends on the scroll itself. */
export function offsetOf(
  item: number,
  scrolled: number,
  viewport: number,
  size: number,
  count: number,
): number {
  if (lengthOf(count, size) === count * size) return item * size;
  return scrolled + (item - itemAt(scrolled, viewport, size, count)) * size;
}

/** The scroll that brings an item into view with the least movement, px. */
export function scrollTo(
  item: number,
  scrolled: number,
  viewport: number,
  size: number,
  count: number,
): number {
  const length = lengthOf(count, size);
  const at = itemAt(scrolled, viewport, size, count);
  const shown = viewport / size;
  if (item >= at && item + 1 <= at + shown) return scrolled;
  const start = item < at ? item : item + 1 - shown;
  if (length === count * size) return Math.max(0, start * size);
  return (Math.max(0, start) / Math.max(1, count - shown)) * (length - viewport);
}
