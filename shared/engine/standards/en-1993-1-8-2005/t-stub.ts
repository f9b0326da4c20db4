import type { Rec, TStub } from '../basis.ts';

const CLAUSE = 'EN 1993-1-8 6.2.4, Table 6.2';

/** γ_Mu of handbooks of simple connections, for plates that may deform largely under an accidental tying force. */
export const tyingFactor = 1.1;

/**
 * Plastic moment of the flange along a yield line, N mm: `0.25 Σl_eff t² f_y/gamma_M0`.
 * leff, t mm; bending design stress f_y/gamma_M0, MPa. EN 1993-1-8:2005, Table 6.2.
 */
export function plasticMoment(leff: number, t: number, bending: number): number {
  return 0.25 * leff * t * t * bending;
}

/** Lever of the prying force, mm: `n = min(e, 1.25 m)`. EN 1993-1-8:2005, Table 6.2. */
export function pryingLever(m: number, e: number): number {
  return Math.min(e, 1.25 * m);
}

/** Mode 1, complete yielding of the flange, method 1, N: `4 M_pl,1/m`. N mm, mm. EN 1993-1-8:2005, Table 6.2. */
export function flangeYield(Mpl1: number, m: number): number {
  return (4 * Mpl1) / m;
}

/**
 * Mode 2, bolt failure with yielding of the flange, N: `(2 M_pl,2 + n ΣF_t,Rd)/(m + n)`. N mm, mm, N.
 * EN 1993-1-8:2005, Table 6.2.
 */
export function boltsWithFlange(Mpl2: number, m: number, n: number, sumFt: number): number {
  return (2 * Mpl2 + n * sumFt) / (m + n);
}

/**
 * Bolt length up to which prying can develop, mm: `L_b* = 8.8 m³ A_s n_b/(Σl_eff,1 t³)`; n_b rows of two bolts, A_s mm2.
 * The length of a bolt is its grip with washers and half of its head and nut. A stub with longer bolts lifts off before it
 * pries and carries not more than `2 M_pl,1/m`, half of mode 1. EN 1993-1-8:2005, Table 6.2.
 */
export function longestPryingBolt(m: number, As: number, rows: number, leff1: number, t: number): number {
  return (8.8 * m * m * m * As * rows) / (leff1 * t * t * t);
}

/**
 * Design resistance of an equivalent T-stub in tension, N: the least of modes 1 and 2 and the bolts alone (mode 3), without
 * backing plates. Prying is taken to develop; the sheet says up to which bolt length it does.
 * @param bending design stress f_y/gamma_M0 of the flange, MPa
 * @param boltTension design tension that each bolt may take, N
 * EN 1993-1-8:2005, 6.2.4.
 */
export function tStubResistance(stub: TStub, bending: number, boltTension: number, rec: Rec): number {
  const { m, leff1, leff2, thickness: t } = stub;
  const n = pryingLever(m, stub.edge);
  const sumFt = stub.bolts * boltTension;
  const mode1 = flangeYield(plasticMoment(leff1, t, bending), m);
  const mode2 = boltsWithFlange(plasticMoment(leff2, t, bending), m, n, sumFt);
  if (rec !== null) {
    const lengths = 'EN 1993-1-8 Table 6.4';
    const longest = longestPryingBolt(m, stub.bolt.stressArea, stub.bolts / 2, leff1, t);
    if (stub.byTensile) rec.line('f_u/γ_Mu', 'tying, large deformations', '', bending, 'MPa', CLAUSE);
    rec.line('m', 'bolt line to the yield line', '', m, 'mm', CLAUSE);
    rec.line('n', 'lever of prying', 'min(e, 1.25 m)', n, 'mm', CLAUSE);
    rec.line('Σl_eff,1', 'effective length, mode 1', '', leff1, 'mm', lengths);
    rec.line('Σl_eff,2', 'effective length, mode 2', '', leff2, 'mm', lengths);
    rec.line('L_b*', 'prying with bolts up to', '8.8 m³ A_s n_b/(Σl_eff,1 t³)', longest, 'mm', CLAUSE);
    rec.line('ΣF_t,Rd', 'all bolts', `${stub.bolts} bolts`, sumFt, 'N', CLAUSE);
    rec.line('F_T,1,Rd', 'mode 1, the plate yields', '4 M_pl,1,Rd/m', mode1, 'N', CLAUSE);
    rec.line('F_T,2,Rd', 'mode 2, both', '(2 M_pl,2,Rd + n ΣF_t,Rd)/(m + n)', mode2, 'N', CLAUSE);
    rec.line('F_T,3,Rd', 'mode 3, the bolts', 'ΣF_t,Rd', sumFt, 'N', CLAUSE);
  }
  return Math.min(mode1, mode2, sumFt);
}
