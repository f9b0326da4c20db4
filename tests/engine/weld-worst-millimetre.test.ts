import { describe, expect, it } from 'vitest';
import { heightOfLeastPull, pullPerMillimetre, shearPerMillimetre } from '@shared/engine/groups/weld-line.ts';
import { capacities, EN, plain, prepare, SANS } from './support/gusset.ts';

const L = 410;

/** Force per millimetre of one fillet at height y for R = 1 N: statics, written out here again. */
function force(degrees: number, e: number, y: number): { fx: number; fy: number } {
  const theta = (degrees * Math.PI) / 180;
  const n = Math.cos(theta);
  return { fx: n / (2 * L) + (n * e * y) / ((2 * L ** 3) / 12), fy: Math.sin(theta) / (2 * L) };
}

/** Lowest capacity over 8201 places on the weld by SANS 10162-1 13.13.2.2(b): 0.67 φw (z/√2) Xu (1 + 0.5 sin^1.5 θw). */
function scanned(degrees: number, e: number): number {
  let least = Infinity;
  for (let step = 0; step <= 8200; step++) {
    const { fx, fy } = force(degrees, e, -L / 2 + (L * step) / 8200);
    const resultant = Math.hypot(fx, fy);
    const sine = Math.abs(fx) / resultant;
    least = Math.min(least, (0.67 * 0.67 * (9 / Math.SQRT2) * 480 * (1 + 0.5 * sine ** 1.5)) / resultant);
  }
  return least;
}

/** A strip that lets every angle through: what the weld carries does not depend on the rest. */
const roomy = { ...plain, first_row: 700, gusset_edge_distance: 60 };

describe('the weld is found on its worst millimetre', () => {
  it.each([
    [0, 40],
    [20, 40],
    [35, -55],
    [55, 68],
    [55, 90],
    [70, 0],
    [70, 120],
    [-62, 85],
  ])('at %i degrees with an offset of %i mm it equals a scan of the weld', (degrees, offset) => {
    const { WM } = capacities(SANS, { ...roomy, work_line_offset: offset }, degrees);
    expect(WM).toBeLessThanOrEqual(scanned(degrees, offset) * (1 + 1e-9));
    expect(WM / scanned(degrees, offset)).toBeCloseTo(1, 4);
  });

  it('is inside the weld, not at its ends, where the pull changes sign', () => {
    // At 80 degrees with e = 120 the pull is zero at y = -L²/(12 e) = -116.7 mm, where the weld has no increase.
    const { WM } = capacities(
      SANS,
      { ...roomy, work_line_offset: 120, first_row: 1500, weld_length: L },
      79.9,
    );
    const atEnds = [-L / 2, L / 2].map((y) => {
      const { fx, fy } = force(79.9, 120, y);
      const resultant = Math.hypot(fx, fy);
      return (
        (0.67 * 0.67 * (9 / Math.SQRT2) * 480 * (1 + 0.5 * (Math.abs(fx) / resultant) ** 1.5)) / resultant
      );
    });
    expect(WM).toBeLessThanOrEqual(scanned(79.9, 120) * (1 + 1e-6));
    expect(WM).toBeLessThanOrEqual(Math.min(...atEnds));
  });

  it('fails if the load angle is used in place of the angle of the resultant', () => {
    const degrees = 55;
    const offset = 68;
    const { WM } = capacities(SANS, { ...roomy, work_line_offset: offset }, degrees);
    const { fx, fy } = force(degrees, offset, L / 2);
    const sineOfLoad = Math.cos((degrees * Math.PI) / 180);
    const byLoadAngle =
      (0.67 * 0.67 * (9 / Math.SQRT2) * 480 * (1 + 0.5 * sineOfLoad ** 1.5)) / Math.hypot(fx, fy);
    expect(Math.abs(byLoadAngle / WM - 1)).toBeGreaterThan(0.02);
  });

  it('follows the directional method at an end, by hand', () => {
    // 30 degrees, e = 40: fx = 0.8660254/820 (1 + 6*40/410) = 1.674339e-3, fy = 0.5/820 = 6.097561e-4 N/mm per N;
    // a = 6.363961: √(2 fx² + 3 fy²)/a = 4.0730e-4; fu/(bw gM2) = 470/1.125 = 417.778
    const { WM } = capacities(EN, { ...roomy, work_line_offset: 40 }, 30);
    const fx = (0.8660254 / 820) * (1 + 240 / 410);
    expect(WM).toBeCloseTo((417.777778 * 6.36396103) / Math.sqrt(2 * fx * fx + 3 * 6.09756098e-4 ** 2), -1);
  });

  it('the second condition of the directional method holds where it is the lower, σ⊥ ≤ 0.9 fu/γM2', () => {
    // With S235 (bw 0.8): √2 fx/a = fu/(0.8 gM2) needs fx = 0.884 a fu/gM2; σ⊥ = fx/(a√2) = 0.9 fu/gM2 needs 1.27 a fu/gM2.
    const soft = { ...roomy, plate_steel: { fy: 235, fu: 360 } };
    expect(capacities(EN, soft, 0).WM).toBeCloseTo((2 * L * (9 / 2) * 360) / (0.8 * 1.25), 2);
  });
});

describe('statics of the weld line', () => {
  it.each([
    [0.8, 0.6, 34],
    [-0.3, 0.95, -20],
  ])('forces per millimetre sum to N = %f, V = %f and M = %f', (n, v, m) => {
    const steps = 4000;
    const width = L / steps;
    let pull = 0;
    let shear = 0;
    let moment = 0;
    for (let step = 0; step < steps; step++) {
      const y = -L / 2 + (step + 0.5) * width;
      pull += 2 * pullPerMillimetre(n, m, L, y) * width;
      shear += 2 * shearPerMillimetre(v, L) * width;
      moment += 2 * pullPerMillimetre(n, m, L, y) * y * width;
    }
    expect(pull).toBeCloseTo(n, 9);
    expect(shear).toBeCloseTo(v, 9);
    expect(moment / m).toBeCloseTo(1, 6);
  });

  it('the least pull is where it changes sign, or at the nearer end', () => {
    expect(heightOfLeastPull(1, 410 / 3, 410)).toBeCloseTo(-102.5, 6);
    expect(heightOfLeastPull(1, 1, 410)).toBe(-205);
    expect(heightOfLeastPull(1, -1, 410)).toBe(205);
  });
});

describe('the plate section at the weld', () => {
  const offset = { ...roomy, work_line_offset: 40 };

  it('elastic, by hand at 30 degrees', () => {
    // N = 0.8660254, V = 0.5, M = 34.641016; A = 14*410 = 5740, Z = 14*410²/6 = 392233.33
    const normal = 0.8660254 / 5740 + 34.641016 / 392233.333;
    const { PW } = capacities(EN, offset, 30);
    expect(PW).toBeCloseTo(340 / Math.sqrt(normal ** 2 + 3 * (0.5 / 5740) ** 2), -1);
  });

  it('plastic: the capacity satisfies M/Mpl + (N/Npl)² + (V/Vpl)⁴ = 1', () => {
    const { PW } = capacities(EN, { ...offset, plate_section: 'plastic' }, 30);
    const moment = (PW * 34.641016) / ((340 * 14 * 410 ** 2) / 4);
    const pull = (PW * 0.8660254) / (340 * 5740);
    const shear = (PW * 0.5) / ((340 * 5740) / Math.sqrt(3));
    expect(moment + pull ** 2 + shear ** 4).toBeCloseTo(1, 7);
    expect(PW).toBeGreaterThan(capacities(EN, offset, 30).PW);
  });

  it('is the same in compression', () => {
    const out = new Float64Array(12);
    const detail = prepare(SANS, offset);
    detail.at(0.4, 'tension', out);
    const pulled = out.slice(0, 4);
    detail.at(0.4, 'compression', out);
    expect(out.slice(0, 4)).toEqual(pulled);
  });
});
