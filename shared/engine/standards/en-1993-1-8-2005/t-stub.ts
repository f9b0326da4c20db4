/**
 * Design resistance of an equivalent T-stub in tension, N, with prying forces: the least of
 *
 *   mode 1, the flange yields            4 M_pl,1/m
 *   mode 2, bolts with the flange        (2 M_pl,2 + n ΣF_t,Rd)/(m + n)
 *   mode 3, the bolts alone              ΣF_t,Rd
 *
 * with `M_pl,i = 0.25 Σl_eff,i t² f_y/gamma_M0` and `n = min(e, 1.25 m)`. Method 1, without backing plates; prying is taken
 * to develop whatever the length of the bolts, which errs low. mm, N, MPa. EN 1993-1-8:2005, 6.2.4 and Table 6.2.
 */
export function tStubResistance(i: {
  m: number;
  e: number;
  leff1: number;
  leff2: number;
  t: number;
  fy: number;
  gammaM0: number;
  sumFt: number;
}): { mode1: number; mode2: number; mode3: number } {
  const n = Math.min(i.e, 1.25 * i.m);
  const moment = (0.25 * i.t * i.t * i.fy) / i.gammaM0;
  return {
    mode1: (4 * i.leff1 * moment) / i.m,
    mode2: (2 * i.leff2 * moment + n * i.sumFt) / (i.m + n),
    mode3: i.sumFt,
  };
}
