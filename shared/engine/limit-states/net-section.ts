import { rootOfInteraction } from '../numeric/roots.ts';
import type { Rec } from '../standards/basis.ts';

/** A rectangle less the holes of one column that stands evenly about its middle. mm2, mm3. */
export interface NetSection {
  readonly area: number;
  readonly elastic: number;
  readonly plastic: number;
}

/** Area and section moduli of a plate t x h less `rows` holes at `pitch` about its middle, mm. Not below 0. */
export function netSectionOf(
  thickness: number,
  height: number,
  rows: number,
  pitch: number,
  deduction: number,
): NetSection {
  let inertia = height ** 3 / 12;
  let plastic = (height * height) / 4;
  for (let row = 0; row < rows; row++) {
    const y = Math.abs((row - (rows - 1) / 2) * pitch);
    inertia -= deduction ** 3 / 12 + deduction * y * y;
    // A hole over the middle counts on both sides of it.
    plastic -= y >= deduction / 2 ? deduction * y : (deduction * deduction) / 4 + y * y;
  }
  return {
    area: thickness * Math.max(0, height - rows * deduction),
    elastic: thickness * Math.max(0, inertia / (height / 2)),
    plastic: thickness * Math.max(0, plastic),
  };
}

/**
 * Largest resultant on a net section under pull, shear and bending, N, against the design stress of rupture:
 * elastic `sqrt((|N|/A + |M|/Z)^2 + 3 (V/A)^2) <= f_d`, or plastic `M/M_u + (N/N_u)^2 + (V/V_u)^4 <= 1`.
 * @param fd MPa; `n`, `v`, `m` for a resultant of 1 N
 */
export function netSectionCapacity(
  section: NetSection,
  fd: number,
  n: number,
  v: number,
  m: number,
  plastic: boolean,
  clause: string,
  rec: Rec,
): number {
  const modulus = plastic ? section.plastic : section.elastic;
  if (rec !== null) {
    rec.line('A_n', 'net section', 't (h − n d_h)', section.area, 'mm²', clause);
    rec.line(plastic ? 'W_pl,n' : 'Z_n', 'net section modulus', '', modulus, 'mm³', clause);
    rec.line('f_ud', 'design stress of rupture', '', fd, 'MPa', clause);
  }
  if (section.area === 0 || modulus === 0) return 0;
  const bending = Math.abs(m) / modulus / fd;
  const pull = Math.abs(n) / section.area / fd;
  const shear = Math.abs(v) / section.area / fd;
  if (plastic) return rootOfInteraction(bending, pull * pull, 9 * shear ** 4);
  const normal = pull + bending;
  return 1 / Math.sqrt(normal * normal + 3 * shear * shear);
}
