import type { BearingPly, BearingStrength, Rec } from '../basis.ts';
import { type Format, rupture } from './format.ts';

const CLAUSE = 'AISC 360 J3.11a';

/**
 * Nominal bearing strength at one bolt in a standard hole, N: `2.4 d t F_u`, or `3.0 d t F_u` where the lengthening
 * of the hole at service load is not a consideration.
 * d, t mm; F_u of the ply, MPa. Nominal. ANSI/AISC 360-22, J3.11a(1), (J3-6a), (J3-6b).
 */
export function nominalBearing(d: number, t: number, Fu: number, deformationMatters: boolean): number {
  return (deformationMatters ? 2.4 : 3) * d * t * Fu;
}

/**
 * Nominal tear-out strength at one bolt, N: `1.2 l_c t F_u`, or `1.5 l_c t F_u` where the lengthening of the hole at
 * service load is not a consideration.
 * l_c clear distance along the force from the hole to the edge or to the next hole, mm, may be Infinity; t mm; F_u MPa.
 * Nominal. ANSI/AISC 360-22, J3.11a(2), (J3-6c), (J3-6d).
 */
export function nominalTearOut(lc: number, t: number, Fu: number, deformationMatters: boolean): number {
  return (deformationMatters ? 1.2 : 1.5) * lc * t * Fu;
}

/**
 * Clear distance along the force, mm, not below 0: `end - d_h/2` to a free end, `pitch - d_h` to the next hole.
 * d_h hole diameter; end, pitch between centres, Infinity where there is none, mm. ANSI/AISC 360-22, J3.11a.
 */
export function clearDistance(end: number, pitch: number, dh: number): number {
  return Math.max(0, Math.min(end - dh / 2, pitch - dh));
}

/** One ply, prepared: no bolt counts for more than its own shear, J3.7. */
export class AiscBearing implements BearingStrength {
  private readonly bearing: number;
  /** Tear-out per millimetre of clear distance. */
  private readonly perClear: number;
  private readonly dh: number;
  /** The lesser of bearing and shear. */
  private readonly most: number;

  constructor(
    private readonly ply: BearingPly,
    private readonly format: Format,
  ) {
    const { size, thickness, fu, deformationMatters } = ply;
    const factor = format.factor(rupture);
    this.dh = ply.holeDiameter;
    this.bearing = factor * nominalBearing(size.d, thickness, fu, deformationMatters);
    this.perClear = factor * nominalTearOut(1, thickness, fu, deformationMatters);
    this.most = Math.min(this.bearing, ply.boltShear);
  }

  bolt(end: number, pitch: number, _edge: number, _gauge: number, rec: Rec): number {
    const lc = clearDistance(end, pitch, this.dh);
    const tearOut = this.perClear * lc;
    const strength = Math.min(this.most, tearOut);
    if (rec !== null) this.recordBolt(lc, tearOut, strength, rec);
    return strength;
  }

  private recordBolt(lc: number, tearOut: number, strength: number, rec: NonNullable<Rec>): void {
    const given = this.format.text(rupture);
    const [c, k] = this.ply.deformationMatters ? ['2.4', '1.2'] : ['3.0', '1.5'];
    rec.line('l_c', 'clear distance ahead', 'end − d_h/2, or pitch − d_h', orNone(lc), 'mm', CLAUSE);
    rec.line('r_b', 'bearing, one bolt', `${c} d t F_u ${given}`, this.bearing, 'N', CLAUSE);
    if (lc !== Infinity)
      rec.line('r_t', 'tear-out, one bolt', `${k} l_c t F_u ${given}`, tearOut, 'N', CLAUSE);
    if (this.ply.boltShear !== Infinity)
      rec.line('r_v', 'shear of one bolt, all planes', '', this.ply.boltShear, 'N', 'AISC 360 J3.7');
    rec.line('r', 'what the bolt takes', 'the least', strength, 'N', 'AISC 360 J3.7');
  }
}

function orNone(value: number): number | string {
  return value === Infinity ? 'none' : value;
}
