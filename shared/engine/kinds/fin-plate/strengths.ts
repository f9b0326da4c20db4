import { lateralMoment, shortPlateReach } from '../../limit-states/lateral-stability.ts';
import { blockAcross, blockAlong, endPull } from '../../limit-states/upright-block.ts';
import type { Rec } from '../../standards/basis.ts';
import type { Recorder } from '../../types.ts';
import { WebStrengths } from '../beam-end/web-strengths.ts';
import type { FinPlateModel } from './model.ts';

/** What the load angle does not change, worked out once. N, N mm, MPa. */
export class Strengths {
  readonly plateShearGross: number;
  readonly plateShearNet: number;
  readonly plateTension: number;
  readonly plateBlockAlong: number;
  readonly plateBlockAcross: number;
  /** Infinity for a short plate. */
  readonly lateralMoment: number;
  readonly web: WebStrengths;
  /** Design stress of the plate in rupture. */
  readonly ruptureStress: number;

  constructor(private readonly m: FinPlateModel) {
    const { basis, firstColumn, thickness, height } = m;
    this.plateShearGross = plateShearGross(m, null);
    this.plateShearNet = plateShearNet(m, null);
    this.plateTension = plateTension(m, null);
    this.plateBlockAlong = this.alongPlate(null);
    this.plateBlockAcross = this.acrossPlate(null);
    this.lateralMoment =
      firstColumn > shortPlateReach(thickness)
        ? lateralMoment(basis, thickness, height, firstColumn, m.plate.fy, null)
        : Infinity;
    this.web = new WebStrengths(m);
    this.ruptureStress = basis.tensionRupture(1, m.plate.fu, null);
  }

  recordPlateBlock(rec: Recorder): void {
    this.alongPlate(rec);
    this.acrossPlate(rec);
  }

  private alongPlate(rec: Rec): number {
    const { basis, ply, group, endDistance, edgeDistance, eccentricBlock } = this.m;
    return blockAlong(basis, ply, group, endDistance, edgeDistance, endPull(group, eccentricBlock), rec);
  }

  private acrossPlate(rec: Rec): number {
    const { basis, ply, group, endDistance, edgeDistance } = this.m;
    return blockAcross(basis, ply, group, edgeDistance, { above: endDistance, below: endDistance }, rec);
  }
}

/** Gross section of the plate in shear, with the handbook factor where the family takes it, N. */
export function plateShearGross(m: FinPlateModel, rec: Rec): number {
  const area = m.thickness * m.height;
  const clause = m.basis.clauses.shearSection;
  if (rec !== null) rec.line('A_gv', 'gross section', 't h', area, 'mm²', clause);
  const strength = m.basis.shearYield(area, m.plate.fy, rec);
  if (rec !== null && m.grossShearFactor !== 1) {
    rec.line('', 'handbook factor, not in EN 1993', 'V/1.27', m.grossShearFactor, '', 'common practice');
  }
  return strength / m.grossShearFactor;
}

/** The plate in shear less the holes of one column, N. */
export function plateShearNet(m: FinPlateModel, rec: Rec): number {
  const clause = m.basis.clauses.shearSection;
  if (rec !== null)
    rec.line('A_nv', 'less the holes of a column', 't (h − n d_h)', m.net.area, 'mm²', clause);
  return m.basis.shearRupture(m.net.area, m.plate.fu, rec);
}

/** The plate under a pull, N: the lesser of yield and of rupture less the holes of one column. */
export function plateTension(m: FinPlateModel, rec: Rec): number {
  const area = m.thickness * m.height;
  if (rec !== null) {
    const clause = m.basis.clauses.tensionSection;
    rec.line('A', 'gross section', 't h', area, 'mm²', clause);
    rec.line('A_n', 'less the holes of a column', 't (h − n d_h)', m.net.area, 'mm²', clause);
  }
  const yielding = m.basis.tensionYield(area, m.plate.fy, rec);
  return Math.min(yielding, m.basis.tensionRupture(m.net.area, m.plate.fu, rec));
}
