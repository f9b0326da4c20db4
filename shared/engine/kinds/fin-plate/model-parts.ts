import { GroupBearing } from '../../limit-states/group-bearing.ts';
import type { PlyEdges, UprightGroup } from '../../limit-states/upright-group.ts';
import type { Basis, BearingPly, BoltInShear, FilletSpec } from '../../standards/basis.ts';
import { normalHole, weldedParts, type WeldedPlate } from '../parts.ts';
import type { Resolved } from '../resolved.ts';
import { TOLERANCE } from '../rules.ts';
import type { Lines } from './lines.ts';

/** Both fillets of the plate: their strength, counted length, and the leg of a full-strength weld. mm. */
export function weldOf(values: Resolved, basis: Basis, plate: WeldedPlate, height: number, lines: Lines) {
  const weldLeg = values.number('weld_leg');
  const parts = weldedParts(plate);
  const spec = (concentric: boolean): FilletSpec => ({
    leg: weldLeg,
    xu: values.electrode('electrode').xu,
    parts,
    directional: values.choice('weld_method') === 'directional',
    concentric,
    matching: values.choice('electrode_match') === 'matching',
  });
  const fillet = basis.fillet(spec(lines.weldLever <= TOLERANCE));
  const deducted = values.choice('weld_ends') === 'deducted';
  // In the plate at yield across its thickness a fillet has half of it, t f_yd/2 per mm; its use falls as it grows.
  const force = (plate.thickness * basis.yieldStress(plate.plate.fy)) / 2;
  const use = basis.fillet(spec(true)).metalUtilisation(force, 0, null);
  return {
    weldLeg,
    fillet,
    fullStrengthLeg: weldLeg * use,
    countedWeld: Math.max(1, height - (deducted ? fillet.runOut : 0)),
  };
}

/** What both plies of the lap share. */
export interface Lap {
  readonly values: Resolved;
  readonly basis: Basis;
  readonly bolt: BoltInShear;
  readonly group: UprightGroup;
  readonly oneBolt: number;
}

/** Bearing on one ply; a basis may hold it down across a single column or a single row. */
export function bearingOf(lap: Lap, thickness: number, fu: number, edges: PlyEdges): GroupBearing {
  const { values, basis, bolt, group, oneBolt } = lap;
  const limited = values.choice('single_lap') === 'limited';
  const ply = (singleLapOneRow: boolean): BearingPly => ({
    size: bolt.size,
    grade: bolt.grade,
    holeDiameter: bolt.holeDiameter,
    normalHole: normalHole(values, basis) ?? bolt.holeDiameter,
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
