import { lateralMoment } from '../../limit-states/lateral-stability.ts';
import { netSectionCapacity } from '../../limit-states/net-section.ts';
import { plateSectionCapacity } from '../../limit-states/plate-section.ts';
import { byComponent } from '../../limit-states/resultant.ts';
import { blocksTogether } from '../../limit-states/upright-block.ts';
import { weldLineCapacity } from '../../limit-states/weld-line.ts';
import type { ClauseKey, Rec } from '../../standards/basis.ts';
import type { FailingPart } from '../../types.ts';
import { copedSectionCapacity } from '../beam-end/coped-section.ts';
import type { FinPlateModel } from './model.ts';
import type { Strengths } from './strengths.ts';

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
  state('plate-section-at-weld', 'PW', 'Plate section at the weld', 'plate', 'plateSection'),
  state('plate-section-at-bolts', 'PH', 'Plate section at the first column', 'plate', 'plateSection'),
  state('plate-gross-shear', 'PV', 'Gross shear of the plate', 'plate', 'shearSection'),
  state('plate-net-shear', 'PN', 'Net shear of the plate', 'plate', 'shearSection'),
  state('plate-tension', 'PT', 'Tension of the plate', 'plate', 'tensionSection'),
  state('plate-block-shear', 'PX', 'Block shear in the plate', 'plate', 'blockShear'),
  state('plate-stability', 'PL', 'Lateral stability of a long plate', 'plate', 'compression'),
  state('bolt-shear', 'BS', 'Bolt group in shear', 'bolt', 'boltShear'),
  state('plate-bearing', 'PB', 'Bearing and tear-out on the plate', 'plate', 'bearing'),
  state('web-bearing', 'MB', 'Bearing and tear-out on the web', 'member', 'bearing'),
  state('web-gross-shear', 'MV', 'Gross shear of the web', 'member', 'shearSection'),
  state('web-net-shear', 'MN', 'Net shear of the web', 'member', 'shearSection'),
  state('web-block-shear', 'MX', 'Block shear in the web', 'member', 'blockShear'),
  state('web-tension', 'MT', 'Tension of the web with its shear', 'member', 'webTension'),
  state('coped-section', 'MC', 'Coped section of the beam', 'member', 'plateSection'),
] as const;

/** Weld metal on its worst millimetre, N. */
export function weldMetal(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  return weldLineCapacity(m.fillet, 'metal', cos, sin, sin * m.lines.weldLever, m.countedWeld, rec);
}

/** Base metal along the fusion face, N; Infinity where the basis has no such check. */
export function weldBaseMetal(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  if (!m.fillet.hasBaseMetalCheck) return Infinity;
  return weldLineCapacity(m.fillet, 'base', cos, sin, sin * m.lines.weldLever, m.countedWeld, rec);
}

/** Pull, shear and bending on the plate along the weld, N. */
export function plateAtWeld(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  const moment = sin * m.lines.weldLever;
  return plateSection(m, cos, sin, moment, rec);
}

/** The same at the column nearest to the support: the gross section against yield, the net one against rupture, N. */
export function plateAtBolts(m: FinPlateModel, s: Strengths, cos: number, sin: number, rec: Rec): number {
  const moment = sin * m.lines.columnLever;
  const gross = plateSection(m, cos, sin, moment, rec);
  const clause = m.basis.clauses.plateSection;
  const net = netSectionCapacity(m.net, s.ruptureStress, cos, sin, moment, m.plastic, clause, rec);
  return Math.min(gross, net);
}

function plateSection(m: FinPlateModel, cos: number, sin: number, moment: number, rec: Rec): number {
  const fyd = m.basis.yieldStress(m.plate.fy);
  const clause = m.basis.clauses.plateSection;
  if (rec !== null) rec.line('M/R', 'moment of a unit resultant', 'V × lever', moment, 'mm', clause);
  return plateSectionCapacity(fyd, m.thickness, m.height, cos, sin, moment, m.plastic, clause, rec);
}

/** Lateral stability under the moment of the shear over its whole eccentricity, N; Infinity for a short plate. */
export function plateStability(m: FinPlateModel, s: Strengths, sin: number, rec: Rec): number {
  if (s.lateralMoment === Infinity) return Infinity;
  if (rec !== null) {
    lateralMoment(m.basis, m.thickness, m.height, m.firstColumn, m.plate.fy, rec);
    rec.line('M_b', 'moment that the plate carries', '', s.lateralMoment, 'N·mm', 'method of this catalogue');
    rec.line('e', 'lever of the shear', '', m.lines.eccentricity, 'mm', '');
  }
  return byComponent(s.lateralMoment, sin * m.lines.eccentricity);
}

/** Blocks of the plate torn along and across the face together, N. */
export function plateBlock(s: Strengths, cos: number, sin: number, rec: Rec): number {
  if (rec !== null) s.recordPlateBlock(rec);
  return blocksTogether(s.plateBlockAlong, s.plateBlockAcross, cos, sin, rec);
}

/** Pull, shear and bending of the beam where its copes begin, N; Infinity where it has none. */
export function copedSection(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  if (m.coped === null) return Infinity;
  return copedSectionCapacity(m.beam, m.coped, m.lines.nearest, cos, sin, rec);
}
