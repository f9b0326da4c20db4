import { coefficientsOf, type PatternCoefficients } from '../../groups/ic-cache.ts';
import { PulledBolts } from '../../limit-states/bolts-pulled.ts';
import { HingedLeg } from '../../limit-states/hinged-leg.ts';
import { StubRows } from '../../limit-states/t-stub.ts';
import { UprightForces } from '../../limit-states/upright-forces.ts';
import { groupHeight, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { Basis, BoltInShear, HoleMaking } from '../../standards/basis.ts';
import type { Steel } from '../../types.ts';
import { usualBackmark } from '../backmark.ts';
import { isChosen } from '../given.ts';
import { boltOf, type BoltPrefix, noGrade } from '../parts.ts';
import type { Resolved } from '../resolved.ts';
import type { Legs } from './legs.ts';
import { methodParameters } from './parameters-method.ts';

/** Handbooks of simple connections: shear of the bolts at the support, some of which are pulled as well. */
const HANDBOOK_SHARE = 0.8;

/** Mean of the widths of a hexagon head across flats and points, by bolt diameter, taken as across flats (errs low). */
const HEAD = 1.5;

/** The bolts of the outstanding legs. N, mm. */
export interface SupportBolts {
  readonly prefix: BoltPrefix;
  readonly bolt: BoltInShear;
  readonly gradeMissing: boolean;
  /** Of one leg: one column. */
  readonly group: UprightGroup;
  /** In all legs. */
  readonly count: number;
  readonly backmark: number;
  readonly endDistance: number;
  readonly edgeDistance: number;
  readonly deduction: number;
  /** Shear of one bolt. */
  readonly oneBolt: number;
  /** Of the sum that counts. */
  readonly share: number;
  /** Tension of one bolt: of the leg and the support the ply that its head is drawn through more easily. */
  readonly tension: number;
  /** From the bolts to the line of the shear in the plane of the support; 0 where it does not count. */
  readonly lever: number;
  /** Coefficients of the instantaneous centre, or null where bolts share elastically. */
  readonly coefficients: PatternCoefficients | null;
  /** Forces of one leg's bolts for a shear of 1 N on all cleats. */
  readonly forces: UprightForces;
  /** All legs in bending under the pull, N, for a tension that each bolt may take. */
  readonly legs: Pick<StubRows, 'pull'>;
  readonly pulled: PulledBolts;
}

/** Reads the bolts at the support. */
export function supportBoltsOf(
  values: Resolved,
  basis: Basis,
  legs: Legs,
  support: Steel,
  supportThickness: number,
  webThickness: number,
): SupportBolts {
  const prefix: BoltPrefix = values.choice('support_connection') === 'bolted_own' ? 'support_' : '';
  const place = placeOf(values, legs);
  const { group } = place;
  const reduced = values.choice('long_joint') === 'reduced';
  const bolt = boltOf(values, basis, 1, reduced ? groupHeight(group) : 0, prefix);
  const deduction = bolt.holeDiameter + basis.holeAllowance(values.choice<HoleMaking>('hole_making'));
  const oneBolt = basis.boltShear(bolt, null);
  const share = isChosen(methodParameters, values, basis, 'support_bolts', 'reduced') ? HANDBOOK_SHARE : 1;
  const tension = tensionOf(basis, bolt, legs, supportThickness, support);
  const sharing = sharingOf(values, basis, legs, place, webThickness);
  const inBending = legsInBending(values, basis, legs, place, bolt, deduction);
  return {
    prefix,
    bolt,
    gradeMissing: bolt.grade === noGrade,
    group,
    count: legs.cleats * group.rows,
    backmark: place.backmark,
    endDistance: place.endDistance,
    edgeDistance: place.edgeDistance,
    deduction,
    oneBolt,
    share,
    tension,
    lever: sharing.lever,
    coefficients: sharing.coefficients,
    forces: sharing.forces,
    legs: inBending,
    pulled: new PulledBolts(basis, inBending, tension, share * oneBolt),
  };
}

type Place = ReturnType<typeof placeOf>;

function placeOf(values: Resolved, legs: Legs) {
  const group: UprightGroup = {
    rows: values.number('support_rows') || legs.group.rows,
    columns: 1,
    pitch: values.number('support_pitch') || legs.group.pitch,
    gauge: 0,
  };
  const backmark = values.number('support_backmark') || usualBackmark(legs.outstandingLeg, 1);
  return {
    group,
    backmark,
    endDistance: (legs.height - groupHeight(group)) / 2,
    edgeDistance: legs.outstandingLeg - backmark,
  };
}

function tensionOf(basis: Basis, bolt: BoltInShear, legs: Legs, behind: number, support: Steel): number {
  const { size, grade } = bolt;
  const headDiameter = HEAD * size.d;
  const through = (plateThickness: number, plateFu: number) =>
    basis.boltTension({ size, grade, headDiameter, plateThickness, plateFu }, null);
  const own = through(legs.thickness, legs.steel.fu);
  return behind > 0 ? Math.min(own, through(behind, support.fu)) : own;
}

/** How the bolts of one leg share a shear of 1 N on all cleats. */
function sharingOf(values: Resolved, basis: Basis, legs: Legs, place: Place, webThickness: number) {
  const { cleats } = legs;
  const { group, backmark } = place;
  const counted = cleats === 1 || values.choice('leg_eccentricity') === 'always';
  // A pair has its shear at the faces of the web, a single cleat in the middle of it.
  const lever = counted ? backmark + (cleats === 1 ? webThickness / 2 : 0) : 0;
  const forces = new UprightForces(group);
  forces.load(0, 1 / cleats, lever / cleats);
  const normalise = basis.centreNormalisation;
  const byCentre = lever > 0 && values.choice('bolt_group') === 'centre' && normalise !== null;
  const coefficients = byCentre ? coefficientsOf(group.rows, 1, group.pitch, 0, normalise) : null;
  return { lever, forces, coefficients };
}

/** Shear on the most loaded bolt for a shear of 1 N on all cleats. */
export function shearOnWorst({ coefficients, forces, lever, count, group }: SupportBolts): number {
  if (coefficients === null) return forces.most;
  const legs = count / group.rows;
  return 1 / (legs * coefficients.coefficient(1, lever));
}

/** The legs of a pair are a T-stub; a single one is half of it, or bends about its bolts alone where its heel may turn. */
function legsInBending(
  values: Resolved,
  basis: Basis,
  legs: Legs,
  place: Place,
  bolt: BoltInShear,
  deduction: number,
): Pick<StubRows, 'pull'> {
  const { thickness, steel, cleats, section } = legs;
  const { group, backmark, endDistance: end } = place;
  const { rows, pitch } = group;
  const edge = Math.max(1, place.edgeDistance);
  if (cleats === 1 && values.choice('heel') === 'free') {
    const bending = basis.yieldStress(steel.fy);
    return new HingedLeg({ thickness, bending, rows, pitch, end, lever: backmark, edge, deduction });
  }
  return new StubRows(basis, {
    thickness,
    steel,
    byTensile: values.choice('leg_bending') === 'tensile',
    bolt: bolt.size,
    holeDiameter: bolt.holeDiameter,
    perRow: cleats,
    rows,
    pitch,
    end,
    // AISC Manual, Part 9: to the middle of the standing leg. EN 1993-1-8, Figure 6.8: to 0.8 of the root radius.
    boltToWeb: Math.max(1, backmark - thickness / 2),
    m: Math.max(1, backmark - thickness - 0.8 * section.rootRadius),
    edge,
  });
}
