import { momentAbout, type GroupLoad } from './group-load.ts';
import type { BoltGroup } from './bolt-group.ts';

/**
 * Elastic vector method: the force shared equally, the moment about the centroid in proportion to the distance
 * from it, `F = P/n + M r/Σr²` square to the radius, added as vectors. A moment on bolts that are all at one place has
 * no answer: every force is then infinite.
 * @param out receives the force of each bolt, x and y in turn; N for a load in N
 * Source: AISC Manual, Part 7, elastic method; CISC Handbook, Part 3, eccentric loads on bolt groups.
 */
export function elasticBoltForces(group: BoltGroup, load: GroupLoad, out: Float64Array): void {
  const { count, dx, dy, polar, centroid } = group;
  const moment = momentAbout(load, centroid.x, centroid.y);
  if (polar === 0 && moment !== 0) {
    out.fill(Infinity);
    return;
  }
  const turn = moment === 0 ? 0 : moment / polar;
  for (let i = 0; i < count; i++) {
    out[2 * i] = load.fx / count - turn * dy[i]!;
    out[2 * i + 1] = load.fy / count + turn * dx[i]!;
  }
}

/**
 * The most loaded bolt and its force, over every bolt of the group. N for a load in N.
 * A moment on bolts that are all at one place gives an infinite force, as does a group without bolts.
 */
export function worstElasticBolt(group: BoltGroup, load: GroupLoad): { index: number; force: number } {
  const { count, dx, dy, polar, centroid } = group;
  const moment = momentAbout(load, centroid.x, centroid.y);
  if (count === 0 || (polar === 0 && moment !== 0)) return { index: 0, force: Infinity };
  const turn = moment === 0 ? 0 : moment / polar;
  let index = 0;
  let most = -1;
  for (let i = 0; i < count; i++) {
    const square = (load.fx / count - turn * dy[i]!) ** 2 + (load.fy / count + turn * dx[i]!) ** 2;
    if (square > most) {
      most = square;
      index = i;
    }
  }
  return { index, force: Math.sqrt(most) };
}

/** Loads of this kind that the group carries, for bolts of strength 1: one over the worst bolt's force. */
export function elasticBoltMultiplier(group: BoltGroup, load: GroupLoad): number {
  return 1 / worstElasticBolt(group, load).force;
}
