/**
 * Design tension resistance of one bolt, N: `k_2 f_ub A_s / gamma_M2`.
 * k_2 0.9, or 0.63 countersunk; A_s mm2; f_ub MPa. EN 1993-1-8:2005, Table 3.4.
 */
export function boltTensionResistance(i: { k2?: number; fub: number; As: number; gammaM2: number }): number {
  return ((i.k2 ?? 0.9) * i.fub * i.As) / i.gammaM2;
}

/**
 * Design punching shear resistance of the ply under a bolt head or nut, N: `0.6 pi d_m t_p f_u / gamma_M2`.
 * d_m mean of the widths across points and flats, or the lesser width across flats (errs low); mm, MPa.
 * EN 1993-1-8:2005, Table 3.4.
 */
export function punchingResistance(i: { dm: number; tp: number; fu: number; gammaM2: number }): number {
  return (0.6 * Math.PI * i.dm * i.tp * i.fu) / i.gammaM2;
}

/**
 * Tension that a bolt takes beside a shear, N: `1.4 F_t,Rd (1 - F_v/F_v,Rd)`, from 0 to F_t,Rd.
 * v = F_v/F_v,Rd; FtRd N. EN 1993-1-8:2005, Table 3.4.
 */
export function tensionBesideShear(FtRd: number, v: number): number {
  return FtRd * Math.max(0, Math.min(1, 1.4 * (1 - v)));
}

/**
 * Utilisation of a bolt in shear and tension: the greater of `F_v/F_v,Rd + F_t/(1.4 F_t,Rd)` and `F_t/F_t,Rd`.
 * EN 1993-1-8:2005, Table 3.4.
 */
export function shearTensionUtilisation(i: { Fv: number; FvRd: number; Ft: number; FtRd: number }): number {
  return Math.max(i.Fv / i.FvRd + i.Ft / (1.4 * i.FtRd), i.Ft / i.FtRd);
}
