import { BOLT_CURVE, boltForceRatio, type BoltCurve } from './bolt-curve.ts';
import type { BoltGroup } from './bolt-group.ts';
import type { MotionState, RigidGroup } from './rigid-motion.ts';

/** Forces of bolts on a plate that moves rigidly, each along its own motion. Lengths over the group's radius. */
export class BoltMotion implements RigidGroup {
  private group!: BoltGroup;
  private curve = BOLT_CURVE;

  use(group: BoltGroup, curve: BoltCurve): void {
    this.group = group;
    this.curve = curve;
  }

  /** Motion of the farthest bolt, in the unit of `q`. */
  private reach(q: Float64Array): number {
    const { count, dx, dy, radius } = this.group;
    const turn = q[2]! / radius;
    let most = 0;
    for (let i = 0; i < count; i++) {
      const x = q[0]! - turn * dy[i]!;
      const y = q[1]! + turn * dx[i]!;
      most = Math.max(most, x * x + y * y);
    }
    return Math.sqrt(most);
  }

  evaluate(state: MotionState, lastStep: number): void {
    const { q } = state;
    const most = this.reach(q);
    for (let i = 0; i < 3; i++) q[i] = q[i]! / most;
    this.respond(state, lastStep);
  }

  /**
   * Force of each bolt at `q`, x and y in turn.
   * @returns the least motion of a bolt over Δ_max
   */
  forcesAt(q: Float64Array, out: Float64Array): number {
    let least = Infinity;
    const { count, dx, dy, radius } = this.group;
    const turn = q[2]! / radius;
    for (let i = 0; i < count; i++) {
      const ux = q[0]! - turn * dy[i]!;
      const uy = q[1]! + turn * dx[i]!;
      const moved = Math.max(Math.sqrt(ux * ux + uy * uy), 1e-150);
      const secant = boltForceRatio(moved, this.curve) / moved;
      out[2 * i] = secant * ux;
      out[2 * i + 1] = secant * uy;
      least = Math.min(least, moved);
    }
    return least;
  }

  /** Forces and stiffness at `q` as it is, with 1 the motion at Δ_max. */
  private respond(state: MotionState, lastStep: number): void {
    const { q, force, stiffness: k, limit } = state;
    const { count, dx, dy, radius } = this.group;
    const { decay, power } = this.curve;
    force.fill(0);
    k.fill(0);
    let most = -1;
    for (let i = 0; i < count; i++) {
      const x = dx[i]! / radius;
      const y = dy[i]! / radius;
      const ux = q[0]! - q[2]! * y;
      const uy = q[1]! + q[2]! * x;
      const motion = Math.max(Math.sqrt(ux * ux + uy * uy), 1e-150);
      const cx = ux / motion;
      const cy = uy / motion;
      const lever = x * cy - y * cx;
      if (motion > most) {
        most = motion;
        limit[0] = cx;
        limit[1] = cy;
        limit[2] = lever;
      }
      const grown = -Math.expm1(-decay * motion);
      const r = Math.pow(grown, power);
      const secant = r / motion;
      const tangent =
        motion < 2 * lastStep && motion < 0.1 ? secant : (power * r * decay * (1 - grown)) / grown;
      force[0] = force[0]! + r * cx;
      force[1] = force[1]! + r * cy;
      force[2] = force[2]! + r * lever;
      addStiffness(k, tangent - secant, cx, cy, lever);
      // The secant part is the same in every direction of the bolt's motion.
      k[0] = k[0]! + secant;
      k[2] = k[2]! - secant * y;
      k[4] = k[4]! + secant;
      k[5] = k[5]! + secant * x;
      k[8] = k[8]! + secant * (x * x + y * y);
    }
    k[3] = k[1]!;
    k[6] = k[2]!;
    k[7] = k[5]!;
  }
}

/** Upper triangle of `factor` times the square of (a, b, c). */
function addStiffness(k: Float64Array, factor: number, a: number, b: number, c: number): void {
  k[0] = k[0]! + factor * a * a;
  k[1] = k[1]! + factor * a * b;
  k[2] = k[2]! + factor * a * c;
  k[4] = k[4]! + factor * b * b;
  k[5] = k[5]! + factor * b * c;
  k[8] = k[8]! + factor * c * c;
}
