import { describe, expect, it } from 'vitest';
import { capacities, plain, thick, welded } from './support/angle-cleats.ts';

const LRFD = 'aisc-360-2022-lrfd';
const ASD = 'aisc-360-2022-asd';
const CSA = 'csa-s16-2019';
const SANS = 'sans-10162-1-2011';

/** 298 long, two legs of 11; the outer of four bolts in the web for 1 N at 52: Σr² = 25 920. */
const height = 298;
const both = 22;
const along = 1 / 4;
const across = (52 * 108) / 25_920;
const outer = Math.hypot(along, across);
const [inWeb, atSupport] = [(Math.PI * 20 * 20) / 4, (Math.PI * 22 * 22) / 4];

/** Legs 28 thick, at which the bolts take part: b = 54 − 14, b' = b − 11, a' = 46 + 11, each bolt draws on 2 · 40. */
const heavy = { ...thick, cleat_section: { ...plain.cleat_section, thickness: 28 } };
const rho = 29 / 57;
const perYield = (80 * 28 * 28) / (4 * 29);
/** Pull on one bolt of the heavy legs that may take B. */
const pryingPull = (B: number, K: number) => Math.min(B, (B + rho * K) / (1 + rho), K * (2 - 24 / 80));

describe('AISC 360, design strength', () => {
  const at90 = capacities(LRFD, plain, 90);
  /** 0.75 F_nv A_b with F_nv = 0.45 F_u, threads in the plane. */
  const oneBolt = 0.75 * 0.45 * 800 * atSupport;

  it('bolts in the web in double shear, the outer one of an elastic column', () => {
    expect(at90.BS).toBeCloseTo((0.75 * 0.45 * 800 * inWeb * 2) / outer / 1000, 6);
  });

  it('tear-out on the web legs: 41 − 11 along, 43 − 11 across', () => {
    const per = 0.75 * 1.2 * both * 430;
    expect(at90.CB).toBeCloseTo(1 / Math.hypot(along / (30 * per), across / (32 * per)) / 1000, 6);
  });

  it('cleats in shear; holes lose 2 mm more', () => {
    expect(at90.CV).toBeCloseTo((0.6 * 275 * both * height) / 1000, 6);
    expect(at90.CN).toBeCloseTo((0.75 * 0.6 * 430 * both * (height - 4 * 24)) / 1000, 6);
    const shear = 0.6 * Math.min(430 * 11 * (257 - 3.5 * 24), 275 * 11 * 257);
    expect(at90.CX).toBeCloseTo((2 * 0.75 * (shear + 430 * 11 * (43 - 12))) / 1000, 6);
  });

  it('bolts at the support: no allowance but their own strength, which bearing does not reach', () => {
    expect(at90.SS).toBeCloseTo((6 * oneBolt) / 1000, 6);
    expect(at90.LB).toBeCloseTo((6 * oneBolt) / 1000, 6);
  });

  it('outstanding legs alone: K (1 + δ) with b = 54 − 5.5, over 2 · 88.5 + 80 of leg', () => {
    const perMm = (0.9 * 275 * 121) / (4 * (48.5 - 11));
    // K (1 + δ) = perMm (2 p − 24) for each bolt, linear in p, so rows and group agree.
    expect(capacities(LRFD, plain, 0).CF).toBeCloseTo((2 * perMm * (2 * 257 - 72)) / 1000, 6);
  });

  it('bolts in tension with prying, legs of 28: (B + ρ K)/(1 + ρ)', () => {
    const B = 0.75 * 0.75 * 800 * atSupport;
    const K = 0.9 * 275 * perYield;
    expect((B + rho * K) / (1 + rho)).toBeLessThan(Math.min(B, K * 1.7));
    expect(capacities(LRFD, heavy, 0).ST).toBeCloseTo((6 * pryingPull(B, K)) / 1000, 6);
  });

  it('bolts in shear and tension at 45°: 6 B (1.3 − v) = R cos 45°', () => {
    const B = 0.75 * 0.75 * 800 * atSupport;
    const share = Math.SQRT1_2 / 6;
    const R = (1.3 * B) / (share + (B * share) / oneBolt);
    const left = B * (1.3 - (R * share) / oneBolt);
    expect(pryingPull(left, 0.9 * 275 * perYield)).toBe(left);
    expect(capacities(LRFD, heavy, 45).SC).toBeCloseTo(R / 1000, 5);
  });

  it('toe welds of a pair that bears on the web: 2 (0.75 · 0.60 F_EXX z/√2 L)/√(1 + 12.96 e²/L²)', () => {
    const strength = 2 * 0.75 * 0.6 * 480 * (6 / Math.SQRT2) * height;
    const manual = strength / Math.sqrt(1 + (12.96 * 100 * 100) / (height * height));
    expect(capacities(LRFD, { ...welded, toe_weld: 'bearing' }, 90).WM).toBeCloseTo(manual / 1000, 6);
    const alone = strength / Math.sqrt(1 + (36 * 100 * 100) / (height * height));
    expect(capacities(LRFD, welded, 90).WM).toBeCloseTo(alone / 1000, 6);
  });

  it('allowable strength: 1/2.00 for φ 0.75, 1/1.50 for φ 1.00', () => {
    const allowed = capacities(ASD, plain, 90);
    expect(allowed.SS).toBeCloseTo((6 * oneBolt * (0.5 / 0.75)) / 1000, 6);
    expect(allowed.CX).toBeCloseTo(at90.CX! * (0.5 / 0.75), 6);
    expect(allowed.CV).toBeCloseTo(at90.CV! / 1.5, 6);
  });
});

describe('CSA S16', () => {
  const at90 = capacities(CSA, plain, 90);
  const oneBolt = 0.6 * 0.8 * 800 * 0.7 * atSupport;

  it('bolts and bearing, the same in every direction', () => {
    expect(at90.BS).toBeCloseTo((0.6 * 0.8 * 800 * 0.7 * 2 * inWeb) / outer / 1000, 6);
    expect(at90.CB).toBeCloseTo((3 * 0.8 * both * 20 * 430) / outer / 1000, 6);
    expect(at90.SS).toBeCloseTo((6 * oneBolt) / 1000, 6);
  });

  it('block shear by one leg of an angle: U_t = 0.6', () => {
    const corner = 0.75 * (0.6 * 11 * 32 * 430 + 0.6 * 11 * 257 * ((275 + 430) / 2));
    expect(at90.CX).toBeCloseTo((2 * corner) / 1000, 6);
  });

  it('bolts in shear and tension at 45° on the circle', () => {
    const R = 1000 * capacities(CSA, heavy, 45).SC!;
    const share = (R * Math.SQRT1_2) / 6;
    const left = 0.75 * 0.8 * 800 * atSupport * Math.sqrt(1 - (share / oneBolt) ** 2);
    expect(pryingPull(left, 0.9 * 275 * perYield) / share).toBeCloseTo(1, 8);
  });
});

describe('SANS 10162-1', () => {
  const at90 = capacities(SANS, plain, 90);

  it('bearing: φ_br a t f_u with 41 along and 43 across', () => {
    const per = 0.67 * both * 430;
    expect(at90.CB).toBeCloseTo(1 / Math.hypot(along / (41 * per), across / (43 * per)) / 1000, 6);
  });

  it('block shear as at a coped end: 0.5 on the tension', () => {
    const shear = 0.6 * 0.9 * Math.min(11 * 257 * 275, 11 * 180 * 430);
    expect(at90.CX).toBeCloseTo((2 * (0.5 * 0.9 * 11 * 32 * 430 + shear)) / 1000, 6);
  });

  it('bolts in shear and tension at 45°: the lower of 1.4 − v and the circle', () => {
    const R = 1000 * capacities(SANS, heavy, 45).SC!;
    const share = (R * Math.SQRT1_2) / 6;
    const v = share / (0.6 * 0.8 * 800 * 0.7 * atSupport);
    const left = 0.75 * 0.8 * 800 * atSupport * Math.min(1.4 - v, Math.sqrt(1 - v * v));
    expect(pryingPull(left, 0.9 * 275 * perYield) / share).toBeCloseTo(1, 8);
  });

  it('toe welds: the ends, by the angle of their own resultant, and the base metal', () => {
    const [pull, shear] = [(3 * 100) / height ** 2, 1 / (2 * height)];
    const force = Math.hypot(pull, shear);
    const metal = 0.67 * 0.67 * (6 / Math.SQRT2) * 480 * (1 + 0.5 * (pull / force) ** 1.5);
    const at = capacities(SANS, welded, 90);
    expect(at.WM).toBeCloseTo(metal / force / 1000, 6);
    expect(at.WB).toBeCloseTo((0.67 * 0.67 * 6 * 410) / force / 1000, 6);
  });
});
