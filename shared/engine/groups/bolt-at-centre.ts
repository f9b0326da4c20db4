import { boltDeformation, boltForceRatio, type BoltCurve } from './bolt-curve.ts';
import type { BoltGroup } from './bolt-group.ts';
import { EQUILIBRIUM_TOLERANCE } from './ic-result.ts';
import type { MotionState } from './rigid-motion.ts';

const MOST_ROUNDS = 40;
/** Force over R_ult up to which a bolt counts as standing at the centre. */
const MOST_FORCE = 0.02;

/**
 * Balance of a group of which one bolt stands at the instantaneous centre, or nearer to it than its motion can be told
 * apart from the centroid's. The curve of a bolt starts upright, so its force is the unknown there and its motion, far
 * smaller, follows from it: `M = λ m` about that bolt gives the load, the forces the rest.
 * Takes the motion of `state` as the start and leaves the balanced one there.
 * @param forces receives the force of each bolt, x and y in turn
 */
export function balanceAtBolt(
  group: BoltGroup,
  curve: BoltCurve,
  state: MotionState,
  g: Float64Array,
  forces: Float64Array,
): boolean {
  const { dx, dy, radius } = group;
  const bolt = nearestBolt(group, state.q);
  const sense = Math.sign(state.q[2]!);
  const bx = dx[bolt]! / radius;
  const by = dy[bolt]! / radius;
  const moment = g[2]! - (bx * g[1]! - by * g[0]!);
  let fx = 0;
  let fy = 0;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const force = Math.hypot(fx, fy);
    if (!(force <= MOST_FORCE)) return false;
    const slack = force === 0 ? 0 : boltDeformation(force, curve) / force;
    const [tx, ty] = [slack * fx, slack * fy];
    const turn = sense * turnToLimit(group, bolt, sense * tx, sense * ty);
    const sum = othersForces(group, bolt, curve, tx, ty, turn, forces);
    state.load = sum.moment / moment;
    const error = Math.hypot(state.load * g[0]! - sum.x - fx, state.load * g[1]! - sum.y - fy);
    forces[2 * bolt] = fx;
    forces[2 * bolt + 1] = fy;
    state.q[0] = tx + turn * by;
    state.q[1] = ty - turn * bx;
    state.q[2] = turn;
    state.imbalance = state.load > 0 ? error / state.load : Infinity;
    if (state.imbalance < EQUILIBRIUM_TOLERANCE * 1e-4) return true;
    fx = state.load * g[0]! - sum.x;
    fy = state.load * g[1]! - sum.y;
  }
  return state.imbalance <= EQUILIBRIUM_TOLERANCE;
}

function nearestBolt({ count, dx, dy, radius }: BoltGroup, q: Float64Array): number {
  const turn = q[2]! / radius;
  let nearest = 0;
  let least = Infinity;
  for (let i = 0; i < count; i++) {
    const square = (q[0]! - turn * dy[i]!) ** 2 + (q[1]! + turn * dx[i]!) ** 2;
    if (square < least) {
      least = square;
      nearest = i;
    }
  }
  return nearest;
}

/** Positive turn at which the first bolt reaches Δ_max, when `bolt` has moved by (tx, ty). */
function turnToLimit(group: BoltGroup, bolt: number, tx: number, ty: number): number {
  const { count, dx, dy, radius } = group;
  let least = Infinity;
  for (let i = 0; i < count; i++) {
    const x = (dx[i]! - dx[bolt]!) / radius;
    const y = (dy[i]! - dy[bolt]!) / radius;
    const square = x * x + y * y;
    if (square === 0) continue;
    const half = (x * ty - y * tx) / square;
    least = Math.min(least, Math.sqrt(half * half + (1 - tx * tx - ty * ty) / square) - half);
  }
  return least;
}

/** Forces of all bolts but one into `forces`; their sum, and their moment about that bolt over the radius. */
function othersForces(
  group: BoltGroup,
  bolt: number,
  curve: BoltCurve,
  tx: number,
  ty: number,
  turn: number,
  forces: Float64Array,
): { x: number; y: number; moment: number } {
  const { count, dx, dy, radius } = group;
  const sum = { x: 0, y: 0, moment: 0 };
  for (let i = 0; i < count; i++) {
    if (i === bolt) continue;
    const x = (dx[i]! - dx[bolt]!) / radius;
    const y = (dy[i]! - dy[bolt]!) / radius;
    const ux = tx - turn * y;
    const uy = ty + turn * x;
    const moved = Math.sqrt(ux * ux + uy * uy);
    const secant = boltForceRatio(moved, curve) / moved;
    forces[2 * i] = secant * ux;
    forces[2 * i + 1] = secant * uy;
    sum.x += secant * ux;
    sum.y += secant * uy;
    sum.moment += secant * (x * uy - y * ux);
  }
  return sum;
}
