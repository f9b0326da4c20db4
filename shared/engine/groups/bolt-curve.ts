/**
 * Force of one bolt in shear against its deformation: `R = R_ult (1 - exp(-mu Δ))^lambda`.
 *
 * Source: Crawford and Kulak, Eccentrically loaded bolted connections, J. Struct. Div. ASCE 97 (ST3), 1971;
 * mu = 10 per inch, lambda = 0.55, Δ_max = 0.34 in at the bolt farthest from the instantaneous centre.
 */
export interface BoltCurve {
  /** mu Δ_max, without unit. */
  readonly decay: number;
  /** lambda. */
  readonly power: number;
}

/** mu = 10 per inch, Δ_max = 0.34 in: the AISC Manual, Part 7, and the exact conversion to millimetres. */
export const BOLT_CURVE: BoltCurve = { decay: 10 * 0.34, power: 0.55 };

/** mu = 0.4 per mm, Δ_max = 8.64 mm: the rounded metric constants of Canadian practice. */
export const BOLT_CURVE_METRIC: BoltCurve = { decay: 0.4 * 8.64, power: 0.55 };

/**
 * What a bolt coefficient is a multiple of: the ultimate strength R_ult of a bolt (AISC Manual tables 7-6 to
 * 7-13), or the force of the critical bolt at Δ_max (CISC Handbook tables 3-14 to 3-20), 0.9816 R_ult, which
 * makes the coefficient 1.9 % higher.
 */
export type BoltNormalisation = 'ultimate' | 'atMaximum';

/** R/R_ult at a deformation of `t` times Δ_max. */
export function boltForceRatio(t: number, curve: BoltCurve = BOLT_CURVE): number {
  return Math.pow(-Math.expm1(-curve.decay * t), curve.power);
}

/** Deformation over Δ_max at which a bolt has the force `ratio` times R_ult, below 1. */
export function boltDeformation(ratio: number, curve: BoltCurve = BOLT_CURVE): number {
  return -Math.log1p(-Math.pow(ratio, 1 / curve.power)) / curve.decay;
}
