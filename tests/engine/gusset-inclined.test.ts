import { describe, expect, it } from 'vitest';
import { type Point, toRadians } from '@shared/engine/index.ts';
import { broken, bothBases, capacities, EN, plain, prepare, SANS } from './support/gusset.ts';
import { ray, toSegment } from './support/plane.ts';

const DEGREES = 35;
const theta = toRadians(DEGREES);
const tilted = { ...plain, exposure: 'sheltered', work_line_offset: 22, first_row: 230 };
const rectangular = {
  ...tilted,
  outline: 'rectangular',
  projection: 480,
  weld_length: 620,
  plate_thickness: 9,
};

/** Where a bolt lies in x and y: s along the brace from (0, 22), q across it. */
function place(s: number, q: number): Point {
  return { x: s * Math.cos(theta) - q * Math.sin(theta), y: 22 + s * Math.sin(theta) + q * Math.cos(theta) };
}

/** Corners of the tapered plate: weld ends at ±205, cut at 230 + 150 + 58 = 438, half width 33 + 47 = 80. */
const tapered = [{ x: 0, y: -205 }, place(438, -80), place(438, 80), { x: 0, y: 205 }];

describe('the outline turned to 35 degrees', () => {
  it('has its corners where the drawing puts them', () => {
    const { outline, holes } = prepare(SANS, tilted).geometry(theta);
    outline.forEach((corner, index) => {
      expect(corner.x).toBeCloseTo(tapered[index]?.x ?? NaN, 9);
      expect(corner.y).toBeCloseTo(tapered[index]?.y ?? NaN, 9);
    });
    expect(holes).toHaveLength(6);
    expect(holes[0]?.centre.x).toBeCloseTo(place(230, -33).x, 9);
  });

  it('block shear of the gusset by rays to the outline, SANS 13.11', () => {
    const lower = place(230, -33);
    const upper = place(230, 33);
    const planes = [ray(tapered, lower, theta), ray(tapered, upper, theta)] as const;
    const sides = [
      ray(tapered, lower, theta - Math.PI / 2),
      ray(tapered, upper, theta + Math.PI / 2),
    ] as const;
    const block = (shear: number, shearHoles: number, tension: number, tensionHoles: number) =>
      0.9 * 470 * 14 * (tension - tensionHoles * 22) +
      0.54 * Math.min(14 * shear * 340, 14 * (shear - shearHoles * 22) * 470);
    const lowest = Math.min(
      block(planes[0] + planes[1], 5, 66, 1),
      block(planes[0], 2.5, 66 + sides[1], 1.5),
      block(planes[1], 2.5, 66 + sides[0], 1.5),
      block(planes[0] + planes[1], 5, sides[0] + sides[1], 1),
    );
    expect(capacities(SANS, tilted, DEGREES).GX / lowest).toBeCloseTo(1, 9);
  });

  it('one line: the block takes the nearer side and EN calls it eccentric, 3.10.2(3)', () => {
    const single = { ...tilted, lines: 1, member_backmark: 90, gusset_edge_distance: 80 };
    const bolt = place(230, 0);
    const shear = ray(tapered, bolt, theta);
    const side = Math.min(ray(tapered, bolt, theta - Math.PI / 2), ray(tapered, bolt, theta + Math.PI / 2));
    const expected = (0.5 * 470 * 14 * (side - 11)) / 1.25 + (340 * 14 * (shear - 55)) / Math.sqrt(3);
    expect(capacities(EN, single, DEGREES).GX / expected).toBeCloseTo(1, 9);
  });

  it('the spread width is cut by the outline and by the face', () => {
    // Half spread 150 tan 30 + 33 = 119.6 each side of the axis at the first row.
    const near = { ...tilted, rows: 5, first_row: 150, fit_checks: 'waived' };
    const row = place(150, 0);
    const half = 4 * 75 * Math.tan(Math.PI / 6) + 33;
    const corners = [{ x: 0, y: -205 }, place(150 + 300 + 58, -80), place(508, 80), { x: 0, y: 205 }];
    const above = Math.min(half, ray(corners, row, theta + Math.PI / 2));
    const below = Math.min(half, ray(corners, row, theta - Math.PI / 2));
    expect(above).toBeLessThan(half);
    const width = above + below;
    const expected = Math.min(0.9 * 14 * width * 340, 0.85 * 0.9 * 14 * (width - 44) * 470);
    expect(capacities(SANS, near, DEGREES).WH / expected).toBeCloseTo(1, 9);
  });

  it('the three lengths of the buckling strip run along the brace to the face', () => {
    const half = 2 * 75 * Math.tan(Math.PI / 6) + 33;
    const row = place(230, 0);
    const above = Math.min(half, ray(tapered, row, theta + Math.PI / 2));
    const below = Math.min(half, ray(tapered, row, theta - Math.PI / 2));
    const length = (q: number) => Math.max(0, place(230, q).x) / Math.cos(theta);
    const mean = (length(0) + length(above) + length(-below)) / 3;
    const lambda = ((1.2 * mean * Math.sqrt(12)) / 14 / Math.PI) * Math.sqrt(340 / 200_000);
    const expected = 0.9 * 14 * (above + below) * 340 * (1 + lambda ** 2.68) ** (-1 / 1.34);
    expect(capacities(SANS, tilted, DEGREES, 'compression').GC / expected).toBeCloseTo(1, 9);
  });

  it('edge distances are measured square to every free edge', () => {
    const tight = { ...tilted, gusset_edge_distance: 34, weld_length: 120 };
    const edges = [{ x: 0, y: -60 }, place(438, -67), place(438, 67), { x: 0, y: 60 }];
    const bolts = [230, 380].flatMap((s) => [place(s, -33), place(s, 33)]);
    const least = Math.min(
      ...bolts.flatMap((bolt) =>
        [0, 1, 2].map((side) => toSegment(bolt, edges[side] ?? bolt, edges[side + 1] ?? bolt)),
      ),
    );
    const rejection = broken(SANS, tight, DEGREES).find(({ rule }) => rule === 'gusset-edge');
    expect(rejection?.value).toBeCloseTo(least, 6);
    expect(rejection?.limit).toBe(34);
  });
});

describe('bearing on a rectangular plate', () => {
  it.each(bothBases)('with the force along an edge it is the plain rule: %s', (basis) => {
    // Projection chosen so that the end distance is the tapered plate's 58: 260 + 150 + 58.
    const square = { ...plain, exposure: 'sheltered', weld_length: 300 };
    const cut = capacities(basis, { ...square, gusset_edge_distance: 117 }, 0);
    const rect = capacities(basis, { ...square, outline: 'rectangular', projection: 468 }, 0);
    expect(rect.GB / cut.GB).toBeCloseTo(1, 12);
    expect(rect.GX / cut.GX).toBeCloseTo(1, 12);
  });

  it('at 35 degrees by hand for every bolt, SANS', () => {
    // R_bx, R_by = 0.67 t fu min(3 d, end, next bolt); the weakest bolt by √((cos/Rbx)² + (sin/Rby)²)
    const strengths = [0, 1, 2].flatMap((row) =>
      [-33, 33].map((q) => {
        const { x, y } = place(230 + row * 75, q);
        const next = row < 2 ? 75 : Infinity;
        const rx = 0.67 * 9 * 470 * Math.min(60, 480 - x, next);
        const ry = 0.67 * 9 * 470 * Math.min(60, 310 - y, next);
        return 1 / Math.hypot(Math.cos(theta) / rx, Math.sin(theta) / ry);
      }),
    );
    const { GB } = capacities(SANS, { ...rectangular, weld_length: 620 }, DEGREES);
    expect(GB / (6 * Math.min(...strengths))).toBeCloseTo(1, 9);
  });

  it('at 35 degrees by hand for every bolt, EN: edges of the other direction in k1', () => {
    const k1 = (edge: number) => Math.min((2.8 * edge) / 22 - 1.7, (1.4 * 66) / 22 - 1.7, 2.5);
    const unit = (470 * 20 * 9) / 1.25;
    const strengths = [0, 1, 2].flatMap((row) =>
      [-33, 33].map((q) => {
        const { x, y } = place(230 + row * 75, q);
        const inner = row < 2 ? 75 / 66 - 0.25 : Infinity;
        const rx = k1(Math.min(310 - y, 310 + y)) * Math.min((480 - x) / 66, inner, 1) * unit;
        const ry = k1(480 - x) * Math.min((310 - y) / 66, inner, 1) * unit;
        return 1 / Math.hypot(Math.cos(theta) / rx, Math.sin(theta) / ry);
      }),
    );
    // Every bolt bears less than it shears (2 planes x 94080 N): the sum counts.
    expect(Math.max(...strengths)).toBeLessThan(188_160);
    const sum = strengths.reduce((total, strength) => total + strength, 0);
    expect(capacities(EN, rectangular, DEGREES).GB / sum).toBeCloseTo(1, 9);
  });

  it('pushed, the bolts press towards the lower edge and there is no end at the face', () => {
    const strengths = [0, 1, 2].flatMap((row) =>
      [-33, 33].map((q) => {
        const { y } = place(230 + row * 75, q);
        const next = row > 0 ? 75 : Infinity;
        const rx = 0.67 * 9 * 470 * Math.min(60, next);
        const ry = 0.67 * 9 * 470 * Math.min(60, 310 + y, next);
        return 1 / Math.hypot(Math.cos(theta) / rx, Math.sin(theta) / ry);
      }),
    );
    const { GB } = capacities(SANS, rectangular, DEGREES, 'compression');
    expect(GB / (6 * Math.min(...strengths))).toBeCloseTo(1, 9);
  });
});
