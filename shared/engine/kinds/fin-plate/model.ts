import { coefficientsOf, type PatternCoefficients } from '../../groups/ic-cache.ts';
import type { GroupBearing } from '../../limit-states/group-bearing.ts';
import { type NetSection, netSectionOf } from '../../limit-states/net-section.ts';
import type { UprightPly } from '../../limit-states/upright-block.ts';
import { UprightForces } from '../../limit-states/upright-forces.ts';
import { groupHeight, groupWidth, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { Basis, BoltInShear, EdgeFinish, FilletStrength, HoleMaking } from '../../standards/basis.ts';
import { type BeamEnd, beamEndOf } from '../beam-end/beam.ts';
import { type CopedSection, copedSectionOf } from '../beam-end/coped-section.ts';
import { isChosen } from '../given.ts';
import { bearingOf } from '../lap.ts';
import { boltOf, noGrade, noSteel, plateOf, type WeldedPlate } from '../parts.ts';
import type { Resolved } from '../resolved.ts';
import { TOLERANCE } from '../rules.ts';
import { type Lines, linesOf } from '../beam-end/shear-lines.ts';
import { weldOf } from './model-parts.ts';
import { methodParameters } from './parameters-method.ts';

/** Everything about one fin plate that does not change with the load angle. N, mm, MPa; y from the middle of the bolts. */
export interface FinPlateModel extends WeldedPlate {
  readonly values: Resolved;
  readonly basis: Basis;
  readonly gradeMissing: boolean;
  readonly bolt: BoltInShear;
  /** Shear of one bolt. */
  readonly oneBolt: number;
  readonly group: UprightGroup;
  readonly firstColumn: number;
  readonly lastColumn: number;
  readonly height: number;
  readonly width: number;
  readonly endDistance: number;
  readonly edgeDistance: number;
  readonly deduction: number;
  readonly finish: EdgeFinish;
  readonly weldLeg: number;
  readonly countedWeld: number;
  readonly fillet: FilletStrength;
  /** Leg at which both fillets are as strong across the plate as it yields. */
  readonly fullStrengthLeg: number;
  readonly lines: Lines;
  /** A shear up and one down are both looked at, because the beam is not the same both ways. */
  readonly bothWays: boolean;
  readonly eitherWay: boolean;
  readonly plastic: boolean;
  readonly eccentricBlock: boolean;
  readonly grossShearFactor: number;
  readonly fitWaived: boolean;
  readonly practiceWaived: boolean;
  readonly ply: UprightPly;
  readonly net: NetSection;
  readonly beam: BeamEnd;
  /** Null where the beam has no cope. */
  readonly coped: CopedSection | null;
  readonly plateBearing: GroupBearing;
  readonly webBearing: GroupBearing;
  readonly forces: UprightForces;
  /** Coefficients of the instantaneous centre, or null where the bolts share elastically. */
  readonly coefficients: PatternCoefficients | null;
}

/** Handbooks divide the gross shear of the plate by this where it bends as well. */
const HANDBOOK_SHEAR = 1.27;

/** Puts checked parameters and a basis together. */
export function buildModel(values: Resolved, basis: Basis): FinPlateModel {
  const plate = plateOf(values);
  const layout = layoutOf(values);
  const { group, firstColumn, height } = layout;
  const reduced = values.choice('long_joint') === 'reduced';
  const bolt = boltOf(values, basis, 1, reduced ? groupHeight(group) : 0);
  const deduction = bolt.holeDiameter + basis.holeAllowance(values.choice<HoleMaking>('hole_making'));
  const beam = beamEndOf(values, group, firstColumn, deduction, noSteel);
  const lines = linesOf(values, group, firstColumn);
  const weld = weldOf(values, basis, plate, height, lines);
  const oneBolt = basis.boltShear(bolt, null);
  const eitherWay = values.choice('shear_direction') === 'either';
  const { thickness } = plate;
  const { fy, fu } = plate.plate;
  const plateEdges = {
    near: Infinity,
    far: layout.edgeDistance,
    above: layout.endDistance,
    below: layout.endDistance,
  };
  const lap = { values, basis, bolt, group, oneBolt, single: true };
  // Spelled out: copying whole objects is most of the work of a variant in a sweep.
  return {
    thickness,
    plate: plate.plate,
    support: plate.support,
    supportThickness: plate.supportThickness,
    group,
    firstColumn,
    lastColumn: layout.lastColumn,
    height,
    width: layout.width,
    endDistance: layout.endDistance,
    edgeDistance: layout.edgeDistance,
    weldLeg: weld.weldLeg,
    fillet: weld.fillet,
    fullStrengthLeg: weld.fullStrengthLeg,
    countedWeld: weld.countedWeld,
    values,
    basis,
    gradeMissing: bolt.grade === noGrade,
    bolt,
    oneBolt,
    deduction,
    finish: values.choice<EdgeFinish>('edge_finish'),
    lines,
    eitherWay,
    bothWays: eitherWay && Math.abs(beam.edges.above - beam.edges.below) > TOLERANCE,
    plastic: values.choice('plate_section') === 'plastic',
    eccentricBlock: values.choice('block_pull') === 'eccentric',
    grossShearFactor: isChosen(methodParameters, values, basis, 'gross_shear', 'reduced')
      ? HANDBOOK_SHEAR
      : 1,
    fitWaived: values.choice('fit_checks') === 'waived',
    practiceWaived: values.choice('practice_rules') === 'waived',
    ply: { thickness, deduction, fy, fu },
    net: netSectionOf(thickness, height, group.rows, group.pitch, deduction),
    beam,
    coped: copedSectionOf(basis, beam),
    plateBearing: bearingOf(lap, thickness, fu, plateEdges),
    webBearing: bearingOf(lap, beam.web.thickness, beam.steel.fu, beam.edges),
    forces: new UprightForces(group),
    coefficients: coefficientsFor(values, basis, group),
  };
}

function layoutOf(values: Resolved) {
  const group: UprightGroup = {
    rows: values.number('rows'),
    columns: values.number('columns'),
    pitch: values.number('pitch'),
    gauge: values.number('gauge'),
  };
  const firstColumn = values.number('first_column');
  const lastColumn = firstColumn + groupWidth(group);
  const endDistance = values.number('plate_end_distance');
  const edgeDistance = values.number('plate_edge_distance');
  return {
    group,
    firstColumn,
    lastColumn,
    endDistance,
    edgeDistance,
    height: groupHeight(group) + 2 * endDistance,
    width: lastColumn + edgeDistance,
  };
}

function coefficientsFor(values: Resolved, basis: Basis, group: UprightGroup): PatternCoefficients | null {
  const { rows, columns, pitch, gauge } = group;
  if (values.choice('bolt_group') !== 'centre' || basis.centreNormalisation === null) return null;
  return coefficientsOf(rows, columns, pitch, gauge, basis.centreNormalisation);
}
