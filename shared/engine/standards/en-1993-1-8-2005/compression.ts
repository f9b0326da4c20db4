/** Elastic modulus, MPa. EN 1993-1-1:2005, 3.2.6. */
export const E = 210_000;

/** Imperfection factor of buckling curve c. EN 1993-1-1:2005, Table 6.1. */
const alpha = 0.49;

/**
 * Reduction chi on buckling curve c, for solid sections (Table 6.2):
 *
 *   Phi = 0.5 (1 + alpha (lambda - 0.2) + lambda^2), chi = 1/(Phi + sqrt(Phi^2 - lambda^2)) <= 1
 *
 * lambdaBar non-dimensional slenderness; chi is 1 up to 0.2. EN 1993-1-1:2005, 6.3.1.2, equation (6.49).
 */
export function columnCurveC(lambdaBar: number): number {
  if (lambdaBar <= 0.2) return 1;
  const Phi = 0.5 * (1 + alpha * (lambdaBar - 0.2) + lambdaBar * lambdaBar);
  return Math.min(1, 1 / (Phi + Math.sqrt(Phi * Phi - lambdaBar * lambdaBar)));
}

/**
 * Non-dimensional slenderness `(L_cr/i)/lambda_1`, lambda_1 = pi sqrt(E/f_y). EN 1993-1-1:2005, 6.3.1.3.
 */
export function slenderness(LcrOverI: number, fy: number): number {
  return LcrOverI / (Math.PI * Math.sqrt(E / fy));
}

/** Design buckling resistance, N: `chi A f_y/gamma_M1`. EN 1993-1-1:2005, 6.3.1.1, equation (6.47). */
export function compressionResistance(chi: number, A: number, fy: number, gammaM1: number): number {
  return (chi * A * fy) / gammaM1;
}
