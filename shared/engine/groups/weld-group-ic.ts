import { momentAbout, type GroupLoad } from './group-load.ts';
import { icFailure, icSolution, type IcResult } from './ic-result.ts';
import { MotionState, searchMotion } from './rigid-motion.ts';
import type { WeldGroup } from './weld-group.ts';
import { WeldMotion } from './weld-motion.ts';

const state = new MotionState();
const g = new Float64Array(3);

/** Panels of three Gauss points each that a segment is cut into. */
const PANELS = 12;

/** Further starts of the search when the elastic one leads nowhere: shares of turning and of moving square to the load. */
const STARTS: readonly (readonly [turn: number, across: number])[] = [
  [0, 0],
  [0.01, 0],
  [-0.01, 0],
  [0.1, 0.05],
  [-0.1, 0.05],
  [0.1, -0.05],
  [-0.1, -0.05],
  [0.5, 0.2],
  [-0.5, 0.2],
  [0.5, -0.2],
  [-0.5, -0.2],
  [1, 0],
  [-1, 0],
];

/**
 * Strength of a group of straight fillets of one leg by the instantaneous centre of rotation: every millimetre by its own
 * deformation and its own angle to the force, and the first to reach its greatest deformation ends it. The multiplier is a
 * length for a load of 1 N: the millimetres of longitudinal weld that the group is worth, `R = multiplier r_0` with
 * `r_0 = 0.60 F_EXX` on the throat. A failure is never a number.
 *
 * Source: Lesik and Kennedy, Can. J. Civ. Eng. 17, 1990; AISC Manual, Part 8; ANSI/AISC 360-22, Commentary J2.4.
 */
export function weldGroupIc(group: WeldGroup, load: GroupLoad): IcResult {
  const { centroid, radius, ip, length } = group;
  if (!(length > 0) || !(radius > 0) || !Number.isFinite(length)) return icFailure('no-group');
  const moment = momentAbout(load, centroid.x, centroid.y);
  const force = Math.hypot(load.fx, load.fy);
  if (!(force + Math.abs(moment) > 0) || !Number.isFinite(force + moment)) return icFailure('no-load');
  g[0] = load.fx;
  g[1] = load.fy;
  g[2] = moment / radius;
  const size = Math.sqrt(g[0]! ** 2 + g[1]! ** 2 + g[2]! ** 2);
  for (let i = 0; i < 3; i++) g[i] = g[i]! / size;
  const motion = new WeldMotion(group, PANELS);
  const elastic = [g[0]! / length, g[1]! / length, (g[2]! * radius * radius) / ip] as const;
  const reach = Math.hypot(...elastic);
  let least = Infinity;
  for (const [turn, across] of STARTS) {
    state.q[0] = elastic[0] - across * reach * g[1]!;
    state.q[1] = elastic[1] + across * reach * g[0]!;
    state.q[2] = elastic[2] + turn * reach;
    if (searchMotion(motion, state, g)) {
      const found = { ux: state.q[0]!, uy: state.q[1]!, turn: state.q[2]! };
      return icSolution((state.load / size) * radius, found, centroid, radius, state.imbalance);
    }
    least = Math.min(least, state.imbalance);
  }
  return icFailure('not-converged', least);
}
