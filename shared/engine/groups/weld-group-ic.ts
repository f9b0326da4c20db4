import { bisectCentre } from './centre-bisection.ts';
import { momentAbout, unitVector, type GroupLoad } from './group-load.ts';
import { icFailure, icSolution, type IcResult } from './ic-result.ts';
import { MotionState, moveFrom, searchMotion } from './rigid-motion.ts';
import type { WeldGroup } from './weld-group.ts';
import { WeldMotion } from './weld-motion.ts';

const state = new MotionState();
const g = new Float64Array(3);

/** Panels of three Gauss points each that a segment is cut into. */
const PANELS = 12;

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
  const motion = new WeldMotion(group, PANELS);
  const least = leastEquilibrium(motion, [g[0]! / length, g[1]! / length, (g[2]! * radius * radius) / ip]);
  if (least === null) return icFailure('not-converged', state.imbalance);
  const { q, load: carried, imbalance } = least;
  const found = { ux: q[0], uy: q[1], turn: q[2] };
  return icSolution((carried / size) * radius, found, centroid, radius, imbalance);
}

type Motion = readonly [x: number, y: number, turn: number];

interface Equilibrium {
  readonly q: Motion;
  readonly load: number;
  readonly imbalance: number;
}

/** The equilibrium with the least load that a search from any start finds; by bisection where none does. */
function leastEquilibrium(motion: WeldMotion, elastic: Motion): Equilibrium | null {
  let least: Equilibrium | null = null;
  const attempt = () => {
    if (!searchMotion(motion, state, g)) return false;
    if (least === null || state.load < least.load) {
      const { q, load, imbalance } = state;
      least = { q: [q[0]!, q[1]!, q[2]!], load, imbalance };
    }
    return true;
  };
  state.q.set(elastic);
  attempt();
  state.q.set(g);
  attempt();
  for (const [from, about] of STARTS) {
    moveFrom(g, from, about, state.q);
    attempt();
  }
  if (least === null) bisectCentre(motion, state, g, attempt);
  return least;
}
