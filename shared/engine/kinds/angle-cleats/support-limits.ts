import { alignedBearing } from '../../limit-states/bearing.ts';
import { byBoth } from '../../limit-states/resultant.ts';
import { flangeAlone } from '../../limit-states/t-stub.ts';
import { weldLineCapacity, type WeldPart } from '../../limit-states/weld-line.ts';
import type { BearingPly, Rec } from '../../standards/basis.ts';
import { recordCentre } from '../beam-end/web-bolts.ts';
import { bearingOf } from '../lap.ts';
import { normalHole } from '../parts.ts';
import type { CleatModel } from './model.ts';
import { shearOnWorst, type SupportBolts } from './support-bolts.ts';

const METHOD = 'method of this catalogue';

/** All outstanding legs in bending under a pull, N, with fasteners that do not give way. */
export function legBending(m: CleatModel, rec: Rec): number {
  if (m.bolts !== null) return flangeAlone(m.bolts.legs, 'the legs alone', rec);
  const { thickness, outstandingLeg, steel, cleats } = m.legs;
  const fyd = m.basis.yieldStress(steel.fy);
  const moment = 0.25 * thickness * thickness * m.height * fyd;
  const arm = outstandingLeg - thickness;
  if (rec !== null) {
    rec.line('', 'leg', '', 'held at the heel, no moment at the weld', '', METHOD);
    rec.line('M_p', 'plastic moment of one leg', '¼ t² h_ac f_yd', moment, 'N·mm', METHOD);
    rec.line('b', 'weld to the face of the web leg', '', arm, 'mm', METHOD);
    rec.line('', 'cleats', '', cleats, '', '');
  }
  return (cleats * moment) / arm;
}

/** The legs bent about their heels and sheared along them at once, N: on a yield line `(N/N_b)² + (V/V_g)² = 1`. */
export function legBendingWithShear(
  bending: number,
  grossShear: number,
  cos: number,
  sin: number,
  rec: Rec,
): number {
  if (cos === 0) return Infinity;
  if (rec !== null) {
    rec.line('N_b', 'all outstanding legs in bending', '', bending, 'N', '');
    rec.line('V_g', 'gross shear of all cleats', '', grossShear, 'N', '');
    rec.line('', 'together', '√((V/V_g)² + (N/N_b)²) ≤ 1', 'yield by the sum of squares', '', METHOD);
  }
  return byBoth(grossShear, bending, cos, sin);
}

/** Shear of the bolts at the support, N; Infinity where the legs are welded. */
export function supportBoltShear(m: CleatModel, rec: Rec): number {
  const { bolts } = m;
  if (bolts === null) return Infinity;
  if (rec !== null) {
    m.basis.boltShear(bolts.bolt, rec);
    recordSharing(m, bolts, rec);
    if (bolts.share !== 1) {
      const meaning = 'handbook allowance, not in EN 1993';
      rec.line('', meaning, '0.8 Σ F_v,Rd', bolts.share, '', 'common practice');
    }
  }
  return (bolts.share * bolts.oneBolt) / shearOnWorst(bolts);
}

function recordSharing(m: CleatModel, bolts: SupportBolts, rec: NonNullable<Rec>): void {
  rec.line('', 'bolts in all outstanding legs', '', bolts.count, '', '');
  if (bolts.lever > 0) {
    const meaning = 'bolts to the line of the shear, in the plane of the support';
    rec.line('e_s', meaning, '', bolts.lever, 'mm', '');
    rec.line('Σr²', 'of one leg', '', bolts.forces.polar, 'mm²', '');
    const { coefficients, lever } = bolts;
    if (coefficients !== null) recordCentre(m.basis, coefficients.coefficient(1, lever), rec);
  }
  rec.line('v/V', 'most loaded bolt, unit shear', '√(F_x² + F_y²)', shearOnWorst(bolts), 'N per N', '');
}

/** Bolts at the support under the pull with prying, N; Infinity where nothing pulls. */
export function supportBoltsPulled(m: CleatModel, cos: number, rec: Rec): number {
  if (m.bolts === null || cos <= 0) return Infinity;
  if (rec !== null) recordTension(m, m.bolts, rec);
  return m.bolts.pulled.pulled(cos, rec);
}

/** Bolts at the support under shear and pull together, N; Infinity where one of them is none. */
export function supportBoltsTogether(m: CleatModel, cos: number, sin: number, rec: Rec): number {
  if (m.bolts === null || cos <= 0 || sin === 0) return Infinity;
  if (rec !== null) recordTension(m, m.bolts, rec);
  return m.bolts.pulled.together(Math.abs(sin) * shearOnWorst(m.bolts), cos, rec);
}

function recordTension(m: CleatModel, bolts: SupportBolts, rec: NonNullable<Rec>): void {
  const { size, grade } = bolts.bolt;
  const ply = { plateThickness: m.legs.thickness, plateFu: m.legs.steel.fu };
  m.basis.boltTension({ size, grade, headDiameter: 1.5 * size.d, ...ply }, rec);
  rec.line('T', 'tension of one bolt, leg and support', 'the lesser', bolts.tension, 'N', '');
}

/** Bearing of the bolts on the outstanding legs under the shear, N; Infinity where they are welded. */
export function outstandingLegBearing(m: CleatModel, rec: Rec): number {
  if (m.bolts === null) return Infinity;
  const { endDistance, edgeDistance } = m.bolts;
  return supportPly(m, m.bolts, m.legs.thickness, m.legs.steel.fu, endDistance, edgeDistance, rec);
}

/** Bearing on the support, which has no free edge, N; Infinity where its thickness is not given or legs are welded. */
export function supportBearing(m: CleatModel, rec: Rec): number {
  if (m.bolts === null || m.supportThickness === 0) return Infinity;
  return supportPly(m, m.bolts, m.supportThickness, m.support.fu, Infinity, Infinity, rec);
}

/** Bolts that share equally bear along the face; eccentric ones are resolved along the edges, the worst governs. */
function supportPly(
  m: CleatModel,
  bolts: SupportBolts,
  thickness: number,
  fu: number,
  end: number,
  toe: number,
  rec: Rec,
): number {
  const { values, basis } = m;
  const { bolt, group, oneBolt, prefix } = bolts;
  if (bolts.lever > 0) {
    const lap = { values, basis, bolt, group, oneBolt, single: true, prefix };
    const ply = bearingOf(lap, thickness, fu, { near: Infinity, far: toe, above: end, below: end });
    return ply.capacity(bolts.forces.fx, bolts.forces.fy, 1, rec);
  }
  const ply: BearingPly = {
    size: bolt.size,
    grade: bolt.grade,
    holeDiameter: bolt.holeDiameter,
    normalHole: normalHole(values, basis, prefix) ?? bolt.holeDiameter,
    thickness,
    fu,
    singleLapOneRow: false,
    boltShear: oneBolt,
    deformationMatters: values.choice('hole_deformation') === 'limited',
  };
  const { rows, pitch } = group;
  const { cleats } = m.legs;
  return alignedBearing(basis, basis.bearing(ply), rows, cleats, end, pitch, toe, Infinity, oneBolt, rec);
}

/** Weld at the toes of the outstanding legs on its worst millimetre, N; Infinity where they are bolted. */
export function toeWeld(m: CleatModel, part: WeldPart, cos: number, sin: number, rec: Rec): number {
  const { weld } = m;
  if (weld === null || (part === 'base' && !weld.fillet.hasBaseMetalCheck)) return Infinity;
  // The line of two fillets is that of a pair; a single cleat has its whole load on one.
  const times = 2 / m.legs.cleats;
  if (rec !== null) {
    rec.line('', 'fillets', 'at the toe of each outstanding leg', m.legs.cleats, '', '');
    rec.line('e_s', 'weld to the line of the shear', '', weld.lever, 'mm', '');
    rec.line('M/V', 'moment that counts, all cleats', '', weld.moment, 'mm', '');
  }
  const moment = Math.abs(sin) * weld.moment;
  return weldLineCapacity(weld.fillet, part, times * cos, times * sin, times * moment, weld.length, rec);
}
