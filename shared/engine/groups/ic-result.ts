/**
 * Outcome of an instantaneous-centre analysis: either the strength, or the reason why there is none.
 * A failure is never a number: the caller has to look at `ok` before it can read a multiplier.
 */
export type IcResult = IcSolution | IcFailure;

export interface IcSolution {
  readonly ok: true;
  /**
   * The load at failure is `multiplier` times the given load, for bolts of ultimate strength 1 or for welds
   * of longitudinal strength 1 per mm. For a load of 1 N it is the coefficient C (bolts) or a length in mm (welds).
   */
  readonly multiplier: number;
  /**
   * Motion at failure: of the centroid, and the turn times the group's radius; 1 is the greatest deformation of a bolt, or
   * the leg of a weld.
   */
  readonly motion: { readonly ux: number; readonly uy: number; readonly turn: number };
  /** The instantaneous centre in the group's coordinates; null where the group only translates. */
  readonly centre: { readonly x: number; readonly y: number } | null;
  /** Imbalance of forces and moments over the load. */
  readonly imbalance: number;
}

export type IcFailureReason =
  /** The load vector is zero or not finite. */
  | 'no-load'
  /** No fastener, coincident fasteners or coordinates that are not finite. */
  | 'no-group'
  /** A single bolt, or bolts all at one place, cannot resist a moment. */
  | 'no-moment-resistance'
  /** The search ended without reaching equilibrium. */
  | 'not-converged';

export interface IcFailure {
  readonly ok: false;
  readonly reason: IcFailureReason;
  readonly imbalance: number;
}

export function icFailure(reason: IcFailureReason, imbalance = Infinity): IcFailure {
  return { ok: false, reason, imbalance };
}

/** Relative imbalance that a solution may have at most. */
export const EQUILIBRIUM_TOLERANCE = 1e-9;

/** Puts a solution together; a group that hardly turns has no centre. Lengths of the motion as in `IcSolution`. */
export function icSolution(
  multiplier: number,
  motion: IcSolution['motion'],
  centroid: { readonly x: number; readonly y: number },
  radius: number,
  imbalance: number,
): IcSolution {
  const { ux, uy, turn } = motion;
  const still = Math.abs(turn) < 1e-12 * Math.hypot(ux, uy);
  const centre = still
    ? null
    : { x: centroid.x - (uy * radius) / turn, y: centroid.y + (ux * radius) / turn };
  return { ok: true, multiplier, motion, centre, imbalance };
}
