import { toDegrees } from '../numeric/units.ts';
import { NOT_COVERED, NOT_PERMITTED, type PreparedDetail, type Rejection, type Sense } from '../types.ts';
import { BandSearch } from './band-search.ts';

/** What holds at every load angle of a band. */
export type BandOutcome =
  | {
      readonly status: 'capacity';
      /** The lowest capacity anywhere in the band, N, unrounded. */
      readonly capacity: number;
      readonly governing: number;
      /** Where in the band it is that low, degrees. */
      readonly angle: number;
    }
  | {
      readonly status: 'not-permitted';
      /** An angle of the band at which a rule is broken, degrees. */
      readonly angle: number;
      readonly rejections: readonly Rejection[];
    }
  | { readonly status: 'not-covered'; readonly reason: string };

/**
 * The capacity that a drawing may note for a whole band of load angles, e.g. "0° to 15°": the lowest anywhere in it.
 *
 * The curve is sampled every half degree and at 0°, where the nearest edges change; every local minimum of every
 * limit state is followed down, every change of governing limit state and every jump is closed in on from both
 * sides. A band in which any sampled angle is not permitted is not permitted.
 * @param from, to radians, from ≤ to
 */
export function bandCapacity(detail: PreparedDetail, sense: Sense, from: number, to: number): BandOutcome {
  const search = new BandSearch(detail, sense, from, to);
  const lowest = search.lowest();
  if (lowest.governing === NOT_PERMITTED || lowest.governing === NOT_COVERED) {
    const outcome = detail.outcome(lowest.theta, sense);
    if (outcome.status === 'not-permitted') return { ...outcome, angle: toDegrees(lowest.theta) };
    if (outcome.status === 'not-covered') return outcome;
  }
  const { capacity, governing, theta } = lowest;
  return { status: 'capacity', capacity, governing, angle: toDegrees(theta) };
}
