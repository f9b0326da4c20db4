import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bases } from '@shared/engine/index.ts';
import { PulledBolts } from '@shared/engine/limit-states/bolts-pulled.ts';
import {
  lengthsAlone,
  lengthsOfGroup,
  StubRows,
  type StubRowsSpec,
} from '@shared/engine/limit-states/t-stub.ts';
import { rootOfFalling } from '@shared/engine/numeric/falling-root.ts';
import type { Basis } from '@shared/engine/standards/basis.ts';
import { createBasis } from '@shared/engine/standards/registry.ts';

const made = (id: string, factors?: object): Basis => createBasis(id as never, factors)!;
const EN = made('en-1993-1-8-2005');
const AISC = made('aisc-360-2022-lrfd');
const CSA = made('csa-s16-2019');
const SANS = made('sans-10162-1-2011');
const M20 = { name: 'M20', d: 20, stressArea: 245 };
const grade88 = { name: '8.8', fyb: 640, fub: 800 };

/** Two angles 90 × 90 × 10 in S275, six rows at 70, ends 40: sizes of a published example of web cleats. */
const cleats: StubRowsSpec = {
  thickness: 10,
  steel: { name: 'S275', fy: 275, fu: 430 },
  byTensile: false,
  bolt: M20,
  holeDiameter: 22,
  perRow: 2,
  rows: 6,
  pitch: 70,
  end: 40,
  boltToWeb: 45,
  m: 31.2,
  edge: 40,
};

describe('effective lengths, EN 1993-1-8 Table 6.4', () => {
  it('of a group are its whole height where the rows stand close', () => {
    // Non-circular: ends 40 + 35 (below 2m + 0.625e + 35 = 122.4) and four inner rows of 70: 430.
    // Circular: ends min(π 31.2 + 70, 150) = 150 and four of 140: 860.
    expect(lengthsOfGroup(31.2, 40, 40, 70, 6)).toEqual({ circular: 860, other: 430 });
  });

  it('of a row alone are those of an inner row, an end row, an only row', () => {
    // 2πm = 196.035; 4m + 1.25e = 174.8; πm + 2·40 = 178.018; 2m + 0.625e + 40 = 127.4; 4·40 = 160; 2·40 = 80.
    expect(lengthsAlone(31.2, 40, 40, 0).circular).toBeCloseTo(196.035, 3);
    expect(lengthsAlone(31.2, 40, 40, 0).other).toBeCloseTo(174.8, 9);
    expect(lengthsAlone(31.2, 40, 40, 1).circular).toBeCloseTo(178.018, 3);
    expect(lengthsAlone(31.2, 40, 40, 1).other).toBeCloseTo(127.4, 9);
    expect(lengthsAlone(31.2, 40, 40, 2)).toEqual({ circular: 160, other: 80 });
  });
});

describe('a T-stub in EN', () => {
  it('in mode 1 is 4 M_pl/m of the group', () => {
    // M_pl,1 = 0.25 · 430 · 10² · 275 = 2.95625e6 Nmm; 4 · 2.95625e6/31.2 = 379 006 N.
    expect(new StubRows(EN, cleats).pull(141_120, null)).toBeCloseTo(379_006, 0);
  });

  it('for tying bends with f_u/1.1', () => {
    // M_pl,1,u = 0.25 · 430 · 10² · 430/1.1 = 4.20227e6 Nmm, printed 4.2 kNm; 4 · 4.20227e6/31.2 = 538 753 N.
    expect(new StubRows(EN, { ...cleats, byTensile: true }).pull(141_120, null)).toBeCloseTo(538_753, 0);
  });

  it('in mode 2 shares between plate and bolts, in mode 3 takes the bolts', () => {
    // One row, t 25: l_eff 80 = 2e_1; n = min(40, 39) = 39; ΣF_t = 2 · 141 120 = 282 240.
    // Mode 1: M = 0.25 · 80 · 625 · 275 = 3.4375e6; 4 M/m = 440 705. Mode 2: (6.875e6 + 39 · 282 240)/70.2 = 254 734.
    const one = new StubRows(EN, { ...cleats, rows: 1, thickness: 25 });
    expect(one.pull(141_120, null)).toBeCloseTo(254_734, 0);
    expect(new StubRows(EN, { ...cleats, rows: 1, thickness: 60 }).pull(141_120, null)).toBe(282_240);
  });

  it('of a single leg is half of the stub', () => {
    const two = new StubRows(EN, cleats).pull(100_000, null);
    expect(new StubRows(EN, { ...cleats, perRow: 1 }).pull(100_000, null)).toBeCloseTo(two / 2, 9);
  });
});

describe('prying in AISC', () => {
  /*
   * AISC Design Examples v16.0, II.D-1 (found in text): WT6x17.5 hanger, flange 0.520 in of A992, gage 3.5 in, web 0.300,
   * flange width 6.56, 3/4 in bolts, p = 4.5 in, 13/16 in holes: b' = 1.23, a' = 1.91, ρ = 0.644, δ = 0.819, and for a pull
   * of 15 kips on one bolt a flange of at least 0.393 in.
   */
  const inch = 25.4;
  const hanger = (thickness: number) =>
    AISC.tStub(
      {
        thickness: thickness * inch,
        steel: { name: 'A992', fy: 50 * 6.894757, fu: 65 * 6.894757 },
        byTensile: true,
        bolt: { name: '3/4 in', d: 0.75 * inch, stressArea: 215.5 },
        bolts: 1,
        holeDiameter: (13 / 16) * inch,
        boltToWeb: (1.75 - 0.15) * inch,
        m: 1,
        edge: ((6.56 - 3.5) / 2) * inch,
        leff1: 1,
        leff2: 1,
        tributary: 4.5 * inch,
      },
      29.8 * 4448.222,
      null,
    ) / 4448.222;

  it('carries the pull of the published example with the published thickness, and not with less', () => {
    // Printed to 0.393 from rounded steps; the exact least thickness is 0.3917 in.
    expect(hanger(0.393)).toBeGreaterThanOrEqual(15);
    expect(hanger(0.391)).toBeLessThan(15);
  });

  it('takes the bolt where the flange is thick, both where it is neither, the flange where it is thin', () => {
    const thick = { ...cleats, rows: 1, thickness: 60, boltToWeb: 40, edge: 35 };
    expect(new StubRows(AISC, thick).pull(100_000, null)).toBe(200_000);
    // t 12: b' = 40 − 10 = 30, a' = 35 + 10 = 45, ρ = 2/3, p = 2 · 40 = 80, δ = 1 − 22/80 = 0.725, f = 0.9 · 275 = 247.5.
    // K = 247.5 · 80 · 144/(4 · 30) = 23 760 N; flange alone 1.725 K = 40 986; both K + (B − K)/(5/3) with B = 30 000: 27 504.
    const thin = { ...thick, thickness: 12 };
    expect(new StubRows(AISC, thin).pull(100_000, null)).toBeCloseTo(2 * 40_986, 6);
    expect(new StubRows(AISC, thin).pull(30_000, null)).toBeCloseTo(2 * 27_504, 6);
  });
});

describe('tension of a bolt', () => {
  const plate = { headDiameter: 30, plateThickness: 10, plateFu: 430 };

  it('alone: EN Table 3.4, AISC J3.7, CSA and SANS 13.12', () => {
    // EN: 0.9 · 800 · 245/1.25 = 141 120; head 0.6 π 30 · 10 · 430/1.25 = 194 527.
    expect(EN.boltTension({ size: M20, grade: grade88, ...plate }, null)).toBeCloseTo(141_120, 6);
    expect(EN.boltTension({ size: M20, grade: grade88, ...plate, plateThickness: 5 }, null)).toBeCloseTo(
      97_264,
      0,
    );
    // AISC: 0.75 · 620 · 314.159 = 146 084; CSA and SANS: 0.75 · 0.80 · 314.159 · 830 = 156 451.
    const group120 = { name: 'A325M', fyb: 660, fub: 830, aisc: { fnt: 620, fnvN: 372, fnvX: 469 } };
    expect(AISC.boltTension({ size: M20, grade: group120, ...plate }, null)).toBeCloseTo(146_084, 0);
    for (const basis of [CSA, SANS]) {
      expect(basis.boltTension({ size: M20, grade: group120, ...plate }, null)).toBeCloseTo(156_451, 0);
    }
  });

  it('beside shear: EN 1.4 (1 − v), AISC 1.3 − v, CSA the circle, SANS the lower of 1.4 − v and the circle', () => {
    const kept = (v: number) => [EN, AISC, CSA, SANS].map((basis) => basis.tensionWithShear(1, v, null));
    expect(kept(0)).toEqual([1, 1, 1, 1]);
    expect(kept(0.6).map((share) => Math.round(share * 1e6) / 1e6)).toEqual([0.56, 0.7, 0.8, 0.8]);
    // At v = 0.95 the circle keeps 0.31225, the line 0.45.
    expect(SANS.tensionWithShear(1, 0.95, null)).toBeCloseTo(0.31225, 5);
    expect(kept(1).map((share) => Math.round(share * 1e6) / 1e6)).toEqual([0, 0.3, 0, 0]);
  });
});

const spec = fc.record({
  thickness: fc.double({ min: 4, max: 40, noNaN: true }),
  rows: fc.integer({ min: 1, max: 10 }),
  pitch: fc.double({ min: 50, max: 150, noNaN: true }),
  end: fc.double({ min: 25, max: 100, noNaN: true }),
  boltToWeb: fc.double({ min: 25, max: 90, noNaN: true }),
  edge: fc.double({ min: 25, max: 90, noNaN: true }),
});
const basis = fc.constantFrom(...bases.map(({ id }) => made(id)));
const force = fc.double({ min: 1e4, max: 4e5, noNaN: true });

describe('for any sizes', () => {
  it('a stub never falls when plate or bolts are stronger, and never exceeds its bolts', () => {
    fc.assert(
      fc.property(spec, basis, force, fc.double({ min: 1, max: 2, noNaN: true }), (sizes, b, T, more) => {
        const whole = { ...cleats, ...sizes, m: 0.8 * sizes.boltToWeb };
        const pull = new StubRows(b, whole).pull(T, null);
        expect(pull).toBeGreaterThan(0);
        expect(pull).toBeLessThanOrEqual(2 * sizes.rows * T * (1 + 1e-12));
        expect(new StubRows(b, whole).pull(T * more, null)).toBeGreaterThanOrEqual(pull * (1 - 1e-12));
        const thicker = new StubRows(b, { ...whole, thickness: sizes.thickness * more });
        expect(thicker.pull(T, null)).toBeGreaterThanOrEqual(pull * (1 - 1e-12));
      }),
      { numRuns: 400 },
    );
  });

  it('shear and pull together: the root holds, lies below shear alone and pull alone, and the sheet has its number', () => {
    fc.assert(
      fc.property(spec, basis, force, fc.double({ min: 0, max: 1, noNaN: true }), (sizes, b, T, turn) => {
        const stub = new StubRows(b, { ...cleats, ...sizes, m: 0.8 * sizes.boltToWeb });
        const bolts = new PulledBolts(b, stub, T, 0.8 * T);
        const [v, t] = [Math.sin(turn) / (2 * sizes.rows), Math.cos(turn)];
        const R = bolts.together(v, t, null);
        expect(R).toBeLessThanOrEqual(bolts.pulled(t, null) * (1 + 1e-12));
        if (v > 0) expect((R * v) / (0.8 * T)).toBeLessThanOrEqual(1 + 1e-12);
        const left = (at: number) =>
          stub.pull(b.tensionWithShear(T, (at * v) / (0.8 * T), null), null) - at * t;
        expect(left(R)).toBeGreaterThanOrEqual(-1e-6 * R * t);
        const isShear = Math.abs((R * v) / (0.8 * T) - 1) < 1e-9;
        if (!isShear) expect(left(R * (1 + 1e-6))).toBeLessThan(0);
      }),
      { numRuns: 400 },
    );
  });
});

it('the falling root is found where the function jumps, is flat, or has not fallen', () => {
  expect(rootOfFalling({ at: (x) => 2 - x }, 5)).toBeCloseTo(2, 11);
  expect(rootOfFalling({ at: (x) => (x < 3 ? 1 : -1) }, 8)).toBeCloseTo(3, 11);
  expect(rootOfFalling({ at: (x) => 1 - (x / 4) ** 9 }, 1e6)).toBeCloseTo(4, 9);
  expect(rootOfFalling({ at: () => 1 }, 7)).toBe(7);
});
