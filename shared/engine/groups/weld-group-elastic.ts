import { momentAbout, type GroupLoad } from './group-load.ts';
import type { WeldGroup } from './weld-group.ts';

/**
 * Elastic vector method for fillets as lines: the force shared by length, the moment about the centroid in proportion to the
 * distance from it, at the ends of every segment, of which one is the worst.
 * @returns greatest force per millimetre for the given load, N/mm; infinite for a group without weld
 * Source: AISC Manual, Part 8, elastic method; CISC Handbook, Part 3.
 */
export function worstElasticWeld(group: WeldGroup, load: GroupLoad): number {
  const { segments, centroid, length, ip } = group;
  if (!(length > 0)) return Infinity;
  const moment = momentAbout(load, centroid.x, centroid.y);
  let most = 0;
  for (const segment of segments) {
    for (const end of [segment.from, segment.to]) {
      const fx = load.fx / length - (moment * (end.y - centroid.y)) / ip;
      const fy = load.fy / length + (moment * (end.x - centroid.x)) / ip;
      most = Math.max(most, Math.hypot(fx, fy));
    }
  }
  return most;
}
