import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bases } from '@shared/engine/index.ts';
import { SheetRecorder } from '@shared/engine/numeric/recorder.ts';
import * as aisc from '@shared/engine/standards/aisc-360-2022/index.ts';
import type { Basis, TStub } from '@shared/engine/standards/basis.ts';
import * as csa from '@shared/engine/standards/csa-s16-2019/index.ts';
import * as en from '@shared/engine/standards/en-1993-1-8-2005/index.ts';
import { netShare, pryingPull, singleCurvature } from '@shared/engine/standards/prying.ts';
import { createBasis } from '@shared/engine/standards/registry.ts';
import * as sans from '@shared/engine/standards/sans-10162-1-2011/index.ts';

const made: readonly Basis[] = bases.map(({ id }) => createBasis(id)!);
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const M20 = { name: 'M20', d: 20, stressArea: 245 };

const stub: TStub = {
  thickness: 10,
  steel: { name: 'S275', fy: 275, fu: 430 },
  byTensile: false,
  bolt: M20,
  bolts: 12,
  holeDiameter: 22,
  boltToWeb: 45,
  m: 31.2,
  edge: 40,
  leff1: 430,
  leff2: 430,
  tributary: 70,
};

describe('tension beside shear', () => {
  it('never grows with the shear, is the whole tension without it, and never falls below 0', () => {
    fc.assert(
      fc.property(fc.constantFrom(...made), between(0, 1.6), between(0, 1.6), (basis, v, more) => {
        const left = basis.tensionWithShear(1e5, v, null);
        expect(left).toBeGreaterThanOrEqual(0);
        expect(left).toBeLessThanOrEqual(1e5);
        expect(basis.tensionWithShear(1e5, v + more, null)).toBeLessThanOrEqual(left);
        expect(basis.tensionWithShear(1e5, 0, null)).toBe(1e5);
      }),
    );
  });

  it('is where the rule of each standard is just met', () => {
    fc.assert(
      fc.property(between(0, 0.999), (v) => {
        const used = [
          en.shearTensionUtilisation({ Fv: v, FvRd: 1, Ft: en.tensionBesideShear(1, v), FtRd: 1 }),
          csa.shearTensionUtilisation({ V: v, Vr: 1, T: csa.tensionBesideShear(1, v), Tr: 1 }),
          sans.shearTensionUtilisation({ V: v, Vr: 1, T: sans.tensionBesideShear(1, v), Tr: 1 }),
        ];
        for (const share of used) expect(share).toBeCloseTo(1, 9);
        // (J3-3a) and (J3-3b) with the required stress: f_rv = v φ F_nv, v F_nv/Ω.
        for (const format of [aisc.lrfd, aisc.asd]) {
          const frv = v * aisc.available(format, 372, aisc.rupture);
          const stress = aisc.tensileStressWithShear(format, { Fnt: 620, Fnv: 372, frv });
          expect(620 * aisc.tensionBesideShear(1, v)).toBeCloseTo(stress, 9);
        }
      }),
    );
  });
});

describe('prying', () => {
  it('is the three cases of the Manual: no prying, both, the flange alone', () => {
    // t_c = √(4 B b'/(f p)), α' = ((t_c/t)² − 1)/(δ (1 + ρ)); Q = 1, (t/t_c)² (1 + δ α'), (t/t_c)² (1 + δ); T = B Q.
    const Q = (t: number, tc: number, rho: number, delta: number) => {
      const alpha = ((tc / t) ** 2 - 1) / (delta * (1 + rho));
      return alpha < 0 ? 1 : (t / tc) ** 2 * (1 + delta * Math.min(1, alpha));
    };
    fc.assert(
      fc.property(
        between(4, 40),
        between(15, 80),
        between(20, 90),
        between(40, 150),
        between(1e4, 4e5),
        (t, b, a, p, B) => {
          const rho = b / a;
          const delta = netShare(22, p);
          const tc = Math.sqrt((4 * B * b) / (247.5 * p));
          const T = pryingPull(B, singleCurvature(247.5, p, t, b), rho, delta);
          expect(T / (B * Q(t, tc, rho, delta))).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it('of an EN stub develops with bolts up to 8.8 m³ A_s n_b/(Σl_eff,1 t³)', () => {
    // 8.8 · 31.2³ · 245 · 6/(430 · 10³) = 8.8 · 30 371.3 · 1470/430 000 = 913.7 mm.
    expect(en.longestPryingBolt(31.2, 245, 6, 430, 10)).toBeCloseTo(913.7, 1);
    // Without prying 2 M_pl/m is half of mode 1.
    const moment = en.plasticMoment(430, 10, 275);
    expect(en.flangeYield(moment, 31.2)).toBeCloseTo((2 * 2 * moment) / 31.2, 9);
  });
});

describe('a sheet', () => {
  it('has the number that a sweep has, for bolt, shear and stub, each line with its clause', () => {
    for (const basis of made) {
      const rec = new SheetRecorder();
      rec.section('x', 'tension');
      const grade = { name: '8.8', fyb: 640, fub: 830 };
      const bolt = { size: M20, grade, headDiameter: 31.5, plateThickness: 10, plateFu: 430 };
      const tension = basis.boltTension(bolt, rec);
      expect(tension).toBe(basis.boltTension(bolt, null));
      const left = basis.tensionWithShear(tension, 0.7, rec);
      expect(left).toBe(basis.tensionWithShear(tension, 0.7, null));
      const pull = basis.tStub(stub, left, rec);
      expect(pull).toBe(basis.tStub(stub, left, null));
      const lines = rec.sections[0]!.lines;
      expect(lines.every(({ clause }) => clause !== '')).toBe(true);
      for (const newtons of [left, pull / (basis.info.id.startsWith('en') ? 1 : stub.bolts)]) {
        expect(lines.some(({ value }) => value === newtons / 1000)).toBe(true);
      }
    }
  });
});
