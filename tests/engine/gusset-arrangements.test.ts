import { describe, expect, it } from 'vitest';
import { capacities, EN, plain, prepare, SANS } from './support/gusset.ts';

/** Arrangements of the brace, worked by hand at 0 degrees from the clauses (from memory). N and mm. */
describe('two angles in star', () => {
  const star = { ...plain, brace: 'star', gauge: 112, gusset_edge_distance: 60, member_backmark: 80 };
  const r = capacities(SANS, star, 0);

  it('bolts in single shear, each bearing on one leg', () => {
    expect(r.BS).toBeCloseTo(6 * 0.6 * 0.8 * 314.159265 * 800 * 0.7, 0);
    expect(r.MB).toBeCloseTo(6 * 0.67 * 52 * 12 * 460, 3);
  });

  it('each angle tears on its one line: plane 2 x 75 + 52, toe 160 - 80, twice', () => {
    const block = 0.9 * 460 * 12 * (80 - 11) + 0.54 * Math.min(12 * 202 * 345, 12 * (202 - 55) * 460);
    expect(r.MX).toBeCloseTo(2 * block, 3);
  });

  it('each angle loses one hole', () => {
    expect(r.MN).toBeCloseTo(2 * 0.85 * 0.9 * 0.6 * (3010 - 22 * 12) * 460, 3);
  });
});

describe('a single angle and a flat', () => {
  it('a single angle has half of a pair in everything of the brace, bolts in single shear', () => {
    const pair = capacities(SANS, plain, 0);
    const one = capacities(SANS, { ...plain, brace: 'single' }, 0);
    for (const code of ['BS', 'MB', 'MX', 'MN', 'MY'] as const)
      expect(pair[code] / one[code]).toBeCloseTo(2, 12);
    expect(one.GB).toBe(pair.GB);
  });

  it('a flat: edges (170 - 66)/2 = 52 each side, no shear lag', () => {
    const flat = { ...plain, brace: 'flat', section: { shape: 'flat', width: 170, thickness: 16 } };
    const r = capacities(SANS, flat, 0);
    expect(r.MY).toBeCloseTo(0.9 * 170 * 16 * 345, 3);
    expect(r.MN).toBeCloseTo(0.85 * 0.9 * (170 - 44) * 16 * 460, 3);
    const shear = (planes: number) =>
      0.54 * Math.min(16 * planes * 202 * 345, 16 * planes * (202 - 55) * 460);
    const blocks = [
      0.9 * 460 * 16 * (66 - 22) + shear(2),
      0.9 * 460 * 16 * (66 + 52 - 33) + shear(1),
      0.9 * 460 * 16 * (104 - 22) + shear(2),
    ];
    expect(r.MX).toBeCloseTo(Math.min(...blocks), 3);
  });
});

describe('compression', () => {
  it('no end is ahead of any bolt: the pitch alone, SANS', () => {
    const { GB, MB, MY } = capacities(SANS, { ...plain, pitch: 56 }, 0, 'compression');
    expect(GB).toBeCloseTo(6 * 0.67 * 56 * 14 * 470, 3);
    expect(MB).toBeCloseTo(6 * 0.67 * 56 * 24 * 460, 3);
    expect(MY).toBeCloseTo(2 * 0.9 * 3010 * 345, 3);
  });

  it('EN: the row ahead has α_b = 1, the rows behind 56/66 - 1/4, thin plate, summed', () => {
    const thin = { ...plain, exposure: 'sheltered', pitch: 56, plate_thickness: 7 };
    const { GB } = capacities(EN, thin, 0, 'compression');
    const unit = (2.5 * 470 * 20 * 7) / 1.25;
    expect(GB).toBeCloseTo(2 * unit + 4 * unit * (56 / 66 - 0.25), 1);
  });
});

describe('quantities', () => {
  it('mass of a rectangular plate, bolts and both fillets, by hand', () => {
    const { quantities } = prepare(SANS, { ...plain, outline: 'rectangular', projection: 480 });
    expect(quantities.mass).toBeCloseTo(480 * 410 * 14 * 7.85e-6, 9);
    expect(quantities.boltCount).toBe(6);
    expect(quantities.weldVolume).toBeCloseTo((2 * 410 * 9 * 9) / 2, 9);
  });

  it('a tapered plate is taken at 0 degrees: a trapezium of 410 and 160 over 468', () => {
    const { quantities } = prepare(SANS, plain);
    expect(quantities.mass).toBeCloseTo(((410 + 160) / 2) * 468 * 14 * 7.85e-6, 9);
  });
});
