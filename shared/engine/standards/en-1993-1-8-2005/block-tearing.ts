/**
 * Design block tearing resistance, N:
 *
 *   V_eff,1 = f_u A_nt/gamma_M2 + f_y A_nv/(sqrt(3) gamma_M0)      tension spread evenly
 *   V_eff,2 = 0.5 f_u A_nt/gamma_M2 + f_y A_nv/(sqrt(3) gamma_M0)  eccentric
 *
 * A_nt, A_nv net areas in tension and shear, mm2; f_y, f_u MPa.
 * EN 1993-1-8:2005, 3.10.2, equations (3.9) and (3.10).
 */
export function blockTearing(
  Ant: number,
  Anv: number,
  fy: number,
  fu: number,
  eccentric: boolean,
  gammaM0: number,
  gammaM2: number,
): number {
  return ((eccentric ? 0.5 : 1) * fu * Ant) / gammaM2 + (fy * Anv) / (Math.sqrt(3) * gammaM0);
}
