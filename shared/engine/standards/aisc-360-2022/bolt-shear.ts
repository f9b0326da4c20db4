import type { BoltGrade, BoltStresses } from '../../types.ts';

/** Beyond this length between the end bolts an end-loaded joint takes 0.833, mm (38 in.). */
const LONG = 965;

/**
 * Nominal shear strength of one bolt, N: `R_n = F_nv A_b`, over all its planes.
 *
 * F_nv of Table J3.2 for threads in (N) or out of (X) the planes, MPa; A_b nominal unthreaded area, mm2; planes their
 * number. Not for slip-critical joints. Nominal. ANSI/AISC 360-22, J3.7, equation (J3-1).
 */
export function nominalBoltShear(i: { Fnv: number; Ab: number; planes: number }): number {
  return i.Fnv * i.Ab * i.planes;
}

/**
 * Reduction of F_nv in an end-loaded joint: 0.833 where the end bolts are more than 965 mm (38 in.) apart, else 1;
 * Table J3.2 holds the reduction up to there. L along the force, mm. ANSI/AISC 360-22, Table J3.2, note [b].
 */
export function longJointFactor(L: number): number {
  return L > LONG ? 0.833 : 1;
}

/**
 * Nominal stresses of a bolt given by its tensile strength alone, MPa: F_nt = 0.75 F_u, F_nv = 0.450 F_u with threads
 * in the shear planes and 0.563 F_u without: a threaded part. F_u MPa. ANSI/AISC 360-22, Table J3.2.
 */
export function threadedPartStresses(Fu: number): BoltStresses {
  return { fnt: 0.75 * Fu, fnvN: 0.45 * Fu, fnvX: 0.563 * Fu };
}

/** Stresses of a grade: its own row of ANSI/AISC 360-22 Table J3.2, or those of a threaded part. */
export function stressesOf(grade: BoltGrade): BoltStresses {
  return grade.aisc ?? threadedPartStresses(grade.fub);
}
