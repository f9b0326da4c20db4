import { GroupBearing } from '../limit-states/group-bearing.ts';
import type { PlyEdges, UprightGroup } from '../limit-states/upright-group.ts';
import type { Basis, BearingPly, BoltInShear } from '../standards/basis.ts';
import { type BoltPrefix, normalHole } from './parts.ts';
import type { Resolved } from './resolved.ts';

/** What the plies of a lap share: its bolts, in level rows and in columns along the face of the support. */
export interface Lap {
  readonly values: Resolved;
  readonly basis: Basis;
  readonly bolt: BoltInShear;
  readonly group: UprightGroup;
  readonly oneBolt: number;
  /** Bolts in one shear plane, between two plies. */
  readonly single: boolean;
  /** Before the names of the bolt's parameters. */
  readonly prefix?: BoltPrefix;
}

/** Bearing on one ply; a basis may hold it down across a single column or a single row. */
export function bearingOf(lap: Lap, thickness: number, fu: number, edges: PlyEdges): GroupBearing {
  const { values, basis, bolt, group, oneBolt } = lap;
  const limited = lap.single && values.choice('single_lap') === 'limited';
  const ply = (singleLapOneRow: boolean): BearingPly => ({
    size: bolt.size,
    grade: bolt.grade,
    holeDiameter: bolt.holeDiameter,
    normalHole: normalHole(values, basis, lap.prefix) ?? bolt.holeDiameter,
    thickness,
    fu,
    singleLapOneRow,
    // Shear of the bolts is a limit state of its own, found for the most loaded bolt.
    boltShear: Infinity,
    deformationMatters: values.choice('hole_deformation') === 'limited',
  });
  const level = basis.bearing(ply(limited && group.columns === 1));
  const upright = basis.bearing(ply(limited && group.rows === 1));
  const least = values.choice('bolt_bearing') === 'least';
  return new GroupBearing(basis, level, upright, group, edges, oneBolt, least);
}
