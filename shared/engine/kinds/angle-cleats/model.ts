import { coefficientsOf, type PatternCoefficients } from '../../groups/ic-cache.ts';
import type { GroupBearing } from '../../limit-states/group-bearing.ts';
import { type NetSection, netSectionOf } from '../../limit-states/net-section.ts';
import type { UprightPly } from '../../limit-states/upright-block.ts';
import { UprightForces } from '../../limit-states/upright-forces.ts';
import { groupHeight, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { Basis, BoltInShear, EdgeFinish, HoleMaking } from '../../standards/basis.ts';
import type { Steel } from '../../types.ts';
import { type BeamEnd, beamEndOf } from '../beam-end/beam.ts';
import { type CopedSection, copedSectionOf } from '../beam-end/coped-section.ts';
import { type Lines, linesOf } from '../beam-end/shear-lines.ts';
import type { WebBolts } from '../beam-end/web-bolts.ts';
import { isChosen } from '../given.ts';
import { bearingOf } from '../lap.ts';
import { boltOf, noGrade, noSteel } from '../parts.ts';
import { type Resolved, steelAt } from '../resolved.ts';
import { TOLERANCE } from '../rules.ts';
import { type Legs, legsOf } from './legs.ts';
import { methodParameters } from './parameters-method.ts';
import { type SupportBolts, supportBoltsOf } from './support-bolts.ts';
import { type SupportWeld, supportWeldOf } from './support-weld.ts';

/** Everything about a pair of cleats or a single one that the load angle does not change. N, mm, MPa; y from the middle. */
export interface CleatModel extends WebBolts {
  readonly values: Resolved;
  readonly basis: Basis;
  readonly legs: Legs;
  readonly gradeMissing: boolean;
  readonly bolt: BoltInShear;
  readonly group: UprightGroup;
  readonly height: number;
  /** Of all web legs together. */
  readonly thickness: number;
  readonly deduction: number;
  readonly finish: EdgeFinish;
  readonly lines: Lines;
  readonly eitherWay: boolean;
  readonly plastic: boolean;
  readonly eccentricBlock: boolean;
  readonly grossShearFactor: number;
  readonly fitWaived: boolean;
  readonly practiceWaived: boolean;
  /** One web leg. */
  readonly ply: UprightPly;
  /** All web legs at the column nearest to the support. */
  readonly net: NetSection;
  readonly beam: BeamEnd;
  readonly coped: CopedSection | null;
  readonly cleatBearing: GroupBearing;
  readonly support: Steel;
  /** 0 where it is not given. */
  readonly supportThickness: number;
  /** Null where the outstanding legs are welded, and the weld null where they are bolted. */
  readonly bolts: SupportBolts | null;
  readonly weld: SupportWeld | null;
  /** A single welded cleat whose heel may turn carries none. */
  readonly pullCovered: boolean;
}

/** Handbooks divide the gross shear of the cleats by this where they bend as well. */
const HANDBOOK_SHEAR = 1.27;

/** Puts checked parameters and a basis together. */
export function buildModel(values: Resolved, basis: Basis): CleatModel {
  const legs = legsOf(values);
  const { group, firstColumn, height, cleats, steel } = legs;
  const reduced = values.choice('long_joint') === 'reduced';
  const bolt = boltOf(values, basis, cleats, reduced ? groupHeight(group) : 0);
  const deduction = bolt.holeDiameter + basis.holeAllowance(values.choice<HoleMaking>('hole_making'));
  const beam = beamEndOf(values, group, firstColumn, deduction, noSteel);
  const oneBolt = basis.boltShear(bolt, null);
  const eitherWay = values.choice('shear_direction') === 'either';
  const thickness = cleats * legs.thickness;
  const lap = { values, basis, bolt, group, oneBolt, single: cleats === 1 };
  const given = values.number('support_thickness');
  const supportThickness = given <= TOLERANCE ? 0 : given;
  const support =
    steelAt(values.steel('support_steel'), supportThickness || legs.thickness, steel) ?? noSteel;
  const web = beam.web.thickness;
  const welded = values.choice('support_connection') === 'welded';
  // Spelled out: copying whole objects is most of the work of a variant in a sweep.
  return {
    values,
    basis,
    legs,
    gradeMissing: bolt.grade === noGrade,
    bolt,
    oneBolt,
    group,
    height,
    thickness,
    deduction,
    finish: values.choice<EdgeFinish>('edge_finish'),
    lines: linesOf(values, group, firstColumn),
    eitherWay,
    bothWays: eitherWay && Math.abs(beam.edges.above - beam.edges.below) > TOLERANCE,
    plastic: values.choice('leg_section') === 'plastic',
    eccentricBlock: values.choice('block_pull') === 'eccentric',
    grossShearFactor: isChosen(methodParameters, values, basis, 'gross_shear', 'reduced')
      ? HANDBOOK_SHEAR
      : 1,
    fitWaived: values.choice('fit_checks') === 'waived',
    practiceWaived: values.choice('practice_rules') === 'waived',
    ply: { thickness: legs.thickness, deduction, fy: steel.fy, fu: steel.fu },
    net: netSectionOf(thickness, height, group.rows, group.pitch, deduction),
    beam,
    coped: copedSectionOf(basis, beam),
    cleatBearing: bearingOf(lap, thickness, steel.fu, edgesOf(legs)),
    webBearing: bearingOf(lap, web, beam.steel.fu, beam.edges),
    forces: new UprightForces(group),
    coefficients: coefficientsFor(values, basis, group),
    support,
    supportThickness,
    bolts: welded ? null : supportBoltsOf(values, basis, legs, support, supportThickness, web),
    weld: welded ? supportWeldOf(values, basis, legs, support, supportThickness, web) : null,
    pullCovered: !(welded && cleats === 1 && values.choice('heel') === 'free'),
  };
}

function edgesOf({ edgeDistance, endDistance }: Legs) {
  return { near: Infinity, far: edgeDistance, above: endDistance, below: endDistance };
}

function coefficientsFor(values: Resolved, basis: Basis, group: UprightGroup): PatternCoefficients | null {
  const { rows, columns, pitch, gauge } = group;
  if (values.choice('bolt_group') !== 'centre' || basis.centreNormalisation === null) return null;
  return coefficientsOf(rows, columns, pitch, gauge, basis.centreNormalisation);
}
