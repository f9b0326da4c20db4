import { backmarksOfLeg } from '../backmarks.ts';
import { massPerMetre } from '../mass.ts';
import type { AngleRecord, MissingValue } from '../types.ts';

/** What the section table prints of one angle: mm, mm2. */
type PrintedAngle = Pick<AngleRecord, 'a' | 'b' | 't' | 'r1' | 'A' | 'cx' | 'cy'>;

const provenance = {
  source: 'EN 10056-1 section table: dimensions, area, centroid. Back marks: common practice',
  edition: 'EN 10056-1:1998',
  evidence: 'from memory; area and centroid confirmed from geometry within 0.7 %; mass from the area',
};

/** One angle of EN 10056-1, whose toe radius is half its root radius. */
export function angle(printed: PrintedAngle): AngleRecord {
  const { a, b, t, r1, A, cx, cy } = printed;
  const backmarks = { a: backmarksOfLeg(a), b: backmarksOfLeg(b) };
  return {
    name: `L${a}x${b}x${t}`,
    a,
    b,
    t,
    r1,
    r2: r1 / 2,
    A,
    cx,
    cy,
    mass: massPerMetre(A),
    backmarks,
    ...provenance,
    missing: missingBackmarks(backmarks),
  };
}

function missingBackmarks(backmarks: AngleRecord['backmarks']): readonly MissingValue[] {
  const missing: MissingValue[] = [];
  for (const leg of ['a', 'b'] as const) {
    for (const lines of ['oneLine', 'twoLines'] as const) {
      if (backmarks[leg][lines] !== null) continue;
      missing.push({
        field: `backmarks.${leg}.${lines}`,
        reason: 'the table of common practice gives none for this leg',
      });
    }
  }
  return missing;
}
