import { describe, expect, it } from 'vitest';
import { capacities, plain, single, thick, welded } from './support/angle-cleats.ts';

const EN = 'en-1993-1-8-2005';
const ROOT3 = Math.sqrt(3);

/** 3 · 72 + 2 · 41 = 298 long; two web legs of 11 with a toe of 95 − 52 = 43; outstanding toe 100 − 54 = 46. */
const height = 298;
const both = 22;
/** One M20 8.8 in two planes; one M22 8.8 in one. */
const inWeb = (2 * 0.6 * 800 * 245) / 1.25;
const atSupport = (0.6 * 800 * 303) / 1.25;
/** Outer bolt of the column for 1 N along the face, 52 from it: Σr² = 2 (36² + 108²) = 25 920. */
const along = 1 / 4;
const across = (52 * 108) / 25_920;

describe('EN 1993-1-8, the beam bearing at 90°', () => {
  const at90 = capacities(EN, plain, 90);

  it('bolts in the web: the outer one of an elastic column', () => {
    expect(at90.BS).toBeCloseTo(inWeb / Math.hypot(along, across) / 1000, 6);
    const concentric = capacities(EN, { ...plain, shear_line: 'bolts' }, 90);
    expect(concentric.BS).toBeCloseTo((4 * inWeb) / 1000, 6);
  });

  it('bearing on the web legs: end 41 along, toe 43 across, k_1 = 2.5', () => {
    const unit = (2.5 * 430 * 20 * both) / 1.25;
    const up = (41 / 66) * unit;
    const away = (43 / 66) * unit;
    expect(at90.CB).toBeCloseTo(1 / Math.hypot(along / up, across / away) / 1000, 6);
  });

  it('bearing on the web: 40 to its end, 49 to the cope, up the worse way', () => {
    const unit = (2.5 * 460 * 20 * 8.6) / 1.25;
    const towards = (40 / 66) * unit;
    const up = (49 / 66) * unit;
    const down = (72 / 66 - 0.25) * unit;
    expect(at90.MB).toBeCloseTo(1 / Math.hypot(along / up, across / towards) / 1000, 6);
    const byAngle = capacities(EN, { ...plain, shear_direction: 'by_angle' }, 90);
    // The cleats push the beam's web the other way: down under a resultant that points up.
    expect(byAngle.MB).toBeCloseTo(1 / Math.hypot(along / down, across / towards) / 1000, 6);
  });

  it('cleats in shear: gross over 1.27, net through the four holes in the web legs', () => {
    expect(at90.CV).toBeCloseTo((both * height * 275) / (1.27 * ROOT3) / 1000, 6);
    expect(at90.CN).toBeCloseTo((both * (height - 4 * 22) * 430) / (ROOT3 * 1.25) / 1000, 6);
    const five = capacities(EN, { ...plain, support_rows: 5, support_pitch: 60 }, 90);
    // Five holes of 24 in the outstanding legs take more than four of 22.
    expect(five.CN).toBeCloseTo((both * (height - 5 * 24) * 430) / (ROOT3 * 1.25) / 1000, 6);
    expect(capacities(EN, { ...plain, gross_shear: 'full' }, 90).CV).toBeCloseTo(1.27 * at90.CV!, 6);
  });

  it('block shear of both legs, 0.5 on the tension', () => {
    const block = (half: number, tension: number, shear: number) =>
      (2 * ((half * 11 * tension * 430) / 1.25 + (11 * shear * 275) / ROOT3)) / 1000;
    // Web leg: 43 − 11 and 216 + 41 − 3.5 · 22; outstanding leg: 46 − 12 and 160 + 69 − 2.5 · 24.
    expect(at90.CX).toBeCloseTo(block(0.5, 32, 180), 6);
    expect(at90.CY).toBeCloseTo(block(0.5, 34, 169), 6);
    expect(capacities(EN, { ...plain, block_pull: 'even' }, 90).CX).toBeCloseTo(block(1, 32, 180), 6);
  });

  it('web legs at the heel and at the bolts: V and V · 52', () => {
    const area = both * height;
    const sigma = 52 / ((area * height) / 6);
    expect(at90.CH).toBeCloseTo(275 / Math.sqrt(sigma ** 2 + 3 / area ** 2) / 1000, 6);
    const inertia = height ** 3 / 12 - 4 * (22 ** 3 / 12) - 22 * 25_920;
    const net = both * (height - 88);
    const bent = 52 / ((both * inertia) / 149);
    const ofRupture = (0.9 * 430) / 1.25;
    expect(at90.CC).toBeCloseTo(ofRupture / Math.sqrt(bent ** 2 + 3 / net ** 2) / 1000, 6);
  });

  it('bolts at the support: 0.8 of six in single shear', () => {
    expect(at90.SS).toBeCloseTo((0.8 * 6 * atSupport) / 1000, 6);
    expect(capacities(EN, { ...plain, support_bolts: 'full' }, 90).SS).toBeCloseTo((6 * atSupport) / 1000, 6);
  });

  it('each leg of a pair turned by its own shear where the family counts it', () => {
    // 54 from the bolts to the heel; Σr² of three at 80 = 12 800.
    const outer = Math.hypot(1 / 3, (54 * 80) / 12_800) / 2;
    const counted = capacities(EN, { ...plain, leg_eccentricity: 'always' }, 90);
    expect(counted.SS).toBeCloseTo((0.8 * atSupport) / outer / 1000, 6);
  });

  it('bearing at the support by 3.7: shear of a bolt is below every bearing, so six times the least', () => {
    const inner = (2.5 * (80 / 72 - 0.25) * 22) / 1.25;
    expect(at90.LB).toBeCloseTo((6 * inner * 430 * 11) / 1000, 6);
    expect(at90.SB).toBeCloseTo((6 * inner * 410 * 13) / 1000, 6);
    expect(capacities(EN, { ...plain, support_thickness: 0 }, 90).SB).toBe(Infinity);
  });

  it('web of the beam below its cope: 359 deep', () => {
    expect(at90.MV).toBeCloseTo((8.6 * 359 * 345) / ROOT3 / 1000, 6);
    expect(at90.MN).toBeCloseTo((8.6 * (359 - 88) * 460) / (ROOT3 * 1.25) / 1000, 6);
    const block = (0.5 * 8.6 * (40 - 11) * 460) / 1.25 + (8.6 * (216 + 49 - 77) * 345) / ROOT3;
    expect(at90.MX).toBeCloseTo(block / 1000, 6);
  });

  it('nothing applies that only a pull or only a weld asks for', () => {
    for (const code of ['CT', 'CF', 'ST', 'SC', 'MT', 'WM', 'WB']) expect(at90[code], code).toBe(Infinity);
  });
});

describe('EN 1993-1-8, the beam pulling at 0°', () => {
  const at0 = capacities(EN, plain, 0);

  it('bolts, web legs and blocks towards the toe', () => {
    expect(at0.BS).toBeCloseTo((4 * inWeb) / 1000, 6);
    const rupture = (0.9 * both * 210 * 430) / 1.25;
    expect(at0.CT).toBeCloseTo(Math.min(both * height * 275, rupture) / 1000, 6);
    // One shear plane of 43 − 11, tension to the upper end 216 + 41 − 3.5 · 22, pulled unevenly.
    const block = (0.5 * 11 * 180 * 430) / 1.25 + (11 * 32 * 275) / ROOT3;
    expect(at0.CX).toBeCloseTo((2 * block) / 1000, 6);
  });

  it('outstanding legs, mode 1 of all rows: m = 54 − 11 − 0.8 · 12, Σl_eff = 2 (69 + 40) + 80', () => {
    expect(at0.CF).toBeCloseTo((4 * 0.25 * 298 * 121 * 275) / 33.4 / 1000, 6);
    expect(at0.ST).toBeCloseTo(at0.CF!, 9);
    const tying = capacities(EN, { ...plain, leg_bending: 'tensile' }, 0);
    expect(tying.CF).toBeCloseTo((298 * 121 * (430 / 1.1)) / 33.4 / 1000, 6);
  });

  it('nothing that only a shear loads applies', () => {
    for (const code of ['CV', 'CN', 'CY', 'SS', 'SC', 'LB', 'SB', 'MV'])
      expect(at0[code], code).toBe(Infinity);
  });
});

describe('EN 1993-1-8, legs 18 thick: mode 2 of all rows', () => {
  /** m = 54 − 18 − 9.6; n = 1.25 m, below 46; M_pl of Σl_eff = 298. */
  const [m, n] = [26.4, 33];
  const moment = 0.25 * 298 * 18 * 18 * 275;
  const tension = (0.9 * 800 * 303) / 1.25;

  it('bolts in tension', () => {
    const mode2 = (2 * moment + n * 6 * tension) / (m + n);
    expect(capacities(EN, thick, 0).ST).toBeCloseTo(mode2 / 1000, 6);
  });

  it.each([
    [45, 'the bolts alone'],
    [25, 'mode 2'],
  ])(
    'bolts in shear and tension at %s°: R where bolts of 1.4 F_t (1 − v) carry R cos θ; %s',
    (angle, mode) => {
      const cos = Math.cos((angle * Math.PI) / 180);
      const perR = Math.sin((angle * Math.PI) / 180) / (6 * 0.8 * atSupport);
      const sum = 6 * 1.4 * tension;
      const mode2 = (2 * moment + n * sum) / (cos * (m + n) + n * sum * perR);
      const mode3 = sum / (cos + sum * perR);
      const R = Math.min(mode2, mode3);
      expect(R).toBe(mode === 'mode 2' ? mode2 : mode3);
      // The bolt's tension is below F_t there, and mode 1 is not reached.
      expect(1.4 * (1 - R * perR)).toBeLessThan(1);
      expect(R * cos).toBeLessThan((4 * moment) / m);
      expect(capacities(EN, thick, angle).SC).toBeCloseTo(R / 1000, 5);
    },
  );

  it('legs in bending and shear at 45°: √((V/V_g)² + (N/N_b)²) = 1', () => {
    const bending = (4 * moment) / m;
    const shear = (36 * height * 275) / (1.27 * ROOT3);
    const R = Math.SQRT2 / Math.hypot(1 / bending, 1 / shear);
    expect(capacities(EN, thick, 45).CF).toBeCloseTo(R / 1000, 5);
  });
});

describe('EN 1993-1-8, welded along the toes', () => {
  /** f_u/(β_w γ_M2) of the support, the weaker part; throat 6/√2; two welds of 298. */
  const strength = 410 / (0.85 * 1.25);
  const a = 6 / Math.SQRT2;

  it('shear 100 from the heel to the toe, elastic: 3 V e/L² on each at the ends', () => {
    const f = (3 * 100) / height ** 2;
    const stress = Math.sqrt(2 * f ** 2 + 3 / (2 * height) ** 2) / a;
    const at90 = capacities(EN, welded, 90);
    expect(at90.WM).toBeCloseTo(strength / stress / 1000, 6);
    for (const code of ['SS', 'ST', 'SC', 'LB', 'SB', 'CY']) expect(at90[code], code).toBe(Infinity);
    const held = Math.sqrt(2 * (0.6 * f) ** 2 + 3 / (2 * height) ** 2) / a;
    const bearing = capacities(EN, { ...welded, toe_weld: 'bearing' }, 90);
    expect(bearing.WM).toBeCloseTo(strength / held / 1000, 6);
  });

  it('pull on the welds, and on the legs as strips 100 − 11 from the heel', () => {
    const at0 = capacities(EN, welded, 0);
    expect(at0.WM).toBeCloseTo((strength * a * 2 * height) / Math.SQRT2 / 1000, 6);
    expect(at0.CF).toBeCloseTo((2 * 0.25 * 121 * height * 275) / 89 / 1000, 6);
  });
});

describe('EN 1993-1-8, a single cleat', () => {
  it('bolts in single shear; those at the support turned about the middle of the web', () => {
    const at90 = capacities(EN, single, 90);
    expect(at90.BS).toBeCloseTo(inWeb / 2 / Math.hypot(along, across) / 1000, 6);
    // 54 + 8.6/2 from the bolts; Σr² of three at 80.
    const outer = Math.hypot(1 / 3, (58.3 * 80) / 12_800);
    expect(at90.SS).toBeCloseTo((0.8 * atSupport) / outer / 1000, 6);
  });

  it('bearing of the outstanding leg resolved, across held to 1.5 f_u d t/γ_M2 by 3.6.1(10)', () => {
    const unit = (430 * 22 * 11) / 1.25;
    const up = 2.5 * (80 / 72 - 0.25) * unit;
    const away = Math.min(2.5 * (46 / 72), 1.5) * unit;
    const force = Math.hypot(1 / 3 / up, (58.3 * 80) / 12_800 / away);
    expect(capacities(EN, single, 90).LB).toBeCloseTo(1 / force / 1000, 6);
  });

  it('pull with a heel that turns: the leg yields at its bolts alone, 54 from the web', () => {
    // 2 · 54 at the ends, 2 · 2 · 40 between, less three holes of 24.
    const length = 108 + 160 - 72;
    expect(capacities(EN, single, 0).CF).toBeCloseTo((0.25 * 121 * 275 * length) / 54 / 1000, 6);
    const stiff = {
      ...single,
      cleat_section: { ...plain.cleat_section, thickness: 35 },
      practice_rules: 'waived',
    };
    const bolts = (3 * ((0.9 * 800 * 303) / 1.25) * 46) / (54 + 46);
    expect(capacities(EN, { ...stiff, fit_checks: 'waived' }, 0).ST).toBeCloseTo(bolts / 1000, 6);
  });

  it('pull with a heel that is held: half of the pair', () => {
    const held = capacities(EN, { ...single, heel: 'held' }, 0);
    expect(held.CF).toBeCloseTo(capacities(EN, plain, 0).CF! / 2, 6);
  });
});
