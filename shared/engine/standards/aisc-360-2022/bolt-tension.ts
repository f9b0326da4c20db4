import { type Format, rupture } from './format.ts';

/**
 * Nominal tensile strength of one bolt, N: `R_n = F_nt A_b`.
 * F_nt of Table J3.2, MPa; A_b nominal unthreaded area, mm2. Prying is added to the load by the caller. Nominal.
 * ANSI/AISC 360-22, J3.7, equation (J3-1).
 */
export function nominalBoltTension(i: { Fnt: number; Ab: number }): number {
  return i.Fnt * i.Ab;
}

/**
 * Available tension of a bolt beside a shear, N: `T min(1, 1.3 - v)`, not below 0.
 *
 * T available tension without shear, N; v required over available shear of that bolt, in one format: f_rv/(phi F_nv) or
 * Omega f_rv/F_nv. It is `tensileStressWithShear` in ratios. ANSI/AISC 360-22, J3.8, (J3-2), (J3-3a), (J3-3b).
 */
export function tensionBesideShear(T: number, v: number): number {
  return T * Math.max(0, Math.min(1, 1.3 - v));
}

/**
 * Nominal tensile stress of a bolt that also carries shear, MPa, not below 0:
 *
 *   LRFD  F'_nt = 1.3 F_nt - F_nt f_rv/(phi F_nv) <= F_nt
 *   ASD   F'_nt = 1.3 F_nt - Omega F_nt f_rv/F_nv <= F_nt
 *
 * f_rv required shear stress of the format's loads, MPa. The text lets it be left out where either stress is at most
 * 30 % of the available one; it is applied always, which is the same there. ANSI/AISC 360-22, J3.8, (J3-3a), (J3-3b).
 */
export function tensileStressWithShear(format: Format, i: { Fnt: number; Fnv: number; frv: number }): number {
  const share = i.frv / (format.factor(rupture) * i.Fnv);
  return Math.max(0, Math.min(i.Fnt, i.Fnt * (1.3 - share)));
}
