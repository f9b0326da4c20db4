import { EQUILIBRIUM_TOLERANCE } from './ic-result.ts';

/**
 * A group whose members deform as one rigid plate moves: `q` is (u_x, u_y, rotation), lengths over the group's
 * radius, `g` the load in the same terms. In a direction of motion the plate goes on until the first member
 * reaches its greatest deformation.
 */
export interface RigidGroup {
  /**
   * Scales `q` so that the critical member is at its limit and writes the forces and moment there into `force`,
   * their derivative into `stiffness` (3 by 3, by rows) and the gradient of the critical member's deformation
   * over its limit into `limit`.
   * @param lastStep length of the last step in `q`; members that moved less are taken by their secant stiffness
   */
  evaluate(state: MotionState, lastStep: number): void;
}

/** Work space of one search; reused, so that a search allocates nothing. */
export class MotionState {
  readonly q = new Float64Array(3);
  readonly force = new Float64Array(3);
  readonly stiffness = new Float64Array(9);
  readonly limit = new Float64Array(3);
  readonly imbalanceVector = new Float64Array(3);
  /** Load over the unit load vector, and the length of the imbalance over it. */
  load = 0;
  imbalance = Infinity;
}

const TARGET = 1e-13;
const MOST_STEPS = 60;
const MOST_HALVINGS = 9;

const trial = new Float64Array(3);
const newton = new Float64Array(3);
const growth = new Float64Array(3);
const matrix = new Float64Array(9);

/** Load that the motion of `state` balances best, and what is left over. */
export function measure(group: RigidGroup, state: MotionState, g: Float64Array, lastStep: number): void {
  group.evaluate(state, lastStep);
  const { force, imbalanceVector: r } = state;
  const load = dot(force, g);
  let square = 0;
  for (let i = 0; i < 3; i++) {
    const rest = force[i]! - load * g[i]!;
    r[i] = rest;
    square += rest * rest;
  }
  state.load = load;
  state.imbalance = load > 0 ? Math.sqrt(square) / load : Infinity;
}

/**
 * Damped Newton search for the motion whose member forces are parallel to the load `g` (a unit vector), from
 * the motion in `state`. Returns whether the forces balance to `EQUILIBRIUM_TOLERANCE`; `state` holds the
 * best motion found.
 */
export function searchMotion(group: RigidGroup, state: MotionState, g: Float64Array): boolean {
  let step = 1;
  measure(group, state, g, step);
  for (let count = 0; count < MOST_STEPS && state.imbalance > TARGET; count++) {
    if (!newtonStep(state, g)) break;
    const before = state.imbalance;
    step = descend(group, state, g);
    if (step === 0) break;
    if (state.imbalance < EQUILIBRIUM_TOLERANCE * 1e-2 && state.imbalance > before / 4) break;
  }
  return state.imbalance <= EQUILIBRIUM_TOLERANCE;
}

/** Newton's step along the surface of motions that just reach the limit, into `newton`. */
function newtonStep(state: MotionState, g: Float64Array): boolean {
  const { imbalanceVector: r, limit, stiffness } = state;
  for (let i = 0; i < 3; i++) newton[i] = -r[i]!;
  growth.set(g);
  matrix.set(stiffness);
  if (!solvePair(matrix, newton, growth)) return false;
  const rise = dot(limit, growth);
  if (rise === 0) return false;
  const more = -dot(limit, newton) / rise;
  for (let i = 0; i < 3; i++) newton[i] = newton[i]! + more * growth[i]!;
  return Number.isFinite(newton[0]! + newton[1]! + newton[2]!);
}

/** Takes the longest of the halved steps that lessens the imbalance; returns its length, 0 if none does. */
function descend(group: RigidGroup, state: MotionState, g: Float64Array): number {
  const before = state.imbalance;
  const size = Math.sqrt(dot(newton, newton));
  trial.set(state.q);
  let part = 1;
  for (let halving = 0; halving < MOST_HALVINGS; halving++) {
    for (let i = 0; i < 3; i++) state.q[i] = trial[i]! + part * newton[i]!;
    measure(group, state, g, part * size);
    if (state.imbalance < before * (1 - 1e-4 * part)) return part * size;
    part /= 2;
  }
  state.q.set(trial);
  measure(group, state, g, size);
  return 0;
}

/** Writes into `q` the unit motion at an angle `from` the load `g` (a unit vector), in the direction `about` it; radians. */
export function moveFrom(g: Float64Array, from: number, about: number, q: Float64Array): void {
  const [x, y, z] = [g[0]!, g[1]!, g[2]!];
  const flat = Math.hypot(x, y);
  // Two directions square to the load and to each other; a moment alone has any.
  const [u, v] = flat > 0 ? [-y / flat, x / flat] : [1, 0];
  const one = Math.sin(from) * Math.cos(about);
  const other = Math.sin(from) * Math.sin(about);
  const along = Math.cos(from);
  q[0] = along * x + one * u - other * z * v;
  q[1] = along * y + one * v + other * z * u;
  q[2] = along * z + other * (x * v - y * u);
}

export function dot(a: Float64Array, b: Float64Array): number {
  return a[0]! * b[0]! + a[1]! * b[1]! + a[2]! * b[2]!;
}

/** Solves M a = a and M b = b in place by elimination with row exchange; false where M is singular. */
function solvePair(m: Float64Array, a: Float64Array, b: Float64Array): boolean {
  for (let column = 0; column < 3; column++) {
    let pivot = column;
    for (let row = column + 1; row < 3; row++) {
      if (Math.abs(m[3 * row + column]!) > Math.abs(m[3 * pivot + column]!)) pivot = row;
    }
    const largest = m[3 * pivot + column]!;
    if (!(Math.abs(largest) > 0) || !Number.isFinite(largest)) return false;
    if (pivot !== column) exchange(m, a, b, pivot, column);
    for (let row = column + 1; row < 3; row++) {
      const factor = m[3 * row + column]! / largest;
      for (let k = column; k < 3; k++) m[3 * row + k] = m[3 * row + k]! - factor * m[3 * column + k]!;
      a[row] = a[row]! - factor * a[column]!;
      b[row] = b[row]! - factor * b[column]!;
    }
  }
  for (let row = 2; row >= 0; row--) {
    for (let k = row + 1; k < 3; k++) {
      a[row] = a[row]! - m[3 * row + k]! * a[k]!;
      b[row] = b[row]! - m[3 * row + k]! * b[k]!;
    }
    a[row] = a[row]! / m[4 * row]!;
    b[row] = b[row]! / m[4 * row]!;
  }
  return true;
}

function exchange(m: Float64Array, a: Float64Array, b: Float64Array, one: number, other: number): void {
  for (let k = 0; k < 3; k++) {
    const kept = m[3 * one + k]!;
    m[3 * one + k] = m[3 * other + k]!;
    m[3 * other + k] = kept;
  }
  for (const vector of [a, b]) {
    const kept = vector[one]!;
    vector[one] = vector[other]!;
    vector[other] = kept;
  }
}
