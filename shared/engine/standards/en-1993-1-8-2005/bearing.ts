import type { BearingPly, BearingStrength, Rec } from '../basis.ts';

const CLAUSE = 'EN 1993-1-8 Table 3.4';

/** On the bearing resistance in oversize holes. EN 1993-1-8:2005, Table 3.4, note 1. */
const OVERSIZE = 0.8;

/**
 * Design bearing resistance at one bolt, N: `k_1 alpha_b f_u d t / gamma_M2`.
 * d, t mm; f_u of the ply MPa. EN 1993-1-8:2005, Table 3.4.
 */
export function bearingResistance(
  k1: number,
  alphaB: number,
  fu: number,
  d: number,
  t: number,
  gammaM2: number,
): number {
  return (k1 * alphaB * fu * d * t) / gammaM2;
}

/**
 * `alpha_b = min(e_1/(3 d_0), p_1/(3 d_0) - 1/4, f_ub/f_u, 1)`. Pass Infinity for e_1 or p_1 where there is no
 * free end or no bolt ahead; strengthRatio is f_ub/f_u. EN 1993-1-8:2005, Table 3.4.
 */
export function alphaB(e1: number, p1: number, d0: number, strengthRatio: number): number {
  return Math.min(e1 / (3 * d0), p1 / (3 * d0) - 0.25, strengthRatio, 1);
}

/**
 * `k_1 = min(2.8 e_2/d_0 - 1.7, 1.4 p_2/d_0 - 1.7, 2.5)`, not below 0. Pass Infinity for what is absent.
 * The p_2 term is applied to edge bolts too (errs low). EN 1993-1-8:2005, Table 3.4.
 */
export function edgeFactor(e2: number, p2: number, d0: number): number {
  return Math.max(0, Math.min((2.8 * e2) / d0 - 1.7, (1.4 * p2) / d0 - 1.7, 2.5));
}

/**
 * Upper limit in a single lap joint with only one row of bolts, N: `1.5 f_u d t / gamma_M2`.
 * EN 1993-1-8:2005, 3.6.1(10).
 */
export function singleLapLimit(fu: number, d: number, t: number, gammaM2: number): number {
  return (1.5 * fu * d * t) / gammaM2;
}

/** Bearing on one ply, prepared: `bolt` is called in sweeps. */
export class EnBearing implements BearingStrength {
  private readonly d0: number;
  private readonly ratio: number;
  /** f_u d t / gamma_M2, with 0.8 in an oversize hole. */
  private readonly unit: number;
  private readonly limit: number;
  private readonly oversize: number;

  constructor(ply: BearingPly, gammaM2: number) {
    this.d0 = ply.holeDiameter;
    this.ratio = ply.grade.fub / ply.fu;
    // 2 mm clearance for M12 and M14 is still a normal hole; its cost is on shear, 3.6.1(5).
    const largestNormal = ply.size.d <= 14 ? ply.size.d + 2 : ply.normalHole;
    this.oversize = this.d0 > largestNormal + 1e-9 ? OVERSIZE : 1;
    this.unit = this.oversize * bearingResistance(1, 1, ply.fu, ply.size.d, ply.thickness, gammaM2);
    this.limit = ply.singleLapOneRow
      ? singleLapLimit(ply.fu, ply.size.d, ply.thickness, gammaM2)
      : Number.MAX_VALUE;
  }

  bolt(end: number, pitch: number, edge: number, gauge: number, rec: Rec): number {
    const ab = alphaB(end, pitch, this.d0, this.ratio);
    const k1 = edgeFactor(edge, gauge, this.d0);
    const strength = Math.min(k1 * ab * this.unit, this.limit);
    if (rec !== null) this.recordBolt(end, pitch, edge, gauge, ab, k1, strength, rec);
    return strength;
  }

  private recordBolt(
    e1: number,
    p1: number,
    e2: number,
    p2: number,
    ab: number,
    k1: number,
    strength: number,
    rec: NonNullable<Rec>,
  ): void {
    rec.line('e_1', 'to the free end ahead', '', orNone(e1), 'mm', CLAUSE);
    rec.line('p_1', 'to the next bolt ahead', '', orNone(p1), 'mm', CLAUSE);
    rec.line('e_2', 'to the edge beside', '', orNone(e2), 'mm', CLAUSE);
    rec.line('p_2', 'to the next bolt beside', '', orNone(p2), 'mm', CLAUSE);
    rec.line('α_b', 'along the force', 'min(e_1/3d_0, p_1/3d_0 − 1/4, f_ub/f_u, 1)', ab, '', CLAUSE);
    rec.line('k_1', 'across the force', 'min(2.8 e_2/d_0 − 1.7, 1.4 p_2/d_0 − 1.7, 2.5)', k1, '', CLAUSE);
    if (this.oversize < 1) rec.line('k_h', 'oversize hole', '', this.oversize, '', CLAUSE);
    if (this.limit < Number.MAX_VALUE) {
      const clause = 'EN 1993-1-8 3.6.1(10)';
      rec.line('F_b,max', 'single lap, one row of bolts', '1.5 f_u d t/γ_M2', this.limit, 'N', clause);
    }
    rec.line('F_b,Rd', 'bearing, one bolt', 'k_1 α_b f_u d t/γ_M2', strength, 'N', CLAUSE);
  }
}

function orNone(value: number): number | string {
  return value === Infinity ? 'none' : value;
}
