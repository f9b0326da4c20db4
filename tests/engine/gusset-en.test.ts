import { describe, expect, it } from 'vitest';
import { capacities, EN, plain } from './support/gusset.ts';

/**
 * Worked by hand from the formulas of EN 1993-1-8:2005 and EN 1993-1-1:2005 (clauses from memory) for `plain` at
 * 0 degrees. Every expectation below is literal arithmetic, N and mm; gamma_M0 1.0, gamma_M1 1.0, gamma_M2 1.25.
 */
describe('a gusset plate to EN 1993-1-8 by hand, pulled square off the face', () => {
  const sheltered = { ...plain, exposure: 'sheltered' };
  const r = capacities(EN, sheltered, 0);
  const tan30 = 0.577350269;

  it('weld, directional: √2 f_x/a against fu/(0.9 x 1.25), 4.5.3.2', () => {
    // sigma = tau = fx/(a√2): √(1/2 + 3/2) fx/a = √2 fx/a, a = 9/√2, so R = 2 L fx with fx = a fu/(√2 bw gM2)
    expect(r.WM).toBeCloseTo((2 * 410 * (9 / 2) * 470) / (0.9 * 1.25), 2);
    expect(r.WB).toBe(Infinity);
  });

  it('weld, simplified: fu/(√3 x 0.9 x 1.25) on the throat, 4.5.3.3', () => {
    const { WM } = capacities(EN, { ...sheltered, weld_method: 'simplified' }, 0);
    expect(WM).toBeCloseTo((2 * 410 * 9 * 0.70710678 * 470) / (1.7320508 * 0.9 * 1.25), 0);
  });

  it('weld run-out: two throats off the length, 4.5.1', () => {
    const { WM } = capacities(EN, { ...sheltered, weld_ends: 'deducted' }, 0);
    expect(WM).toBeCloseTo((2 * (410 - 2 * 6.36396103) * 4.5 * 470) / (0.9 * 1.25), 1);
  });

  it('plate section at the weld', () => {
    expect(r.PW).toBeCloseTo(340 * 14 * 410, 3);
  });

  it('bolt shear: 6 bolts, 2 planes, threads, class 8.8, Table 3.4', () => {
    expect(r.BS).toBeCloseTo((6 * 2 * 0.6 * 800 * 245) / 1.25, 3);
  });

  it('bolt shear through the shank', () => {
    const { BS } = capacities(EN, { ...sheltered, threads: 'out_of_plane' }, 0);
    expect(BS).toBeCloseTo((6 * 2 * 0.6 * 800 * 314.159265) / 1.25, 0);
  });

  it('bearing on the gusset: shear of a bolt is above its bearing, so the sum counts, 3.7', () => {
    // k1: p2 66: 1.4*66/22 - 1.7 = 2.5; sides 47 and more from the cut corners: last row 53.9..., 2.8*e2/22 - 1.7 > 2.5
    // end 58/66 = 0.8788; inner 75/66 - 0.25 = 0.8864; fu d t/gM2 = 470*20*14/1.25 = 105280 N
    // F_b = 2.5*0.8788*105280 = 231297 and 233291 N, above F_v = 188160: the number times the least
    expect(r.GB).toBeCloseTo((6 * 2.5 * (58 / 66) * 470 * 20 * 14) / 1.25, 1);
  });

  it('bearing of a thin gusset: sum over the bolts, 3.7', () => {
    // t 8: end 2.5*0.87879*470*20*8/1.25 = 132170 N, inner 133309 N, both below F_v = 188160 N
    const thin = capacities(EN, { ...sheltered, plate_thickness: 8 }, 0);
    const unit = (2.5 * 470 * 20 * 8) / 1.25;
    expect(thin.GB).toBeCloseTo(2 * unit * (58 / 66) + 4 * unit * (75 / 66 - 0.25), 1);
  });

  it('bearing on the brace: end 52/66, toe 39: k1 = min(2.8*39/22 - 1.7, 2.5), Table 3.4', () => {
    // F_b = 2.5*0.7879*460*20*24/1.25 = 347927 N > F_v, so 6 times the least (end bolt)
    expect(r.MB).toBeCloseTo((6 * 2.5 * (52 / 66) * 460 * 20 * 24) / 1.25, 1);
  });

  it('block tearing in the gusset: the lowest of four patterns, 3.10.2', () => {
    const u = (470 * 14 * 44) / 1.25 + (340 * 14 * (416 - 110)) / 1.7320508;
    const l = (0.5 * 470 * 14 * (66 + 102.5556 - 33)) / 1.25 + (340 * 14 * (208 - 55)) / 1.7320508;
    expect(r.GX).toBeCloseTo(Math.min(u, l), -1);
  });

  it('block tearing in the brace: angles by one leg are eccentric, 3.10.2(3)', () => {
    const u = (0.5 * 460 * 12 * 44) / 1.25 + (345 * 12 * (404 - 110)) / 1.7320508;
    const l = (0.5 * 460 * 12 * (66 + 39 - 33)) / 1.25 + (345 * 12 * (202 - 55)) / 1.7320508;
    expect(r.MX).toBeCloseTo(2 * Math.min(u, l), -1);
  });

  it('Whitmore section: yield, and rupture less two holes, 6.2.3', () => {
    const width = 2 * 150 * tan30 + 66;
    expect(r.WH).toBeCloseTo(Math.min(14 * width * 340, (0.9 * 14 * (width - 44) * 470) / 1.25), 0);
  });

  it('net section of the brace: beta_3 at p1 = 75 between 55 and 110, 3.10.3', () => {
    const beta3 = 0.5 + ((75 / 22 - 2.5) / 2.5) * 0.2;
    expect(r.MN).toBeCloseTo((2 * beta3 * (3010 - 2 * 22 * 12) * 460) / 1.25, 2);
  });

  it('net section by the short leg: an equal angle of that leg, 3.10.3(3)', () => {
    const short = { ...sheltered, lines: 1, connected_leg: 'short', member_backmark: 52 };
    const beta3 = 0.5 + ((75 / 22 - 2.5) / 2.5) * 0.2;
    expect(capacities(EN, short, 0).MN).toBeCloseTo(
      (2 * beta3 * ((200 - 12) * 12 - 22 * 12) * 460) / 1.25,
      2,
    );
  });

  it('net section with one row: 2.0 (e2 - 0.5 d0) t fu/gM2, equation (3.11)', () => {
    expect(capacities(EN, { ...sheltered, rows: 1 }, 0).MN).toBeCloseTo(
      (2 * 2 * (39 - 11) * 12 * 460) / 1.25,
      3,
    );
  });

  it('gross section of the brace, 6.2.3', () => {
    expect(r.MY).toBeCloseTo(2 * 3010 * 345, 3);
  });

  it('buckling in compression: curve c, 6.3.1', () => {
    const width = 2 * 150 * tan30 + 66;
    const bar = (1.2 * 260 * 3.46410162) / 14 / (3.14159265 * Math.sqrt(210_000 / 340));
    const Phi = 0.5 * (1 + 0.49 * (bar - 0.2) + bar * bar);
    const chi = 1 / (Phi + Math.sqrt(Phi * Phi - bar * bar));
    const { GC } = capacities(EN, sheltered, 0, 'compression');
    expect(GC / (chi * 14 * width * 340)).toBeCloseTo(1, 6);
  });

  it('a flat in single shear with one row: the lap limit 1.5 fu d t/gM2, 3.6.1(10)', () => {
    const flat = {
      ...sheltered,
      brace: 'flat',
      rows: 1,
      section: { shape: 'flat', width: 160, thickness: 12 },
    };
    const { MB, MN, BS } = capacities(EN, flat, 0);
    // One row: end 52/66 = 0.7879, k1 2.5: 1.97 exceeds 1.5
    expect(MB).toBeCloseTo((2 * 1.5 * 460 * 20 * 12) / 1.25, 3);
    expect(MN).toBeCloseTo((0.9 * (160 - 44) * 12 * 460) / 1.25, 3);
    expect(BS).toBeCloseTo((2 * 0.6 * 800 * 245) / 1.25, 3);
  });

  it('M12 in 14 mm holes takes 0.85 on shear, 3.6.1(5), and none in 13 mm holes', () => {
    const small = { ...sheltered, bolt_size: { d: 12, stressArea: 84.3 } };
    const wide = capacities(EN, { ...small, hole_diameter: 14 }, 0);
    const normal = capacities(EN, { ...small, hole_diameter: 13 }, 0);
    expect(wide.BS).toBeCloseTo((0.85 * 6 * 2 * 0.6 * 800 * 84.3) / 1.25, 3);
    expect(normal.BS).toBeCloseTo((6 * 2 * 0.6 * 800 * 84.3) / 1.25, 3);
  });
});
