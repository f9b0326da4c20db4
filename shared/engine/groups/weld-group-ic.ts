import { bisectCentre } from './centre-bisection.ts';
import { momentAbout, unitVector, type GroupLoad } from './group-load.ts';
import { icFailure, icSolution, type IcResult } from './ic-result.ts';
import { MotionState, moveFrom, searchMotion } from './rigid-motion.ts';
import type { WeldGroup } from './weld-group.ts';
import { WeldMotion } from './weld-motion.ts';

const state = new MotionState();
const g = new Float64Array(3);

/**
 * Panels of three Gauss points each that a segment is cut into: while equilibria are looked for, and for the strength, which
 * then is within 0.001 % of finer cuts even where the centre stands on a weld.
 */
const COARSE = 6;
const FINE = 48;

/**
 * Starts of the search beside the elastic one, as angles from the load and about it: a ring at 30° and one at 60°. The strength
 * of a fillet falls beyond Δ_m, so that a group can have several equilibria.
 */
const STARTS: readonly (readonly [from: number, about: number])[] = [1, 2].flatMap((ring) =>
  Array.from({ length: 8 }, (_, step) => [(ring * Math.PI) / 6, (step * Math.PI) / 4] as const),
);

/**
 * Strength of a group of straight fillets of one leg by the instantaneous centre of rotation: every millimetre by its own
 * deformation and its own angle to the force, and the first to reach its greatest deformation ends it. The multiplier is a
 * length for a load of 1 N: the millimetres of longitudinal weld that the group is worth, `R = multiplier r_0` with
 * `r_0 = 0.60 F_EXX` on the throat. Of several equilibria it is the one with the least load. A failure is never a number.
 *
 * Source: Lesik and Kennedy, Can. J. Civ. Eng. 17, 1990; AISC Manual, Part 8; ANSI/AISC 360-22, Commentary J2.4.
 */
export function weldGroupIc(group: WeldGroup, load: GroupLoad): IcResult {
  const { centroid, radius, ip, length } = group;
  if (!(length > 0) || !(radius > 0) || !Number.isFinite(length)) return icFailure('no-group');
  const size = unitVector(load, momentAbout(load, centroid.x, centroid.y) / radius, g);
  if (size === 0) return icFailure('no-load');
  const elastic: Motion = [g[0]! / length, g[1]! / length, (g[2]! * radius * radius) / ip];
  state.q.set(leastEquilibrium(new WeldMotion(group, COARSE), elastic) ?? elastic);
  const fine = new WeldMotion(group, FINE);
  const attempt = () => searchMotion(fine, state, g);
  if (!attempt() && !bisectCentre(fine, state, g, attempt)) {
    return icFailure('not-converged', state.imbalance);
  }
  const found = { ux: state.q[0]!, uy: state.q[1]!, turn: state.q[2]! };
  return icSolution((state.load / size) * radius, found, centroid, radius, state.imbalance);
}

type Motion = readonly [x: number, y: number, turn: number];

/** The equilibrium with the least load that a search from any start finds; null where none does. */
function leastEquilibrium(motion: WeldMotion, elastic: Motion): Motion | null {
  let least = Infinity;
  let at: Motion | null = null;
  const attempt = () => {
    if (!searchMotion(motion, state, g) || state.load >= least) return;
    least = state.load;
    at = [state.q[0]!, state.q[1]!, state.q[2]!];
  };
  state.q.set(elastic);
  attempt();
  state.q.set(g);
  attempt();
  for (const [from, about] of STARTS) {
    moveFrom(g, from, about, state.q);
    attempt();
  }
  return at;
}
