import { netSectionCapacity } from '../../limit-states/net-section.ts';
import { plateSectionCapacity } from '../../limit-states/plate-section.ts';
import { blockAcross, blockAlong, endPull, type UprightPly } from '../../limit-states/upright-block.ts';
import type { UprightGroup } from '../../limit-states/upright-group.ts';
import type { BlockPull, Rec } from '../../standards/basis.ts';
import type { CleatModel } from './model.ts';

/** Gross section of all legs in shear, with the handbook factor where the family takes it, N. */
export function grossShear(m: CleatModel, rec: Rec): number {
  const area = m.thickness * m.height;
  const clause = m.basis.clauses.shearSection;
  if (rec !== null) rec.line('A_gv', 'gross section of all cleats', 'Σt h_ac', area, 'mm²', clause);
  const strength = m.basis.shearYield(area, m.legs.steel.fy, rec);
  if (rec !== null && m.grossShearFactor !== 1) {
    rec.line('', 'handbook factor, not in EN 1993', 'V/1.27', m.grossShearFactor, '', 'common practice');
  }
  return strength / m.grossShearFactor;
}

/** Less the holes of a column in the web legs, or of the column in the outstanding legs, N: the lesser. */
export function netShear(m: CleatModel, rec: Rec): number {
  const clause = m.basis.clauses.shearSection;
  const { fu } = m.legs.steel;
  if (rec !== null) {
    rec.line('A_nv', 'web legs less the holes of a column', 'Σt (h_ac − n_1 d_h)', m.net.area, 'mm²', clause);
  }
  const onWeb = m.basis.shearRupture(m.net.area, fu, rec);
  if (m.bolts === null) return onWeb;
  const { group, deduction } = m.bolts;
  const area = m.thickness * Math.max(0, m.height - group.rows * deduction);
  if (rec !== null) {
    rec.line('A_nv', 'outstanding legs less their holes', 'Σt (h_ac − n_s d_h)', area, 'mm²', clause);
  }
  return Math.min(onWeb, m.basis.shearRupture(area, fu, rec));
}

/** The web legs under a pull, N: the lesser of yield and of rupture less the holes of one column. */
export function tension(m: CleatModel, rec: Rec): number {
  const area = m.thickness * m.height;
  const { fy, fu } = m.legs.steel;
  if (rec !== null) {
    const clause = m.basis.clauses.tensionSection;
    rec.line('A', 'gross section of all web legs', 'Σt h_ac', area, 'mm²', clause);
    rec.line('A_n', 'less the holes of a column', 'Σt (h_ac − n_1 d_h)', m.net.area, 'mm²', clause);
  }
  return Math.min(m.basis.tensionYield(area, fy, rec), m.basis.tensionRupture(m.net.area, fu, rec));
}

/** A corner of each web leg torn along the face, N. */
export function webLegBlockAlong(m: CleatModel, rec: Rec): number {
  const { endDistance, edgeDistance } = m.legs;
  return m.legs.cleats * legBlock(m, m.ply, m.group, endDistance, edgeDistance, rec);
}

/** A block of each web leg torn towards its toe by a pull, N. */
export function webLegBlockAcross(m: CleatModel, rec: Rec): number {
  const { endDistance, edgeDistance, cleats } = m.legs;
  const edges = { above: endDistance, below: endDistance };
  return cleats * blockAcross(m.basis, m.ply, m.group, edgeDistance, edges, rec);
}

/** A corner of each outstanding leg torn along the face, N; Infinity where they are welded. */
export function outstandingLegBlock(m: CleatModel, rec: Rec): number {
  if (m.bolts === null) return Infinity;
  const { group, deduction, endDistance, edgeDistance } = m.bolts;
  return m.legs.cleats * legBlock(m, { ...m.ply, deduction }, group, endDistance, edgeDistance, rec);
}

/** One leg: pulled evenly, or the lower of what a basis has for one leg of an angle and for a coped beam end. */
function legBlock(
  m: CleatModel,
  ply: UprightPly,
  group: UprightGroup,
  end: number,
  toe: number,
  rec: Rec,
): number {
  const along = (pull: BlockPull, to: Rec) => blockAlong(m.basis, ply, group, end, toe, pull, to);
  if (rec !== null) rec.line('', 'cleats', '', m.legs.cleats, '', '');
  if (!m.eccentricBlock) return along('even', rec);
  const coped = endPull(group, true);
  return along(along('uneven', null) < along(coped, null) ? 'uneven' : coped, rec);
}

/** Pull, shear and bending on all web legs at the heel, N. */
export function sectionAtHeel(m: CleatModel, cos: number, sin: number, rec: Rec): number {
  return grossSection(m, cos, sin, sin * m.lines.weldLever, rec);
}

/** The same at the column nearest to the support: the gross section against yield, the net one against rupture, N. */
export function sectionAtBolts(
  m: CleatModel,
  ruptureStress: number,
  cos: number,
  sin: number,
  rec: Rec,
): number {
  const moment = sin * m.lines.columnLever;
  const gross = grossSection(m, cos, sin, moment, rec);
  const clause = m.basis.clauses.plateSection;
  return Math.min(gross, netSectionCapacity(m.net, ruptureStress, cos, sin, moment, m.plastic, clause, rec));
}

function grossSection(m: CleatModel, cos: number, sin: number, moment: number, rec: Rec): number {
  const fyd = m.basis.yieldStress(m.legs.steel.fy);
  const clause = m.basis.clauses.plateSection;
  if (rec !== null) rec.line('M/R', 'moment of a unit resultant', 'V × lever', moment, 'mm', clause);
  return plateSectionCapacity(fyd, m.thickness, m.height, cos, sin, moment, m.plastic, clause, rec);
}
