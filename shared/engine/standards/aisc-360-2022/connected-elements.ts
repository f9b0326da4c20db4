/** Elastic modulus of steel, MPa. ANSI/AISC 360-22, Symbols. */
export const E = 200_000;

/** Nominal strength in tensile yield, N: `F_y A_g`. MPa, mm2. ANSI/AISC 360-22, J4.1(a), (J4-1). */
export function nominalTensileYield(Fy: number, Ag: number): number {
  return Fy * Ag;
}

/** Nominal strength in tensile rupture, N: `F_u A_e`. MPa, mm2. ANSI/AISC 360-22, J4.1(b), (J4-2). */
export function nominalTensileRupture(Fu: number, Ae: number): number {
  return Fu * Ae;
}

/** Nominal strength in shear yield, N: `0.60 F_y A_gv`. MPa, mm2. ANSI/AISC 360-22, J4.2(a), (J4-3). */
export function nominalShearYield(Fy: number, Agv: number): number {
  return 0.6 * Fy * Agv;
}

/** Nominal strength in shear rupture, N: `0.60 F_u A_nv`. MPa, mm2. ANSI/AISC 360-22, J4.2(b), (J4-4). */
export function nominalShearRupture(Fu: number, Anv: number): number {
  return 0.6 * Fu * Anv;
}

/**
 * Critical stress of a connecting element in compression, MPa: F_y up to L_c/r = 25; beyond it
 * `0.658^(F_y/F_e) F_y` where F_y/F_e <= 2.25 and `0.877 F_e` above, with `F_e = pi^2 E/(L_c/r)^2`.
 * Lcr = K L/r; Fy MPa. ANSI/AISC 360-22, J4.4 and E3, (E3-2) to (E3-4).
 */
export function criticalStress(Fy: number, Lcr: number): number {
  if (Lcr <= 25) return Fy;
  const Fe = (Math.PI * Math.PI * E) / (Lcr * Lcr);
  return Fy / Fe <= 2.25 ? Math.pow(0.658, Fy / Fe) * Fy : 0.877 * Fe;
}
