import { describe, expect, it } from 'vitest';
import { capacities, plain, SANS } from './support/gusset.ts';

/**
 * Worked by hand from the formulas of SANS 10162-1:2011 (clauses from memory) for `plain` at 0 degrees, where the
 * brace is square to the face: 2 lines x 3 rows M20, plate 14 mm fy 340 fu 470, two angles 160 x 100 x 12.
 * Every expectation below is literal arithmetic, N and mm.
 */
describe('a gusset plate to SANS 10162-1 by hand, pulled square off the face', () => {
  const r = capacities(SANS, plain, 0);
  const tan30 = 0.577350269;

  it('weld metal: two fillets at right angles to the force, 13.13.2.2(b)', () => {
    expect(r.WM).toBeCloseTo(2 * 410 * 0.67 * 0.67 * 9 * 0.70710678 * 480 * 1.5, -1);
  });

  it('base metal at the weld, 13.13.2.2(a)', () => {
    expect(r.WB).toBeCloseTo(2 * 410 * 0.67 * 0.67 * 9 * 470, 2);
  });

  it('plate section at the weld, pull alone', () => {
    expect(r.PW).toBeCloseTo(0.9 * 340 * 14 * 410, 3);
  });

  it('bolt shear: 6 bolts, 2 planes, threads cut, 13.12.1.1', () => {
    expect(r.BS).toBeCloseTo(6 * 0.6 * 0.8 * 2 * 314.159265 * 800 * 0.7, 0);
  });

  it('bearing on the gusset: the end distance 58 is below 3 d = 60 and the pitch 75, 13.10', () => {
    expect(r.GB).toBeCloseTo(6 * 0.67 * 58 * 14 * 470, 3);
  });

  it('bearing on the brace: the end distance 52, two legs of 12, 13.10', () => {
    expect(r.MB).toBeCloseTo(6 * 0.67 * 52 * 24 * 460, 3);
  });

  it('block shear in the gusset: two planes and the tension between the lines, 13.11', () => {
    // Shear planes 2 x (2 x 75 + 58) = 416; the strips outside and the one-plane blocks are all stronger here:
    // U: 0.9*470*14*(66 - 22) + 0.6*0.9*min(14*416*340, 14*(416 - 2*2.5*22)*470)
    const u = 0.9 * 470 * 14 * 44 + 0.6 * 0.9 * Math.min(14 * 416 * 340, 14 * (416 - 110) * 470);
    // L: 0.9*470*14*(66 + side - 1.5*22) + 0.6*0.9*min(14*208*340, 14*(208 - 55)*470), where the side at the first
    // row, 260 from the face, lies on the line from (0, 205) to (468, 80): 205 - 125*260/468 - 33 = 102.556
    const l =
      0.9 * 470 * 14 * (66 + 102.5556 - 33) + 0.6 * 0.9 * Math.min(14 * 208 * 340, 14 * (208 - 55) * 470);
    expect(r.GX).toBeCloseTo(Math.min(u, l), 0);
  });

  it('block shear in the brace: two planes or one with the toe, twice, 13.11', () => {
    // Planes of 2*75 + 52 = 202; toe at 160 - 55 - 66 = 39 from the outer line.
    const u = 0.9 * 460 * 12 * (66 - 22) + 0.54 * Math.min(12 * 404 * 345, 12 * (404 - 110) * 460);
    const l = 0.9 * 460 * 12 * (66 + 39 - 33) + 0.54 * Math.min(12 * 202 * 345, 12 * (202 - 55) * 460);
    expect(r.MX).toBeCloseTo(2 * Math.min(u, l), 3);
  });

  it('Whitmore section: spread of 2 rows at 30 degrees and the gauge, 13.2', () => {
    // 2*150*tan 30 + 66 = 239.2, inside the outline (2*135.6 wide there).
    const width = 2 * 150 * tan30 + 66;
    const yields = 0.9 * 14 * width * 340;
    const ruptures = 0.85 * 0.9 * 14 * (width - 44) * 470;
    expect(r.WH).toBeCloseTo(Math.min(yields, ruptures), 0);
  });

  it('net section of the brace: 3 rows, one leg, 0.60, 12.3.3.2', () => {
    expect(r.MN).toBeCloseTo(2 * 0.85 * 0.9 * 0.6 * (3010 - 2 * 22 * 12) * 460, 3);
  });

  it('gross section of the brace, 13.2', () => {
    expect(r.MY).toBeCloseTo(2 * 0.9 * 3010 * 345, 3);
  });

  it('buckling in compression: mean length 260, K 1.2, r = 14/√12, n = 1.34, 13.3.1', () => {
    const width = 2 * 150 * tan30 + 66;
    const lambda = ((1.2 * 260 * 3.46410162) / 14 / 3.14159265) * Math.sqrt(340 / 200_000);
    const factor = (1 + lambda ** 2.68) ** (-1 / 1.34);
    const { GC, GX, MN, WH } = capacities(SANS, plain, 0, 'compression');
    expect(GC / (0.9 * 14 * width * 340 * factor)).toBeCloseTo(1, 6);
    expect([GX, MN, WH]).toEqual([Infinity, Infinity, Infinity]);
  });

  it('punched holes lose 2 mm more, 12.3.2', () => {
    const punched = capacities(SANS, { ...plain, hole_making: 'punched' }, 0);
    expect(punched.MN).toBeCloseTo(2 * 0.85 * 0.9 * 0.6 * (3010 - 2 * 24 * 12) * 460, 3);
  });

  it('a long joint: 6 rows of 75 are 375 > 15 x 20, so 1.075 - 0.005 x 375/20, 13.12.1.1', () => {
    const long = capacities(SANS, { ...plain, rows: 6 }, 0);
    expect(long.BS).toBeCloseTo(
      12 * 0.6 * 0.8 * 2 * 314.159265 * 800 * 0.7 * (1.075 - (0.005 * 375) / 20),
      0,
    );
  });

  it('four rows or more: 0.80 of the net section, 12.3.3.2', () => {
    const { MN } = capacities(SANS, { ...plain, rows: 4 }, 0);
    expect(MN).toBeCloseTo(2 * 0.85 * 0.9 * 0.8 * (3010 - 2 * 22 * 12) * 460, 3);
  });

  it('by names: fub of class 8.8 is 830 at M20 (ISO 898-1) and the hole 22', () => {
    const named = capacities(SANS, { ...plain, bolt_size: 'M20', bolt_grade: '8.8', hole_diameter: 0 }, 0);
    expect(named.BS).toBeCloseTo(6 * 0.6 * 0.8 * 2 * 314.159265 * 830 * 0.7, 0);
    expect(named.GX).toBeCloseTo(r.GX, 6);
  });
});
