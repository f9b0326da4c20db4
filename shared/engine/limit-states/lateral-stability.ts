import type { Basis, Rec } from '../standards/basis.ts';

/**
 * How far a plate may stand out to its bolts before it is long, mm: `t/0.15`. Steel Buildings in Europe, Multi-Storey
 * Steel Buildings Part 5, 3.1.
 */
export function shortPlateReach(thickness: number): number {
  return thickness / 0.15;
}

/** Elastic moduli of steel: E over G. */
const E_OVER_G = 2.6;

/**
 * Moment that an upright plate t x h carries between the weld and the bolts without buckling sideways, N mm.
 *
 * Elastic critical moment of a narrow rectangle under an even moment, `M_cr = pi h t^3 sqrt(E G)/(6 L)`, its stress
 * put in place of that of a strut in the buckling curve of the basis. Handbooks take a falling moment, which gives up
 * to 1/0.6 of this (errs low).
 * @param reach from the weld to the nearest column of bolts, mm
 */
export function lateralMoment(
  basis: Basis,
  thickness: number,
  height: number,
  reach: number,
  fy: number,
  rec: Rec,
): number {
  const modulus = (thickness * height * height) / 6;
  const rigidity = basis.modulus / Math.sqrt(E_OVER_G);
  const critical = (Math.PI * height * thickness ** 3 * rigidity) / (6 * reach);
  const slenderness = Math.PI * Math.sqrt((basis.modulus * modulus) / critical);
  if (rec !== null) {
    const clause = 'method of this catalogue';
    rec.line('z_p', 'weld to the first column, longer than t/0.15', '', reach, 'mm', 'common practice');
    rec.line('Z', 'section modulus', 't h²/6', modulus, 'mm³', clause);
    rec.line('M_cr', 'elastic critical moment', 'π h t³ √(E G)/(6 z_p)', critical, 'N·mm', clause);
    rec.line('λ', 'slenderness of a strut with that stress', 'π √(E Z/M_cr)', slenderness, '', clause);
  }
  return modulus * basis.compression(1, fy, slenderness, rec);
}
