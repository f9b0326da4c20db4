import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { capacityOf, type WholeDetail } from '@shared/verification/details/detail.ts';

/*
 * The weld of a gusset plate by other means: the line is cut into short pieces, each a point that pulls and shears,
 * the centroid and the second moment are summed instead of taken from formulas, and every piece is checked.
 */
const PIECES = 4000;

interface Given {
  readonly length: number;
  readonly leg: number;
  readonly offset: number;
  /** Degrees. */
  readonly angle: number;
}

/** Force per millimetre of one of the two fillets on each piece for a resultant of 1 N: across and along, N/mm. */
function* pieces({ length, offset, angle }: Given): Generator<readonly [across: number, along: number]> {
  const theta = (angle * Math.PI) / 180;
  const step = length / PIECES;
  // Points at the ends of the pieces, so that both ends of the weld are among them.
  const heights = Array.from({ length: PIECES + 1 }, (_, at) => -length / 2 + at * step);
  const sum = (value: (y: number) => number) =>
    heights.reduce((total, y, at) => total + value(y) * step * (at === 0 || at === PIECES ? 0.5 : 1), 0);
  const area = 2 * sum(() => 1);
  const centroid = (2 * sum((y) => y)) / area;
  const inertia = 2 * sum((y) => (y - centroid) ** 2);
  const pull = Math.cos(theta);
  // The resultant meets the face at the offset; along the face it has no arm about the weld line.
  const moment = pull * (offset - centroid);
  for (const y of heights) yield [pull / area + (moment * (y - centroid)) / inertia, Math.sin(theta) / area];
}

function weakest(given: Given, utilisation: (across: number, along: number) => number): number {
  let most = 0;
  for (const [across, along] of pieces(given)) most = Math.max(most, utilisation(across, along));
  return 1 / most / 1000;
}

/** SANS 10162-1 13.13.2.2(b), Xu 480, by the angle of the force on the piece. */
const sansMetal = (leg: number) => (across: number, along: number) => {
  const angle = Math.atan2(Math.abs(across), Math.abs(along));
  const strength = 0.67 * 0.67 * leg * Math.cos(Math.PI / 4) * 480 * (1 + 0.5 * Math.sin(angle) ** 1.5);
  return Math.hypot(across, along) / strength;
};

/** SANS 10162-1 13.13.2.2(a), fu 470. */
const sansBase = (leg: number) => (across: number, along: number) =>
  Math.hypot(across, along) / (0.67 * 0.67 * leg * 470);

/** EN 1993-1-8 4.5.3.2, fu 470, βw 0.9, γM2 1.25: the traction on the throat plane as a vector, turned into it. */
const enMetal = (leg: number) => (across: number, along: number) => {
  const throat = leg * Math.sin(Math.PI / 4);
  const normal = (across * Math.cos(Math.PI / 4)) / throat;
  const inPlane = (across * Math.sin(Math.PI / 4)) / throat;
  const equivalent = Math.sqrt(normal ** 2 + 3 * inPlane ** 2 + 3 * (along / throat) ** 2);
  return Math.max(equivalent / (470 / (0.9 * 1.25)), Math.abs(normal) / ((0.9 * 470) / 1.25));
};

const detail = (basis: WholeDetail['basis'], { length, leg, offset, angle }: Given): WholeDetail => ({
  basis,
  angle,
  sense: 'compression',
  values: {
    plate_thickness: 12,
    plate_steel: { fy: 340, fu: 470 },
    outline: 'rectangular',
    projection: 1500,
    weld_length: length,
    weld_leg: leg,
    work_line_offset: offset,
    fit_checks: 'waived',
    bolt_size: { d: 20, stressArea: 245 },
    bolt_grade: { fyb: 640, fub: 800 },
    hole_diameter: 22,
    rows: 2,
    lines: 1,
    pitch: 70,
    first_row: 200,
    brace: 'flat',
    section: { shape: 'flat', width: 90, thickness: 12 },
    member_steel: { fy: 340, fu: 470 },
  },
});

const given = fc.record({
  length: fc.integer({ min: 700, max: 1400 }),
  leg: fc.integer({ min: 6, max: 15 }),
  // Beyond a sixth of the length the pull changes sign on the weld.
  offset: fc.integer({ min: -165, max: 165 }),
  angle: fc.integer({ min: -30, max: 30 }),
});

describe('the weld of a gusset plate, piece by piece', () => {
  it.each([
    ['weld metal to SANS 10162-1', 'sans-10162-1-2011', 'WM', sansMetal],
    ['base metal to SANS 10162-1', 'sans-10162-1-2011', 'WB', sansBase],
    ['weld metal to EN 1993-1-8', 'en-1993-1-8-2005', 'WM', enMetal],
  ] as const)('%s', (_name, basis, code, clause) => {
    fc.assert(
      fc.property(given, (one) => {
        const ours = capacityOf(detail(basis, one), code);
        const summed = weakest(one, clause(one.leg));
        // The pieces miss the worst point by less than one step, and the second moment by 1/PIECES squared.
        expect(Math.abs(ours / summed - 1)).toBeLessThan(2e-5);
      }),
      { numRuns: 60 },
    );
  });

  it('the load angle in place of the angle on the piece gives another answer', () => {
    const one: Given = { length: 800, leg: 8, offset: 80, angle: 35 };
    const wrong = weakest(one, (across, along) => {
      const strength =
        0.67 * 0.67 * 8 * Math.SQRT1_2 * 480 * (1 + 0.5 * Math.cos((35 * Math.PI) / 180) ** 1.5);
      return Math.hypot(across, along) / strength;
    });
    const ours = capacityOf(detail('sans-10162-1-2011', one), 'WM');
    expect(Math.abs(wrong / ours - 1)).toBeGreaterThan(0.005);
  });
});
