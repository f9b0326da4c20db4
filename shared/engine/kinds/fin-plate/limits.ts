import { lateralMoment } from '../../limit-states/lateral-stability.ts';
import { netSectionCapacity } from '../../limit-states/net-section.ts';
import { plateSectionCapacity } from '../../limit-states/plate-section.ts';
import { byBoth, byComponent } from '../../limit-states/resultant.ts';
import { weldLineCapacity } from '../../limit-states/weld-line.ts';
import type { ClauseKey, Rec } from '../../standards/basis.ts';
import type { FailingPart } from '../../types.ts';
import { copedSectionCapacity } from '../beam-end/coped-section.ts';
import { webTension } from '../beam-end/strengths.ts';
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

/** The most loaded bolt in shear, N: for each line of shear, the worse kept. */
export function boltShear(m: FinPlateModel, s: Strengths, cos: number, sin: number, rec: Rec): number {
  let least = Infinity;
  for (const lever of m.lines.boltLevers) {
    const capacity = m.oneBolt * s.boltMultiplier(cos, sin, lever);
    least = Math.min(least, capacity);
  }
  if (rec !== null) s.recordBolts(cos, sin, rec);
  return least;
}

/** Bearing on the plate by the elastic forces of the bolts, N. */
export function plateBearing(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  let least = Infinity;
  let worst = 0;
  for (const lever of m.lines.boltLevers) {
    m.forces.load(cos, sin, lever * sin);
    const capacity = m.plateBearing.capacity(m.forces.fx, m.forces.fy, 1, null);
    if (capacity < least) {
      least = capacity;
      worst = lever;
    }
  }
  if (rec !== null) {
    rec.line('M_b', 'moment on the bolts of a unit resultant', '', worst * sin, 'mm', '');
    m.forces.load(cos, sin, worst * sin);
    m.plateBearing.capacity(m.forces.fx, m.forces.fy, 1, rec);
  }
  return least;
}

/** Bearing on the web, which the bolts push the other way, N: up and down where the family asks for both. */
export function webBearing(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  let least = Infinity;
  let worst = 0;
  let worstSin = sin;
  for (let way = 1; way >= (m.bothWays ? -1 : 1); way -= 2) {
    for (const lever of m.lines.boltLevers) {
      m.forces.load(cos, way * sin, lever * way * sin);
      const capacity = m.webBearing.capacity(m.forces.fx, m.forces.fy, -1, null);
      if (capacity < least) {
        least = capacity;
        worst = lever;
        worstSin = way * sin;
      }
    }
  }
  if (rec !== null) {
    rec.line('M_b', 'moment on the bolts of a unit resultant', '', worst * worstSin, 'mm', '');
    m.forces.load(cos, worstSin, worst * worstSin);
    m.webBearing.capacity(m.forces.fx, m.forces.fy, -1, rec);
  }
  return least;
}

/** Blocks of the plate torn along and across the face together, N. */
export function plateBlock(s: Strengths, cos: number, sin: number, rec: Rec): number {
  if (rec !== null) s.recordPlateBlock(rec);
  return blocks(s.plateBlockAlong, s.plateBlockAcross, cos, sin, rec);
}

/** Blocks of the web torn along and across the face together, N; the bolts push the web against the resultant. */
export function webBlock(m: FinPlateModel, s: Strengths, cos: number, sin: number, rec: Rec): number {
  const pushedUp = sin < 0;
  const along = m.eitherWay ? s.webBlockLeast : pushedUp ? s.webBlockUp : s.webBlockDown;
  if (rec !== null) s.recordWebBlock(along === s.webBlockUp, rec);
  return blocks(along, s.webBlockAcross, cos, sin, rec);
}

/** Pull on the web beside its shear, as the root of the sum of squares, N; Infinity where nothing pulls. */
export function webPull(m: FinPlateModel, s: Strengths, cos: number, sin: number, rec: Rec): number {
  if (cos === 0) return Infinity;
  const shear = Math.min(s.webShearGross, s.webShearNet);
  if (rec !== null) {
    webTension(m.basis, m.beam, m.group, m.height, rec);
    rec.line('V_r', 'the web in shear, gross or net', 'the lesser', shear, 'N', '');
    const meaning = 'as the root of the sum of squares';
    rec.line('', 'together', '√((V/V_r)² + (N/N_r)²) ≤ 1', meaning, '', 'method of this catalogue');
  }
  return byBoth(shear, s.webTension, cos, sin);
}

/** Pull, shear and bending of the beam where its copes begin, N; Infinity where it has none. */
export function copedSection(m: FinPlateModel, cos: number, sin: number, rec: Rec): number {
  if (m.coped === null) return Infinity;
  return copedSectionCapacity(m.beam, m.coped, m.lines.nearest, cos, sin, rec);
}

function blocks(along: number, across: number, cos: number, sin: number, rec: Rec): number {
  if (rec !== null) {
    const method = 'method of this catalogue';
    rec.line('R_V', 'block torn along the face', 'the least', along, 'N', '');
    rec.line('R_N', 'block torn across the face', 'the least', across, 'N', '');
    rec.line('', 'together', '√((V/R_V)² + (N/R_N)²) ≤ 1', 'as the root of the sum of squares', '', method);
  }
  return byBoth(along, across, cos, sin);
}
