import { E, phi } from './factors.ts';

/** Exponent of the column curve for sections that are neither hollow and stress-relieved nor welded of cut plate. */
export const n = 1.34;

/** Non-dimensional slenderness `(K L / r) sqrt(f_y / (pi^2 E))`. SANS 10162-1:2011, 13.3.1. */
export function slenderness(KLr: number, fy: number): number {
  return (KLr / Math.PI) * Math.sqrt(fy / E);
}

/**
 * Factored resistance in flexural buckling, N: `C_r = phi A f_y (1 + lambda^(2n))^(-1/n)`, n = 1.34.
 * A mm2; f_y MPa; lambda from `slenderness`. SANS 10162-1:2011, 13.3.1.
 */
export function compressionResistance(A: number, fy: number, lambda: number): number {
  return phi * A * fy * Math.pow(1 + Math.pow(lambda, 2 * n), -1 / n);
}
