import {
  oneCopeCriticalStress,
  reducedSection,
  type ReducedSection,
  twoCopesCriticalStress,
} from '../../limit-states/coped-section.ts';
import type { Basis, Rec } from '../../standards/basis.ts';
import { type BeamEnd, isCoped } from './beam.ts';

const CLAUSE = 'elastic section; buckling by the AISC Manual, Part 9';

/** A beam's end where its copes begin, with everything that the load does not change. mm, MPa. */
export interface CopedSection extends ReducedSection {
  /** From the face of the support to the inner end of the longer cope. */
  readonly reach: number;
  /** From the middle of the bolts to the centroid of what is left, either way. */
  readonly eccentricity: number;
  readonly shearArea: number;
  readonly critical: number;
  /** Design stress: yield, or what buckling leaves of it. */
  readonly stress: number;
}

/** The coped section of a beam's end, or null where it has no cope. Two copes take the longer length for both. */
export function copedSectionOf(basis: Basis, beam: BeamEnd): CopedSection | null {
  const { section, top, bottom, depthLeft, steel } = beam;
  if (!isCoped(top) && !isCoped(bottom)) return null;
  const { depth, webThickness, width, flangeThickness } = section;
  const both = isCoped(top) && isCoped(bottom);
  // A cope that the rules reject may have no length or leave nothing; the numbers stay finite all the same.
  const length = Math.max(1, top.length, bottom.length);
  const left = Math.max(1 + flangeThickness, depthLeft);
  const reduced = reducedSection(left, webThickness, width, both ? 0 : flangeThickness);
  const critical = both
    ? twoCopesCriticalStress(basis.modulus, left, length, webThickness)
    : oneCopeCriticalStress(basis.modulus, depth, left, length, webThickness);
  return {
    ...reduced,
    reach: beam.gap + length,
    eccentricity: Math.abs(heightOfCentroid(beam, reduced.centroid)),
    shearArea: left * webThickness,
    critical,
    stress: basis.yieldStress(steel.fy) * Math.min(1, critical / steel.fy),
  };
}

/** Centroid of what is left above the middle of the bolts. */
function heightOfCentroid({ section, top, bottom, offset }: BeamEnd, centroid: number): number {
  const upper = section.depth / 2 - offset;
  return isCoped(top) ? upper - top.depth - centroid : upper - section.depth + bottom.depth + centroid;
}

/**
 * Pull, shear and bending where the copes begin, N: `sqrt((N/A + M/Z)^2 + 3 (V/A_v)^2)` against yield or buckling; M
 * of the shear from its line to there and of the pull from the bolts to the centroid of what is left.
 * @param lineAt from the face of the support to where the shear acts, mm
 */
export function copedSectionCapacity(
  beam: BeamEnd,
  coped: CopedSection,
  lineAt: number,
  cos: number,
  sin: number,
  rec: Rec,
): number {
  const lever = Math.max(0, coped.reach - lineAt);
  const moment = Math.abs(sin) * lever + Math.abs(cos) * coped.eccentricity;
  const normal = Math.abs(cos) / coped.area + moment / coped.modulus;
  const shear = sin / coped.shearArea;
  const combined = Math.sqrt(normal * normal + 3 * shear * shear);
  if (rec !== null) {
    rec.line('h_0', 'depth left', '', beam.depthLeft, 'mm', CLAUSE);
    rec.line('A', 'flange and web left', '', coped.area, 'mm²', CLAUSE);
    rec.line('Z', 'least elastic modulus', '', coped.modulus, 'mm³', CLAUSE);
    rec.line(
      'e_c',
      'middle of the bolts to the centroid of what is left',
      '',
      coped.eccentricity,
      'mm',
      CLAUSE,
    );
    rec.line('F_cr', 'buckling of the web at the cope', '', coped.critical, 'MPa', CLAUSE);
    rec.line('f_d', 'design stress', 'f_yd min(1, F_cr/f_y)', coped.stress, 'MPa', CLAUSE);
    rec.line('M/R', 'where the copes begin', 'V × lever + N e_c', moment, 'mm', CLAUSE);
    rec.line('σ', 'normal stress of a unit resultant', 'N/A + M/Z', normal, 'MPa per N', CLAUSE);
    rec.line('τ', 'shear stress of a unit resultant', 'V/(h_0 t_w)', shear, 'MPa per N', CLAUSE);
    rec.line('σ_v', 'combined', '√(σ² + 3τ²)', combined, 'MPa per N', CLAUSE);
  }
  return coped.stress / combined;
}
