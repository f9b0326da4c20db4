/**
 * Strength of one millimetre of fillet weld against its deformation and the angle θ of the force to its axis:
 * `r/r_0 = (1 + 0.5 sin^1.5 θ) [p (1.9 - 0.9 p)]^0.3`, `p = Δ/Δ_m`, `Δ_m = 0.209 (θ + 2)^-0.32 w`, up to
 * `Δ_u = 1.087 (θ + 6)^-0.65 w <= 0.17 w`; θ in degrees, w the leg, r_0 the longitudinal strength (0.60 F_EXX
 * on the throat). Deformations over w and strengths over r_0 do not depend on either.
 *
 * Source: Lesik and Kennedy, Ultimate strength of fillet welded connections loaded in plane, Can. J. Civ. Eng.
 * 17, 1990; ANSI/AISC 360-22 Commentary J2.4; CSA S16:19 13.13.2.2.
 */
const DEGREES = 180 / Math.PI;

/** Work space: the strength of one point and its derivatives. */
export class WeldPoint {
  /** r/r_0 and its derivatives by Δ/w and by θ, per radian. */
  strength = 0;
  byMotion = 0;
  byAngle = 0;

  /** At a deformation of `motion` legs and an angle with |sin| `sine`, |cos| `cosine`. */
  set(motion: number, sine: number, cosine: number): void {
    const angle = Math.atan2(sine, cosine) * DEGREES;
    const root = Math.sqrt(sine);
    const directional = 1 + 0.5 * sine * root;
    const p = motion / (0.209 * power(angle + 2, -0.32));
    const curve = power(p * (1.9 - 0.9 * p), 0.3);
    const slope = (0.3 * (1.9 - 1.8 * p)) / (1.9 - 0.9 * p);
    const strength = directional * curve;
    this.strength = strength;
    this.byMotion = (strength * slope) / motion;
    this.byAngle = 0.75 * root * cosine * curve + ((strength * slope * 0.32) / (angle + 2)) * DEGREES;
  }
}

/** Δ_u/w at an angle, |sin| `sine` and |cos| `cosine`. */
export function weldDeformationLimit(sine: number, cosine: number): number {
  const angle = Math.atan2(sine, cosine) * DEGREES;
  return Math.min(0.17, 1.087 * power(angle + 6, -0.65));
}

/** Derivative of Δ_u/w by the angle, per radian. */
export function weldLimitSlope(sine: number, cosine: number): number {
  const angle = Math.atan2(sine, cosine) * DEGREES;
  const limit = 1.087 * power(angle + 6, -0.65);
  return limit > 0.17 ? 0 : ((-0.65 * limit) / (angle + 6)) * DEGREES;
}

/** `x` to a fixed power, x > 0; several times faster than `Math.pow`. */
function power(x: number, exponent: number): number {
  return Math.exp(exponent * Math.log(x));
}
