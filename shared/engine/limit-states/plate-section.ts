import { rootOfInteraction } from '../numeric/roots.ts';
import type { Rec } from '../standards/basis.ts';

/**
 * Largest resultant on a rectangular section t x L under pull, shear and bending together, N.
 *
 * Elastic: `sqrt((|N|/A + |M|/Z)^2 + 3 (V/A)^2) <= f_yd`. Plastic: `M/M_pl + (N/N_pl)^2 + (V/V_pl)^4 <= 1`.
 * @param fyd design yield stress, MPa
 * @param n pull, `v` shear, `m` moment for a resultant of 1 N; thickness and length mm
 */
export function plateSectionCapacity(
  fyd: number,
  thickness: number,
  length: number,
  n: number,
  v: number,
  m: number,
  plastic: boolean,
  clause: string,
  rec: Rec,
): number {
  const area = thickness * length;
  if (rec !== null) {
    rec.line('A', 'section', 't L', area, 'mm²', clause);
    rec.line('f_yd', 'design yield stress', '', fyd, 'MPa', clause);
  }
  return plastic
    ? plasticCapacity(fyd, area, length, n, v, m, clause, rec)
    : elasticCapacity(fyd, area, length, n, v, m, clause, rec);
}

function elasticCapacity(
  fyd: number,
  area: number,
  length: number,
  n: number,
  v: number,
  m: number,
  clause: string,
  rec: Rec,
): number {
  const modulus = (area * length) / 6;
  const normal = Math.abs(n) / area + Math.abs(m) / modulus;
  const shear = Math.abs(v) / area;
  const combined = Math.sqrt(normal * normal + 3 * shear * shear);
  if (rec !== null) recordElastic(modulus, normal, shear, combined, clause, rec);
  return fyd / combined;
}

function recordElastic(
  modulus: number,
  normal: number,
  shear: number,
  combined: number,
  clause: string,
  rec: NonNullable<Rec>,
): void {
  rec.line('Z', 'section modulus', 't L²/6', modulus, 'mm³', clause);
  rec.line('σ', 'normal stress of a unit resultant', '|N|/A + |M|/Z', normal, 'MPa per N', clause);
  rec.line('τ', 'shear stress of a unit resultant', '|V|/A', shear, 'MPa per N', clause);
  rec.line('σ_v', 'combined', '√(σ² + 3τ²)', combined, 'MPa per N', clause);
}

function plasticCapacity(
  fyd: number,
  area: number,
  length: number,
  n: number,
  v: number,
  m: number,
  clause: string,
  rec: Rec,
): number {
  const plasticMoment = (fyd * area * length) / 4;
  const squash = fyd * area;
  const plasticShear = squash / Math.sqrt(3);
  if (rec !== null) {
    rec.line('M_pl', 'plastic moment', 'f_yd t L²/4', plasticMoment, 'N·mm', clause);
    rec.line('N_pl', 'squash load', 'f_yd A', squash, 'N', clause);
    rec.line('V_pl', 'plastic shear', 'f_yd A/√3', plasticShear, 'N', clause);
    rec.line('', 'solved for R', 'M/M_pl + (N/N_pl)² + (V/V_pl)⁴ = 1', '', '', clause);
  }
  const shear = v / plasticShear;
  const pull = n / squash;
  return rootOfInteraction(Math.abs(m) / plasticMoment, pull * pull, shear * shear * shear * shear);
}
