import { kilonewtons } from '../numeric/units.ts';

/** Float noise below this share of an increment does not cost a whole increment. */
const NOISE = 1e-9;

/**
 * A capacity as it is published: rounded down to the increment, never up and never to nearest.
 * @param newtons capacity, N
 * @param increment kN
 * @returns kN
 */
export function roundDown(newtons: number, increment: number): number {
  const steps = Math.floor(kilonewtons(newtons) / increment + NOISE);
  return Math.round(steps * increment * 1e6) / 1e6;
}

/**
 * A rounded-down capacity read back from single precision: the multiple of the increment it was.
 * Single precision is closer to it than half an increment up to 100 MN at 0.1 kN.
 * @param stored kN, or NaN for a cell without a capacity
 * @returns kN, or null
 */
export function unpackCapacity(stored: number, increment: number): number | null {
  if (Number.isNaN(stored)) return null;
  return Math.round(Math.round(stored / increment) * increment * 1e6) / 1e6;
}
