import { BOLT_CURVE, boltForceRatio, type BoltCurve, type BoltNormalisation } from './bolt-curve.ts';
import type { BoltGroup } from './bolt-group.ts';
import { BoltMotion } from './bolt-motion.ts';
import { momentAbout, type GroupLoad } from './group-load.ts';
import { icFailure, icSolution, type IcResult } from './ic-result.ts';
import { MotionState, searchMotion } from './rigid-motion.ts';

export interface BoltIcOptions {
  readonly normalise?: BoltNormalisation;
  readonly curve?: BoltCurve;
}

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
export function boltGroupIc(group: BoltGroup, load: GroupLoad, options: BoltIcOptions = {}): IcResult {
  const { curve = BOLT_CURVE } = options;
  const unit = options.normalise === 'atMaximum' ? boltForceRatio(1, curve) : 1;
  const { centroid, count, radius, polar } = group;
  if (!(count > 0) || !Number.isFinite(radius)) return icFailure('no-group');
  const moment = momentAbout(load, centroid.x, centroid.y);
  const force = Math.hypot(load.fx, load.fy);
  if (!(force + Math.abs(moment) > 0) || !Number.isFinite(force + moment)) return icFailure('no-load');
  if (radius === 0) {
    // All bolts at one place: they share a force evenly and cannot resist a moment.
    if (Math.abs(moment) > 1e-9 * force) return icFailure('no-moment-resistance');
    const ratio = boltForceRatio(1, curve);
    const there = { ux: load.fx / force, uy: load.fy / force, turn: 0 };
    return icSolution((count * ratio) / force / unit, there, centroid, 1, 0);
  }
  g[0] = load.fx;
  g[1] = load.fy;
  g[2] = moment / radius;
  const size = Math.sqrt(g[0]! ** 2 + g[1]! ** 2 + g[2]! ** 2);
  for (let i = 0; i < 3; i++) g[i] = g[i]! / size;
  motion.use(group, curve);
  state.q[0] = g[0]! / count;
  state.q[1] = g[1]! / count;
  state.q[2] = (g[2]! * radius * radius) / polar;
  if (!searchMotion(motion, state, g)) return icFailure('not-converged', state.imbalance);
  const found = { ux: state.q[0]!, uy: state.q[1]!, turn: state.q[2]! };
  return icSolution(state.load / size / unit, found, centroid, radius, state.imbalance);
}

/**
 * Force of each bolt at failure, x and y in turn, for bolts of ultimate strength 1; together they balance the multiplied
 * load. Deformations grow with the distance from the centre up to the greatest at the farthest bolt.
 */
export function boltIcForces(
  group: BoltGroup,
  { motion: at }: { readonly motion: { ux: number; uy: number; turn: number } },
  curve: BoltCurve = BOLT_CURVE,
): Float64Array {
  const { count, dx, dy, radius } = group;
  const forces = new Float64Array(2 * count);
  for (let i = 0; i < count; i++) {
    const turn = radius === 0 ? 0 : at.turn / radius;
    const ux = at.ux - turn * dy[i]!;
    const uy = at.uy + turn * dx[i]!;
    const moved = Math.hypot(ux, uy);
    if (moved === 0) continue;
    const ratio = boltForceRatio(moved, curve) / moved;
    forces[2 * i] = ratio * ux;
    forces[2 * i + 1] = ratio * uy;
  }
  return forces;
}
