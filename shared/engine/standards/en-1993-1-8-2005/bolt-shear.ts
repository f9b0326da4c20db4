/**
 * Coefficient alpha_v: 0.6 with the shear plane in the shank; in the threads 0.6 for classes 4.6, 5.6 and 8.8
 * and 0.5 for 4.8, 5.8, 6.8 and 10.9.
 *
 * The class is read from its nominal strengths, MPa, so that a bolt given by numbers is placed too: a ratio
 * f_yb/f_ub up to 0.6, or 640/800, takes 0.6; anything else 0.5 (errs low). EN 1993-1-8:2005, Table 3.4.
 */
export function shearCoefficient(fyb: number, fub: number, threadsInPlane: boolean): number {
  if (!threadsInPlane) return 0.6;
  return fyb / fub <= 0.6 + 1e-9 || (fyb === 640 && fub === 800) ? 0.6 : 0.5;
}

/**
 * Design shear resistance of one bolt in one shear plane, N: `alpha_v f_ub A / gamma_M2`.
 *
 * A the tensile stress area A_s with the plane in the threads, the gross area with it in the shank, mm2;
 * f_ub nominal, MPa. Design value. EN 1993-1-8:2005, Table 3.4.
 */
export function boltShearResistance(i: { alphaV: number; fub: number; A: number; gammaM2: number }): number {
  return (i.alphaV * i.fub * i.A) / i.gammaM2;
}

/**
 * Reduction for a long joint: `beta_Lf = 1 - (L_j - 15 d)/(200 d)`, from 0.75 to 1.
 * L_j between the end fasteners along the force, d bolt diameter, mm. EN 1993-1-8:2005, 3.8(1), equation (3.5).
 */
export function longJointFactor(Lj: number, d: number): number {
  return Math.min(1, Math.max(0.75, 1 - (Lj - 15 * d) / (200 * d)));
}

/**
 * 0.85 on the shear resistance of M12 and M14 bolts in holes 2 mm larger than the bolt, for classes 4.8, 5.8,
 * 6.8, 8.8 and 10.9; otherwise 1. Classes 4.6 and 5.6 are told by f_yb/f_ub = 0.6. EN 1993-1-8:2005, 3.6.1(5).
 */
export function smallBoltFactor(d: number, d0: number, fyb: number, fub: number): number {
  const small = d <= 14 && d0 > d + 1;
  return small && fyb / fub > 0.6 + 1e-9 ? 0.85 : 1;
}
