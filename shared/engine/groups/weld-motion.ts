import { weldDeformationLimit, weldLimitSlope, WeldPoint } from './weld-curve.ts';
import { lengthOf, type WeldGroup } from './weld-group.ts';
import type { MotionState, RigidGroup } from './rigid-motion.ts';

/** Gauss points and weights on 0 to 1, three to a panel. */
const PLACES = [0.5 - Math.sqrt(0.15), 0.5, 0.5 + Math.sqrt(0.15)];
const WEIGHTS = [5 / 18, 8 / 18, 5 / 18];

const point = new WeldPoint();

/** A weld group cut into points along its lines. Lengths over the group's radius, deformations over the leg. */
export class WeldMotion implements RigidGroup {
  private readonly x: Float64Array;
  private readonly y: Float64Array;
  /** Unit vector along the weld, and length, over the radius, that the point stands for. */
  private readonly ax: Float64Array;
  private readonly ay: Float64Array;
  private readonly share: Float64Array;
  /** Ends of the segments follow the points: they have no share, but the first of them to reach Δ_u decides. */
  private readonly points: number;

  constructor(group: WeldGroup, panels: number) {
    const { segments, centroid, radius } = group;
    this.points = segments.length * panels * PLACES.length;
    const all = this.points + 2 * segments.length;
    this.x = new Float64Array(all);
    this.y = new Float64Array(all);
    this.ax = new Float64Array(all);
    this.ay = new Float64Array(all);
    this.share = new Float64Array(all);
    segments.forEach((segment, index) => {
      const own = lengthOf(segment);
      const { from, to } = segment;
      const put = (at: number, along: number, share: number) => {
        this.x[at] = (from.x + along * (to.x - from.x) - centroid.x) / radius;
        this.y[at] = (from.y + along * (to.y - from.y) - centroid.y) / radius;
        this.ax[at] = (to.x - from.x) / own;
        this.ay[at] = (to.y - from.y) / own;
        this.share[at] = share;
      };
      let at = index * panels * PLACES.length;
      for (let panel = 0; panel < panels; panel++) {
        PLACES.forEach((place, k) => {
          put(at++, (panel + place) / panels, (WEIGHTS[k]! * own) / panels / radius);
        });
      }
      put(this.points + 2 * index, 0, 0);
      put(this.points + 2 * index + 1, 1, 0);
    });
  }

  /**
   * Along a straight segment the motion square to it rises towards one end, and with it both the deformation
   * and the angle, while Δ_u falls: the critical millimetre is always an end of a segment.
   */
  evaluate(state: MotionState, lastStep: number): void {
    const { q, limit } = state;
    let most = 0;
    let critical = this.points;
    for (let i = this.points; i < this.x.length; i++) {
      const ux = q[0]! - q[2]! * this.y[i]!;
      const uy = q[1]! + q[2]! * this.x[i]!;
      const along = ux * this.ax[i]! + uy * this.ay[i]!;
      const across = uy * this.ax[i]! - ux * this.ay[i]!;
      const motion = Math.sqrt(ux * ux + uy * uy);
      const part = motion / weldDeformationLimit(Math.abs(across) / motion, Math.abs(along) / motion);
      if (part > most) {
        most = part;
        critical = i;
      }
    }
    for (let i = 0; i < 3; i++) q[i] = q[i]! / most;
    this.limitAt(critical, q, limit);
    this.respond(state, lastStep);
  }

  /** Gradient of the deformation over its limit at point `i`. */
  private limitAt(i: number, q: Float64Array, limit: Float64Array): void {
    const ux = q[0]! - q[2]! * this.y[i]!;
    const uy = q[1]! + q[2]! * this.x[i]!;
    const motion = Math.sqrt(ux * ux + uy * uy);
    const cx = ux / motion;
    const cy = uy / motion;
    const cosine = cx * this.ax[i]! + cy * this.ay[i]!;
    const sine = cy * this.ax[i]! - cx * this.ay[i]!;
    const most = weldDeformationLimit(Math.abs(sine), Math.abs(cosine));
    const slope = weldLimitSlope(Math.abs(sine), Math.abs(cosine)) * Math.sign(sine * cosine);
    const direct = 1 / most;
    const turned = -slope / (most * most);
    limit[0] = direct * cx - turned * cy;
    limit[1] = direct * cy + turned * cx;
    limit[2] = direct * (this.x[i]! * cy - this.y[i]! * cx) + turned * (this.x[i]! * cx + this.y[i]! * cy);
  }

  private respond(state: MotionState, lastStep: number): void {
    const { q, force, stiffness } = state;
    force.fill(0);
    stiffness.fill(0);
    for (let i = 0; i < this.points; i++) {
      const x = this.x[i]!;
      const y = this.y[i]!;
      const ux = q[0]! - q[2]! * y;
      const uy = q[1]! + q[2]! * x;
      const motion = Math.max(Math.sqrt(ux * ux + uy * uy), 1e-150);
      const cx = ux / motion;
      const cy = uy / motion;
      const cosine = cx * this.ax[i]! + cy * this.ay[i]!;
      const sine = cy * this.ax[i]! - cx * this.ay[i]!;
      point.set(motion, Math.abs(sine), Math.abs(cosine));
      const share = this.share[i]!;
      const r = share * point.strength;
      const lever = x * cy - y * cx;
      const arm = x * cx + y * cy;
      force[0] = force[0]! + r * cx;
      force[1] = force[1]! + r * cy;
      force[2] = force[2]! + r * lever;
      const secant = r / motion;
      const radial = motion < 0.2 * lastStep ? secant : share * point.byMotion;
      const turned = (share * point.byAngle * Math.sign(sine * cosine)) / motion;
      addOuter(
        stiffness,
        cx,
        cy,
        lever,
        radial * cx - turned * cy,
        radial * cy + turned * cx,
        radial * lever + turned * arm,
      );
      addOuter(stiffness, -cy, cx, arm, -secant * cy, secant * cx, secant * arm);
    }
  }
}

/** Adds the outer product of (a, b, c) and (d, e, f). */
function addOuter(k: Float64Array, a: number, b: number, c: number, d: number, e: number, f: number): void {
  k[0] = k[0]! + a * d;
  k[1] = k[1]! + a * e;
  k[2] = k[2]! + a * f;
  k[3] = k[3]! + b * d;
  k[4] = k[4]! + b * e;
  k[5] = k[5]! + b * f;
  k[6] = k[6]! + c * d;
  k[7] = k[7]! + c * e;
  k[8] = k[8]! + c * f;
}
