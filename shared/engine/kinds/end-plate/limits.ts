import { alignedBearing } from '../../limit-states/bearing.ts';
import { flangeAlone } from '../../limit-states/t-stub.ts';
import { blockAlong, endPull } from '../../limit-states/upright-block.ts';
import { weldLineCapacity } from '../../limit-states/weld-line.ts';
import type { BearingStrength, ClauseKey, Rec } from '../../standards/basis.ts';
import type { FailingPart } from '../../types.ts';
import type { EndPlateModel } from './model.ts';

/** `clause` names the check that the basis cites for it. */
interface LimitState {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly part: FailingPart;
  readonly clause: ClauseKey;
}

const state = (
  id: string,
  code: string,
  title: string,
  part: FailingPart,
  clause: ClauseKey,
): LimitState => ({ id, code, title, part, clause });

/** The limit states in the order they are printed; `evaluate` fills its array in the same order. */
export const limitStates = [
  state('weld-metal', 'WM', 'Weld metal', 'weld', 'filletMetal'),
  state('weld-base-metal', 'WB', 'Base metal at the weld', 'weld', 'filletBaseMetal'),
  state('plate-bending', 'PF', 'Plate in bending at the bolts', 'plate', 'tStub'),
  state('plate-gross-shear', 'PV', 'Gross shear of the plate', 'plate', 'shearSection'),
  state('plate-net-shear', 'PN', 'Net shear of the plate', 'plate', 'shearSection'),
  state('plate-block-shear', 'PX', 'Block shear in the plate', 'plate', 'blockShear'),
  state('bolt-shear', 'BS', 'Bolts in shear', 'bolt', 'boltShear'),
  state('bolt-tension', 'BT', 'Bolts in tension with prying', 'bolt', 'tStub'),
  state('bolt-combined', 'BC', 'Bolts in shear and tension', 'bolt', 'boltCombined'),
  state('plate-bearing', 'PB', 'Bearing and tear-out on the plate', 'plate', 'bearing'),
  state('support-bearing', 'SB', 'Bearing on the support', 'member', 'bearing'),
  state('web-shear', 'MV', 'Web of the beam in shear', 'member', 'shearSection'),
  state('web-tension', 'MT', 'Web of the beam under the pull', 'member', 'webTension'),
  state('web-section', 'MW', 'Web of the beam in shear and pull', 'member', 'plateSection'),
] as const;

/** Weld metal on its worst millimetre, N. */
export function weldMetal(m: EndPlateModel, cos: number, sin: number, rec: Rec): number {
  return weldLineCapacity(m.fillet, 'metal', cos, sin, 0, m.weldLength, rec);
}

/** Base metal along the fusion face, N; Infinity where the basis has no such check. */
export function weldBaseMetal(m: EndPlateModel, cos: number, sin: number, rec: Rec): number {
  if (!m.fillet.hasBaseMetalCheck) return Infinity;
  return weldLineCapacity(m.fillet, 'base', cos, sin, 0, m.weldLength, rec);
}

/** The T-stub of the plate with bolts that do not give way, N. */
export function plateBending(m: EndPlateModel, rec: Rec): number {
  return flangeAlone(m.stub, 'the plate alone', rec);
}

/** Gross section of the plate on both sides of the web, with the handbook factor where the family takes it, N. */
export function plateShearGross(m: EndPlateModel, rec: Rec): number {
  const area = 2 * m.thickness * m.height;
  const clause = m.basis.clauses.shearSection;
  if (rec !== null)
    rec.line('A_gv', 'gross section, both sides of the web', '2 t_p h_p', area, 'mm²', clause);
  const strength = m.basis.shearYield(area, m.plate.fy, rec);
  if (rec !== null && m.grossShearFactor !== 1) {
    rec.line('', 'handbook factor, not in EN 1993', 'V/1.27', m.grossShearFactor, '', 'common practice');
  }
  return strength / m.grossShearFactor;
}

/** The same less the holes of a column on each side, N. */
export function plateShearNet(m: EndPlateModel, rec: Rec): number {
  const area = 2 * m.thickness * Math.max(0, m.height - m.group.rows * m.deduction);
  const clause = m.basis.clauses.shearSection;
  if (rec !== null) rec.line('A_nv', 'less the holes', '2 t_p (h_p − n_1 d_h)', area, 'mm²', clause);
  return m.basis.shearRupture(area, m.plate.fu, rec);
}

/** A corner of the plate torn along the face on both sides of the web, N. */
export function plateBlock(m: EndPlateModel, rec: Rec): number {
  if (rec !== null) rec.line('', 'corners', 'one on each side of the web', 2, '', '');
  const pull = endPull(m.group, m.eccentricBlock);
  return 2 * blockAlong(m.basis, m.ply, m.group, m.endDistance, m.edgeDistance, pull, rec);
}

/** Shear of all bolts, N. */
export function boltShear(m: EndPlateModel, rec: Rec): number {
  const one = m.basis.boltShear(m.bolt, rec);
  if (rec !== null) {
    rec.line('n', 'bolts', '2 n_1', m.bolts, '', '');
    if (m.boltShare !== 1)
      rec.line('', 'handbook allowance, not in EN 1993', '0.8 Σ F_v,Rd', m.boltShare, '', 'common practice');
  }
  return m.boltShare * m.bolts * one;
}

/** Bolts under the pull with prying, N. */
export function boltsPulled(m: EndPlateModel, cos: number, rec: Rec): number {
  if (cos <= 0) return Infinity;
  if (rec !== null) recordTension(m, rec);
  return m.pulled.pulled(cos, rec);
}

/** Bolts under shear and pull together, N. */
export function boltsTogether(m: EndPlateModel, cos: number, sin: number, rec: Rec): number {
  if (cos <= 0 || sin === 0) return Infinity;
  if (rec !== null) recordTension(m, rec);
  return m.pulled.together(Math.abs(sin) / m.bolts, cos, rec);
}

function recordTension(m: EndPlateModel, rec: NonNullable<Rec>): void {
  const { size, grade } = m.bolt;
  const plateThickness = m.thickness;
  const head = { size, grade, headDiameter: 1.5 * size.d };
  m.basis.boltTension({ ...head, plateThickness, plateFu: m.plate.fu }, rec);
  rec.line('T', 'tension of one bolt, plate and support', 'the lesser', m.boltTension, 'N', '');
}

/** Bearing of all bolts on the plate under the shear, N. */
export function plateBearing(m: EndPlateModel, rec: Rec): number {
  return bearing(m, m.plateBearing, m.endDistance, m.edgeDistance, rec);
}

/** Bearing of all bolts on the support, which has no free end, N; Infinity where its thickness is not given. */
export function supportBearing(m: EndPlateModel, rec: Rec): number {
  if (m.supportBearing === null) return Infinity;
  return bearing(m, m.supportBearing, Infinity, Infinity, rec);
}

function bearing(m: EndPlateModel, ply: BearingStrength, end: number, edge: number, rec: Rec): number {
  const { rows, pitch } = m.group;
  return alignedBearing(m.basis, ply, rows, 2, end, pitch, edge, m.crossCentres, m.oneBolt, rec);
}

/** Web of the beam in shear beside the plate, N. */
export function webShear(m: EndPlateModel, rec: Rec): number {
  const area = m.webShare * webHeight(m) * m.section.webThickness;
  const clause = m.basis.clauses.shearSection;
  const formula = m.webShare === 1 ? 'h_w t_w' : '0.9 h_w t_w, common practice';
  if (rec !== null) rec.line('A_v', 'web beside the plate', formula, area, 'mm²', clause);
  return m.basis.shearYield(area, m.beamSteel.fy, rec);
}

/** Web of the beam under the pull over the height of the plate, N. */
export function webTension(m: EndPlateModel, rec: Rec): number {
  const area = webHeight(m) * m.section.webThickness;
  if (rec !== null) rec.line('A', 'web beside the plate', 'h_w t_w', area, 'mm²', m.basis.clauses.webTension);
  return m.basis.tensionYield(area, m.beamSteel.fy, rec);
}

/** Web of the beam in shear and pull at once: √(σ² + 3τ²) against yield, N. */
export function webSection(m: EndPlateModel, cos: number, sin: number, rec: Rec): number {
  const area = webHeight(m) * m.section.webThickness;
  const fyd = m.basis.yieldStress(m.beamSteel.fy);
  const combined = Math.sqrt(cos * cos + (3 * sin * sin) / (m.webShare * m.webShare)) / area;
  if (rec !== null) {
    const clause = m.basis.clauses.plateSection;
    rec.line('A', 'web beside the plate', 'h_w t_w', area, 'mm²', clause);
    rec.line('f_yd', 'design yield stress', '', fyd, 'MPa', clause);
    rec.line('σ_v', 'combined, for a unit resultant', '√(σ² + 3τ²)', combined, 'MPa per N', clause);
  }
  return fyd / combined;
}

/** Height of the web that is welded to the plate, mm. */
function webHeight(m: EndPlateModel): number {
  const { depth, flangeThickness } = m.section;
  return Math.min(m.height, depth - 2 * flangeThickness);
}
