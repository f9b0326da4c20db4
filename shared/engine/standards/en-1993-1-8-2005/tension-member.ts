/** Design plastic resistance of a gross section, N: `A f_y/gamma_M0`. EN 1993-1-1:2005, 6.2.3(2)a. */
export function grossYield(A: number, fy: number, gammaM0: number): number {
  return (A * fy) / gammaM0;
}

/**
 * Design ultimate resistance of a net section at holes, N: `0.9 A_net f_u/gamma_M2`. mm2, MPa.
 * EN 1993-1-1:2005, 6.2.3(2)b.
 */
export function netSectionResistance(Anet: number, fu: number, gammaM2: number): number {
  return (0.9 * Anet * fu) / gammaM2;
}

/**
 * Reduction beta_2 (two bolts) or beta_3 (three or more) for an angle connected by one leg: at p_1 <= 2.5 d_0
 * 0.4 and 0.5, at p_1 >= 5 d_0 0.7 and 0.7, linear between. EN 1993-1-8:2005, Table 3.8.
 */
export function oneLegReduction(rows: number, p1: number, d0: number): number {
  const start = rows >= 3 ? 0.5 : 0.4;
  const part = Math.min(1, Math.max(0, (p1 / d0 - 2.5) / 2.5));
  return start + part * (0.7 - start);
}

/**
 * Design ultimate resistance of a single angle bolted by one leg, N:
 *
 *   one bolt    2.0 (e_2 - 0.5 d_0) t f_u/gamma_M2
 *   two bolts   beta_2 A_net f_u/gamma_M2
 *   three up    beta_3 A_net f_u/gamma_M2
 *
 * e_2 from the hole to the toe, t thickness, p_1 pitch, d_0 hole, mm; A_net, mm2: for an unequal angle bolted
 * by its shorter leg the net area of an equal angle of that leg. f_u MPa.
 * Printed for one line of bolts; see `equalAngleArea`. EN 1993-1-8:2005, 3.10.3, equations (3.11) to (3.13).
 */
export function angleByOneLeg(i: {
  bolts: number;
  e2: number;
  d0: number;
  t: number;
  p1: number;
  Anet: number;
  fu: number;
  gammaM2: number;
}): number {
  if (i.bolts === 1) return (2 * Math.max(0, i.e2 - 0.5 * i.d0) * i.t * i.fu) / i.gammaM2;
  return (oneLegReduction(i.bolts, i.p1, i.d0) * i.Anet * i.fu) / i.gammaM2;
}

/**
 * Area of the equal angle that stands for an unequal one bolted by its shorter leg, mm2: `(2 b - t) t`, root
 * and toe radii left out (errs low). EN 1993-1-8:2005, 3.10.3(3).
 */
export function equalAngleArea(leg: number, t: number): number {
  return (2 * leg - t) * t;
}
