import { balanceAtBolt } from './bolt-at-centre.ts';
import { BOLT_CURVE, boltForceRatio, type BoltCurve, type BoltNormalisation } from './bolt-curve.ts';
import type { BoltGroup } from './bolt-group.ts';
import { BoltMotion } from './bolt-motion.ts';
import { bisectCentre } from './centre-bisection.ts';
import { momentAbout, unitVector, type GroupLoad } from './group-load.ts';
import { icFailure, icSolution, type IcFailure, type IcSolution } from './ic-result.ts';
import { MotionState, searchMotion } from './rigid-motion.ts';

export interface BoltIcOptions {
  readonly normalise?: BoltNormalisation;
  readonly curve?: BoltCurve;
}

export interface BoltIcSolution extends IcSolution {
  /**
   * Force of each bolt at failure, x and y in turn, for bolts of ultimate strength 1. Together they balance the load
   * at failure, which is the multiplier times the load (times 0.9816 where the force at Δ_max is the multiplier's unit).
   */
  readonly forces: Float64Array;
}
export type BoltIcResult = BoltIcSolution | IcFailure;

/** Motion over Δ_max below which rounding would show in a bolt's force: the curve starts upright. */
const AT_CENTRE = 1e-6;

const motion = new BoltMotion();
const state = new MotionState();
const g = new Float64Array(3);

/**
 * Strength of a bolt group by the instantaneous centre of rotation: the plate turns about one point, the farthest bolt has
 * reached its greatest deformation, and the bolts' forces balance the load. The multiplier is the coefficient C of handbooks
 * for a load of 1 N, or C' (a length) for a moment of 1 alone. A failure is never a number.
 *
 * Source: Crawford and Kulak, J. Struct. Div. ASCE 97 (ST3), 1971; AISC Manual, Part 7; CISC Handbook, Part 3.
 */
export function boltGroupIc(group: BoltGroup, load: GroupLoad, options: BoltIcOptions = {}): BoltIcResult {
  const { curve = BOLT_CURVE } = options;
  const unit = options.normalise === 'atMaximum' ? boltForceRatio(1, curve) : 1;
  const { centroid, count, radius } = group;
  if (!(count > 0) || !Number.isFinite(radius)) return icFailure('no-group');
  const moment = momentAbout(load, centroid.x, centroid.y);
  if (radius === 0) return atOnePlace(group, load, moment, curve, unit);
  const size = unitVector(load, moment / radius, g);
  if (size === 0) return icFailure('no-load');
  const forces = new Float64Array(2 * count);
  if (!balance(group, curve, forces)) return icFailure('not-converged', state.imbalance);
  const found = { ux: state.q[0]!, uy: state.q[1]!, turn: state.q[2]! };
  return { ...icSolution(state.load / size / unit, found, centroid, radius, state.imbalance), forces };
}

/** From the elastic motion; where that leads nowhere, from the starts of the bisection. */
function balance(group: BoltGroup, curve: BoltCurve, forces: Float64Array): boolean {
  const { count, radius, polar } = group;
  motion.use(group, curve);
  const attempt = () => {
    const found = searchMotion(motion, state, g);
    if (found && motion.forcesAt(state.q, forces) > AT_CENTRE) return true;
    return balanceAtBolt(group, curve, state, g, forces);
  };
  state.q[0] = g[0]! / count;
  state.q[1] = g[1]! / count;
  state.q[2] = (g[2]! * radius * radius) / polar;
  return attempt() || bisectCentre(motion, state, g, attempt);
}

/** Bolts all at one place share a force evenly and cannot resist a moment. */
function atOnePlace(
  { count, centroid }: BoltGroup,
  { fx, fy }: GroupLoad,
  moment: number,
  curve: BoltCurve,
  unit: number,
): BoltIcResult {
  const force = Math.hypot(fx, fy);
  if (!(force + Math.abs(moment) > 0) || !Number.isFinite(force + moment)) return icFailure('no-load');
  if (Math.abs(moment) > 1e-9 * force) return icFailure('no-moment-resistance');
  const ratio = boltForceRatio(1, curve);
  const there = { ux: fx / force, uy: fy / force, turn: 0 };
  const forces = new Float64Array(2 * count);
  for (let i = 0; i < count; i++) {
    forces[2 * i] = ratio * there.ux;
    forces[2 * i + 1] = ratio * there.uy;
  }
  return { ...icSolution((count * ratio) / force / unit, there, centroid, 1, 0), forces };
}
