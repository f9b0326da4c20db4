import type { FilletSpec, FilletStrength, Rec } from '../basis.ts';
import { phiw } from './factors.ts';

const CLAUSE = 'SANS 10162-1 13.13.2.2';

/**
 * Increase of a fillet's strength with the angle of its force: `1 + 0.5 sin^1.5 theta_w`.
 * theta_w between the force on that millimetre and the weld's axis. SANS 10162-1:2011, 13.13.2.2.
 */
export function angleIncrease(sinThetaW: number): number {
  return 1 + 0.5 * sinThetaW * Math.sqrt(sinThetaW);
}

/**
 * Factored strength of the weld metal per millimetre of fillet, N/mm:
 *
 *   0.67 phi_w A_w X_u (1 + 0.5 sin^1.5 theta_w), A_w = 0.7071 z
 *
 * z leg, mm; X_u of the electrode, MPa; thetaW radians, 0 to pi/2. SANS 10162-1:2011, 13.13.2.2(b).
 */
export function filletWeldMetal(i: { z: number; Xu: number; thetaW: number }): number {
  return 0.67 * phiw * (i.z / Math.SQRT2) * i.Xu * angleIncrease(Math.sin(i.thetaW));
}

/**
 * Factored strength of the base metal along the fusion face per millimetre, N/mm: `0.67 phi_w z f_u`.
 * z leg, mm; f_u of the weaker part joined, MPa. SANS 10162-1:2011, 13.13.2.2(a).
 */
export function filletBaseMetal(i: { z: number; fu: number }): number {
  return 0.67 * phiw * i.z * i.fu;
}

/** One fillet, prepared. */
export class SansFillet implements FilletStrength {
  readonly hasBaseMetalCheck = true;
  readonly runOut: number;
  private readonly metal: number;
  private readonly base: number;
  private readonly fu: number;
  private readonly spec: FilletSpec;

  constructor(spec: FilletSpec) {
    this.spec = spec;
    this.fu = Math.min(...spec.parts.map((part) => part.fu));
    this.metal = filletWeldMetal({ z: spec.leg, Xu: spec.xu, thetaW: 0 });
    this.base = filletBaseMetal({ z: spec.leg, fu: this.fu });
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
    if (rec !== null) this.recordBase(force, rec);
    return force / this.base;
  }

  private recordBase(force: number, rec: NonNullable<Rec>): void {
    rec.line('f', 'on this millimetre of a unit resultant', '√(f_x² + f_y²)', force, 'N/mm per N', CLAUSE);
    rec.line('f_u', 'tensile strength of the weaker part', '', this.fu, 'MPa', CLAUSE);
    rec.line('v_m', 'base metal per mm of fillet', '0.67 φ_w z f_u, φ_w = 0.67', this.base, 'N/mm', CLAUSE);
  }

  private recordMetal(force: number, sine: number, strength: number, rec: NonNullable<Rec>): void {
    rec.line('f', 'on this millimetre of a unit resultant', '√(f_x² + f_y²)', force, 'N/mm per N', CLAUSE);
    rec.line('θ_w', 'resultant to the axis of the weld', 'atan(|f_x|/|f_y|)', Math.asin(sine), 'rad', CLAUSE);
    rec.line('X_u', 'strength of the weld metal', '', this.spec.xu, 'MPa', CLAUSE);
    const formula = '0.67 φ_w (z/√2) X_u (1 + 0.5 sin^1.5 θ_w), φ_w = 0.67';
    rec.line('v_w', 'weld metal per mm of fillet', formula, strength, 'N/mm', CLAUSE);
  }
}
