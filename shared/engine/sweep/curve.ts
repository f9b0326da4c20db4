import { kilonewtons, toRadians } from '../numeric/units.ts';
import type { PreparedDetail, Sense } from '../types.ts';
import { roundDown } from './rounding.ts';

/** Capacity over the load angle: unrounded for each limit state, kN; the envelope rounded down. */
export interface CapacityCurve {
  readonly angles: readonly number[];
  /** kN rounded down to the increment; null where the cell is rejected or not covered. */
  readonly capacity: (number | null)[];
  /** Index of the limit state; -1 where there is none. */
  readonly governing: number[];
  /** One row a limit state, kN; null where it does not apply or the cell is rejected. */
  readonly limitStates: (number | null)[][];
}

/**
 * The capacity curve of one detail.
 * @param angles degrees
 * @param increment kN
 */
export function capacityCurve(
  detail: PreparedDetail,
  sense: Sense,
  angles: readonly number[],
  increment: number,
): CapacityCurve {
  const out = new Float64Array(detail.limitStates.length);
  const curve: CapacityCurve = {
    angles,
    capacity: [],
    governing: [],
    limitStates: detail.limitStates.map(() => []),
  };
  for (const angle of angles) {
    const governing = detail.at(toRadians(angle), sense, out);
    curve.governing.push(Math.max(governing, -1));
    curve.capacity.push(governing < 0 ? null : roundDown(out[governing]!, increment));
    curve.limitStates.forEach((row, state) => {
      const capacity = out[state]!;
      row.push(governing < 0 || !Number.isFinite(capacity) ? null : kilonewtons(capacity));
    });
  }
  return curve;
}
