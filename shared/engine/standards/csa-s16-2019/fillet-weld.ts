import type { FilletSpec, FilletStrength, Rec } from '../basis.ts';
import { phiw } from './factors.ts';

const CLAUSE = 'CSA S16 13.13.2.2';

/**
 * Increase of a fillet's strength with the angle of its force: `1.00 + 0.50 sin^1.5 theta`.
 * theta between the force on that millimetre and the weld's axis. CSA S16:19, 13.13.2.2.
 */
export function angleIncrease(sinTheta: number): number {
  return 1 + 0.5 * sinTheta * Math.sqrt(sinTheta);
}

/**
 * Reduction for segments of different orientation in one joint: `M_w = (0.85 + theta_1/600)/(0.85 + theta_2/600)`.
 *
 * theta_1 of this segment, theta_2 of the segment nearest 90 degrees, both in DEGREES, 0 to 90. 1 where all segments
 * lie alike, as in a single line. CSA S16:19, 13.13.2.2.
 */
export function multiOrientationFactor(theta1: number, theta2: number): number {
  return (0.85 + theta1 / 600) / (0.85 + theta2 / 600);
}

/**
 * Factored strength of the weld metal per millimetre of fillet, N/mm:
 *
 *   0.67 phi_w A_w X_u (1.00 + 0.50 sin^1.5 theta) M_w, A_w = 0.7071 D
 *
 * D leg, mm; X_u of the electrode, MPa; theta radians, 0 to pi/2; M_w from `multiOrientationFactor`.
 * CSA S16:19, 13.13.2.2.
 */
export function filletWeldMetal(i: { D: number; Xu: number; theta: number; Mw: number }): number {
  return 0.67 * phiw * (i.D / Math.SQRT2) * i.Xu * angleIncrease(Math.sin(i.theta)) * i.Mw;
}

/**
 * Factored strength of the base metal along the fusion face per millimetre, N/mm: `0.67 phi_w D F_u`.
 * D leg, mm; F_u of the weaker part joined, MPa. The standard asks for it with over-matched electrodes only.
 * CSA S16:19, 13.13.2.2.
 */
export function filletBaseMetal(i: { D: number; Fu: number }): number {
  return 0.67 * phiw * i.D * i.Fu;
}

/** One fillet of a single line, so M_w = 1. */
export class CsaFillet implements FilletStrength {
  readonly hasBaseMetalCheck: boolean;
  readonly runOut: number;
  private readonly metal: number;
  private readonly base: number;
  private readonly Fu: number;
  private readonly Xu: number;

  constructor(spec: FilletSpec) {
    this.Xu = spec.xu;
    this.Fu = Math.min(...spec.parts.map((part) => part.fu));
    this.metal = filletWeldMetal({ D: spec.leg, Xu: spec.xu, theta: 0, Mw: 1 });
    this.base = filletBaseMetal({ D: spec.leg, Fu: this.Fu });
    this.hasBaseMetalCheck = !spec.matching;
    this.runOut = 2 * spec.leg;
  }

  metalUtilisation(pull: number, shear: number, rec: Rec): number {
    const force = Math.sqrt(pull * pull + shear * shear);
    const sine = force > 0 ? Math.abs(pull) / force : 0;
    const strength = this.metal * angleIncrease(sine);
    if (rec !== null) this.recordMetal(force, sine, strength, rec);
    return force / strength;
  }

  baseMetalUtilisation(pull: number, shear: number, rec: Rec): number {
    const force = Math.sqrt(pull * pull + shear * shear);
    if (rec !== null) {
      rec.line('f', 'on this millimetre of a unit resultant', '√(f_x² + f_y²)', force, 'N/mm per N', CLAUSE);
      rec.line('F_u', 'tensile strength of the weaker part', '', this.Fu, 'MPa', CLAUSE);
      rec.line('v_m', 'base metal per mm of fillet', '0.67 φ_w D F_u, φ_w = 0.67', this.base, 'N/mm', CLAUSE);
    }
    return force / this.base;
  }

  private recordMetal(force: number, sine: number, strength: number, rec: NonNullable<Rec>): void {
    rec.line('f', 'on this millimetre of a unit resultant', '√(f_x² + f_y²)', force, 'N/mm per N', CLAUSE);
    rec.line('θ_w', 'resultant to the axis of the weld', 'atan(|f_x|/|f_y|)', Math.asin(sine), 'rad', CLAUSE);
    rec.line('X_u', 'strength of the weld metal', '', this.Xu, 'MPa', CLAUSE);
    rec.line('M_w', 'all of the weld lies one way', '', 1, '', CLAUSE);
    const formula = '0.67 φ_w (D/√2) X_u (1.00 + 0.50 sin^1.5 θ_w) M_w, φ_w = 0.67';
    rec.line('v_w', 'weld metal per mm of fillet', formula, strength, 'N/mm', CLAUSE);
  }
}
