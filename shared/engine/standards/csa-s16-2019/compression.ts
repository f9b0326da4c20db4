import { E, phi } from './factors.ts';

/** Exponent of the column curve for sections that are neither hollow and stress-relieved nor welded of cut plate. */
export const n = 1.34;

/** Non-dimensional slenderness `(K L / r) sqrt(F_y / (pi^2 E))`. CSA S16:19, 13.3.1. */
export function slenderness(KLr: number, Fy: number): number {
  return (KLr / Math.PI) * Math.sqrt(Fy / E);
}

/**
 * Factored resistance in flexural buckling, N: `C_r = phi A F_y (1 + lambda^(2n))^(-1/n)`, n = 1.34.
 * A mm2; F_y MPa; lambda from `slenderness`. CSA S16:19, 13.3.1.
 */
export function compressionResistance(A: number, Fy: number, lambda: number): number {
  return phi * A * Fy * Math.pow(1 + Math.pow(lambda, 2 * n), -1 / n);
}
