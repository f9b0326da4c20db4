import { lateralMoment, shortPlateReach } from '../../limit-states/lateral-stability.ts';
import { blockAcross, blockAlong, endPull } from '../../limit-states/upright-block.ts';
import type { Rec } from '../../standards/basis.ts';
import type { Recorder } from '../../types.ts';
import {
  webBlockAcross,
  webBlockAlong,
  webShearGross,
  webShearNet,
  webTension,
} from '../beam-end/strengths.ts';
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
  readonly webShearGross: number;
  readonly webShearNet: number;
  readonly webBlockUp: number;
  readonly webBlockDown: number;
  readonly webBlockLeast: number;
  readonly webBlockAcross: number;
  readonly webTension: number;
  /** Design stress of the plate in rupture. */
  readonly ruptureStress: number;

  constructor(private readonly m: FinPlateModel) {
    const { basis, beam, group, firstColumn, thickness, height } = m;
    this.plateShearGross = plateShearGross(m, null);
    this.plateShearNet = plateShearNet(m, null);
    this.plateTension = plateTension(m, null);
    this.plateBlockAlong = this.alongPlate(null);
    this.plateBlockAcross = this.acrossPlate(null);
    this.lateralMoment =
      firstColumn > shortPlateReach(thickness)
        ? lateralMoment(basis, thickness, height, firstColumn, m.plate.fy, null)
        : Infinity;
    this.webShearGross = webShearGross(basis, beam, null);
    this.webShearNet = webShearNet(basis, beam, group, null);
    this.webBlockUp = webBlockAlong(basis, beam, group, true, m.eccentricBlock, null);
    this.webBlockDown = webBlockAlong(basis, beam, group, false, m.eccentricBlock, null);
    this.webBlockLeast = Math.min(this.webBlockUp, this.webBlockDown);
    this.webBlockAcross = webBlockAcross(basis, beam, group, null);
    this.webTension = webTension(basis, beam, group, height, null);
    this.ruptureStress = basis.tensionRupture(1, m.plate.fu, null);
  }

  /** Resultants of 1 N that the bolts carry for each newton of one bolt's shear. */
  boltMultiplier(cos: number, sin: number, lever: number): number {
    const { coefficients, forces } = this.m;
    if (coefficients !== null) return coefficients.coefficient(sin, lever * sin);
    forces.load(cos, sin, lever * sin);
    return 1 / forces.most;
  }

  recordBolts(cos: number, sin: number, rec: Recorder): void {
    const { m } = this;
    m.basis.boltShear(m.bolt, rec);
    for (const lever of m.lines.boltLevers) {
      const where = lever === 0 ? 'shear at the bolts' : 'shear at the face of the support';
      rec.line('M_b', `moment on the bolts, ${where}`, 'V × lever', lever * sin, 'mm', '');
      if (m.coefficients !== null) {
        this.recordCentre(cos, sin, lever, rec);
        continue;
      }
      rec.line('Σr²', 'about the middle of the bolts', '', m.forces.polar, 'mm²', '');
      const most = 1 / this.boltMultiplier(cos, sin, lever);
      rec.line('F/R', 'most loaded bolt, unit resultant', '√(F_x² + F_y²)', most, 'N per N', '');
    }
  }

  private recordCentre(cos: number, sin: number, lever: number, rec: Recorder): void {
    const source = 'instantaneous centre: Crawford and Kulak, 1971';
    const multiple =
      this.m.basis.centreNormalisation === 'atMaximum'
        ? 'of the force at the greatest deformation'
        : 'of the ultimate strength';
    const C = this.boltMultiplier(cos, sin, lever);
    rec.line('C', `coefficient, a multiple ${multiple} of a bolt`, '', C, '', source);
  }

  recordPlateBlock(rec: Recorder): void {
    this.alongPlate(rec);
    this.acrossPlate(rec);
  }

  recordWebBlock(up: boolean, rec: Recorder): void {
    const { basis, beam, group, eccentricBlock } = this.m;
    rec.line('', 'block along the face', '', up ? 'torn up' : 'torn down', '', '');
    webBlockAlong(basis, beam, group, up, eccentricBlock, rec);
    webBlockAcross(basis, beam, group, rec);
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
