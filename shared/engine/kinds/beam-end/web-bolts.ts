import type { PatternCoefficients } from '../../groups/ic-cache.ts';
import type { GroupBearing } from '../../limit-states/group-bearing.ts';
import type { UprightForces } from '../../limit-states/upright-forces.ts';
import type { Basis, BoltInShear, Rec } from '../../standards/basis.ts';
import type { Recorder } from '../../types.ts';
import type { Lines } from './shear-lines.ts';

/** The bolts through a beam's web, ready for their limit states. N, mm. */
export interface WebBolts {
  readonly basis: Basis;
  readonly bolt: BoltInShear;
  /** Shear of one bolt, all planes. */
  readonly oneBolt: number;
  readonly lines: Lines;
  /** A shear up and one down are both looked at, because the beam is not the same both ways. */
  readonly bothWays: boolean;
  readonly forces: UprightForces;
  /** Coefficients of the instantaneous centre, or null where the bolts share elastically. */
  readonly coefficients: PatternCoefficients | null;
  readonly webBearing: GroupBearing;
}

/** The most loaded bolt in shear, N: for each line of shear, the worse kept. */
export function webBoltShear(w: WebBolts, cos: number, sin: number, rec: Rec): number {
  let least = Infinity;
  for (const lever of w.lines.boltLevers) {
    const capacity = w.oneBolt * multiplier(w, cos, sin, lever);
    least = Math.min(least, capacity);
  }
  if (rec !== null) recordBolts(w, cos, sin, rec);
  return least;
}

/** Bearing on the bolted part beside the web by the elastic forces of the bolts, N. */
export function partBearing(w: WebBolts, part: GroupBearing, cos: number, sin: number, rec: Rec): number {
  let least = Infinity;
  let worst = 0;
  for (const lever of w.lines.boltLevers) {
    w.forces.load(cos, sin, lever * sin);
    const capacity = part.capacity(w.forces.fx, w.forces.fy, 1, null);
    if (capacity < least) {
      least = capacity;
      worst = lever;
    }
  }
  if (rec !== null) {
    rec.line('M_b', 'moment on the bolts of a unit resultant', '', worst * sin, 'mm', '');
    w.forces.load(cos, sin, worst * sin);
    part.capacity(w.forces.fx, w.forces.fy, 1, rec);
  }
  return least;
}

/** Bearing on the web, which the bolts push the other way, N: up and down where the family asks for both. */
export function webBearing(w: WebBolts, cos: number, sin: number, rec: Rec): number {
  let least = Infinity;
  let worst = 0;
  let worstSin = sin;
  for (let way = 1; way >= (w.bothWays ? -1 : 1); way -= 2) {
    for (const lever of w.lines.boltLevers) {
      w.forces.load(cos, way * sin, lever * way * sin);
      const capacity = w.webBearing.capacity(w.forces.fx, w.forces.fy, -1, null);
      if (capacity < least) {
        least = capacity;
        worst = lever;
        worstSin = way * sin;
      }
    }
  }
  if (rec !== null) {
    rec.line('M_b', 'moment on the bolts of a unit resultant', '', worst * worstSin, 'mm', '');
    w.forces.load(cos, worstSin, worst * worstSin);
    w.webBearing.capacity(w.forces.fx, w.forces.fy, -1, rec);
  }
  return least;
}

/** Resultants of 1 N that the bolts carry for each newton of one bolt's shear. */
function multiplier({ coefficients, forces }: WebBolts, cos: number, sin: number, lever: number): number {
  if (coefficients !== null) return coefficients.coefficient(sin, lever * sin);
  forces.load(cos, sin, lever * sin);
  return 1 / forces.most;
}

function recordBolts(w: WebBolts, cos: number, sin: number, rec: Recorder): void {
  w.basis.boltShear(w.bolt, rec);
  for (const lever of w.lines.boltLevers) {
    const where = lever === 0 ? 'shear at the bolts' : 'shear at the face of the support';
    rec.line('M_b', `moment on the bolts, ${where}`, 'V × lever', lever * sin, 'mm', '');
    const carried = multiplier(w, cos, sin, lever);
    if (w.coefficients !== null) {
      recordCentre(w.basis, carried, rec);
      continue;
    }
    rec.line('Σr²', 'about the middle of the bolts', '', w.forces.polar, 'mm²', '');
    rec.line('F/R', 'most loaded bolt, unit resultant', '√(F_x² + F_y²)', 1 / carried, 'N per N', '');
  }
}

/** The coefficient of an eccentric group by the instantaneous centre. */
export function recordCentre(basis: Basis, C: number, rec: Recorder): void {
  const source = 'instantaneous centre: Crawford and Kulak, 1971';
  const multiple =
    basis.centreNormalisation === 'atMaximum'
      ? 'of the force at the greatest deformation'
      : 'of the ultimate strength';
  rec.line('C', `coefficient, a multiple ${multiple} of a bolt`, '', C, '', source);
}
