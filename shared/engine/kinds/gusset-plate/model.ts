import { spreadHalfWidth } from '../../limit-states/whitmore.ts';
import type { BlockPly } from '../../limit-states/block-shear.ts';
import type { InclinedGroup } from '../../limit-states/bearing.ts';
import type {
  Basis,
  BearingPly,
  BearingStrength,
  BoltInShear,
  EdgeFinish,
  FilletStrength,
  HoleMaking,
} from '../../standards/basis.ts';
import type { Electrode, Steel } from '../../types.ts';
import { boltOf, noGrade, normalHole, noSteel, plateOf, weldedParts } from '../parts.ts';
import type { Resolved } from '../resolved.ts';
import { TOLERANCE } from '../rules.ts';
import { memberOf, type GussetMember } from './member.ts';

/** Everything about one gusset plate that does not change with the load angle. N, mm, MPa. */
export interface GussetModel {
  readonly values: Resolved;
  readonly basis: Basis;
  readonly tapered: boolean;
  readonly thickness: number;
  readonly plate: Steel;
  readonly support: Steel;
  readonly supportThickness: number;
  readonly missing: {
    readonly plate: boolean;
    readonly support: boolean;
    readonly member: boolean;
    readonly grade: boolean;
  };
  readonly weldLength: number;
  readonly countedWeld: number;
  readonly weldLeg: number;
  readonly electrode: Electrode;
  readonly halfHeight: number;
  readonly offset: number;
  readonly projection: number;
  /** Half of the cut end of a tapered plate, and its distance along the axis. */
  readonly cutHalfWidth: number;
  readonly cutDistance: number;
  readonly bolt: BoltInShear;
  readonly rows: number;
  readonly lines: number;
  readonly pitch: number;
  readonly gauge: number;
  readonly halfGauge: number;
  readonly firstRow: number;
  readonly lastRow: number;
  readonly spread: number;
  readonly deduction: number;
  readonly finish: EdgeFinish;
  readonly buckling: number;
  readonly plastic: boolean;
  readonly fitWaived: boolean;
  readonly member: GussetMember;
  readonly fillet: FilletStrength;
  readonly plateBearing: BearingStrength;
  readonly memberBearing: BearingStrength;
  readonly plateBlock: BlockPly;
  readonly inclined: InclinedGroup;
  /** What each bolt takes on the gusset at the angle last evaluated, N. */
  readonly shares: Float64Array;
}

/** Puts checked parameters and a basis together. */
export function buildModel(values: Resolved, basis: Basis): GussetModel {
  const plate = plateOf(values);
  const layout = layoutOf(values);
  const planes = values.choice('brace') === 'back_to_back' ? 2 : 1;
  const bolt = boltOf(values, basis, planes, layout.lastRow - layout.firstRow);
  const deduction = bolt.holeDiameter + basis.holeAllowance(values.choice<HoleMaking>('hole_making'));
  const member = memberOf(values, deduction, noSteel);
  const fillet = basis.fillet({
    leg: values.number('weld_leg'),
    xu: values.electrode('electrode').xu,
    parts: weldedParts(plate),
    directional: values.choice('weld_method') === 'directional',
    concentric: Math.abs(values.number('work_line_offset')) <= TOLERANCE,
    matching: values.choice('electrode_match') === 'matching',
  });
  const weldLength = values.number('weld_length');
  const deducted = values.choice('weld_ends') === 'deducted';
  const { thickness } = plate;
  const { fy, fu } = plate.plate;
  const halfHeight = weldLength / 2;
  const { rows, lines, gauge } = layout;
  const boltShear = basis.boltShear(bolt, null);
  // Spelled out, as is the model itself: copying whole objects is most of the work of a variant in a sweep.
  const ply = (thickness: number, fu: number): BearingPly => ({
    size: bolt.size,
    grade: bolt.grade,
    holeDiameter: bolt.holeDiameter,
    normalHole: normalHole(values, basis) ?? bolt.holeDiameter,
    thickness,
    fu,
    singleLapOneRow: bolt.planes === 1 && rows === 1,
    boltShear,
    deformationMatters: values.choice('hole_deformation') === 'limited',
  });
  const projection = values.number('projection');
  const offset = values.number('work_line_offset');
  return {
    values,
    basis,
    thickness,
    plate: plate.plate,
    support: plate.support,
    supportThickness: plate.supportThickness,
    rows,
    lines,
    pitch: layout.pitch,
    gauge,
    halfGauge: layout.halfGauge,
    firstRow: layout.firstRow,
    lastRow: layout.lastRow,
    spread: layout.spread,
    missing: {
      plate: plate.plate === noSteel,
      support: plate.support === noSteel,
      member: member.steel === noSteel,
      grade: bolt.grade === noGrade,
    },
    tapered: values.choice('outline') === 'tapered',
    weldLength,
    countedWeld: Math.max(1, weldLength - (deducted ? fillet.runOut : 0)),
    weldLeg: values.number('weld_leg'),
    electrode: values.electrode('electrode'),
    halfHeight,
    offset,
    projection,
    cutHalfWidth: layout.halfGauge + values.number('gusset_edge_distance'),
    cutDistance: layout.lastRow + values.number('gusset_end_distance'),
    bolt,
    deduction,
    finish: values.choice<EdgeFinish>('edge_finish'),
    buckling: values.number('buckling_k'),
    plastic: values.choice('plate_section') === 'plastic',
    fitWaived: values.choice('fit_checks') === 'waived',
    member,
    fillet,
    plateBearing: basis.bearing(ply(thickness, fu)),
    memberBearing: basis.bearing(ply(member.bearingThickness, member.steel.fu)),
    plateBlock: { thickness, deduction, fy, fu, rows, lines, gauge, angle: false },
    inclined: inclinedGroup(layout, offset, projection, halfHeight),
    shares: new Float64Array(rows * lines),
  };
}

function inclinedGroup(
  layout: ReturnType<typeof layoutOf>,
  offset: number,
  projection: number,
  halfHeight: number,
): InclinedGroup {
  const { rows, lines, pitch, gauge, firstRow } = layout;
  return { rows, lines, pitch, gauge, firstRow, offset, projection, halfHeight };
}

function layoutOf(values: Resolved) {
  const rows = values.number('rows');
  const lines = values.number('lines');
  const pitch = values.number('pitch');
  const gauge = values.number('gauge');
  const firstRow = values.number('first_row');
  return {
    rows,
    lines,
    pitch,
    gauge,
    halfGauge: lines === 2 ? gauge / 2 : 0,
    firstRow,
    lastRow: firstRow + (rows - 1) * pitch,
    spread: spreadHalfWidth(rows, pitch, lines, gauge),
  };
}
