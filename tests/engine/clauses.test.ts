import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { rootOfInteraction } from '@shared/engine/numeric/roots.ts';
import {
  bases,
  findBasis,
  findKind,
  kilonewtons,
  kinds,
  toDegrees,
  toRadians,
} from '@shared/engine/index.ts';
import * as en from '@shared/engine/standards/en-1993-1-8-2005/index.ts';
import * as sans from '@shared/engine/standards/sans-10162-1-2011/index.ts';

const standards = new URL('../../shared/engine/standards/', import.meta.url);

describe('clauses', () => {
  it('every exported clause function cites its clause or table', () => {
    const uncited: string[] = [];
    for (const folder of ['en-1993-1-8-2005', 'sans-10162-1-2011', 'csa-s16-2019', 'aisc-360-2022']) {
      for (const file of readdirSync(new URL(folder, standards))) {
        const text = readFileSync(new URL(`${folder}/${file}`, standards), 'utf8');
        for (const match of text.matchAll(/(\/\*\*(?:(?!\*\/)[\s\S])*\*\/\s*)?export function (\w+)/g)) {
          if (
            !/(EN 199|EN 1090|SANS 10162|CSA S16:19|CSA W59|ANSI\/AISC 360-22|welding practice|5 to 12 mm)/.test(
              match[1] ?? '',
            )
          )
            uncited.push(`${file}: ${match[2]}`);
        }
      }
    }
    expect(uncited).toEqual([]);
  });

  it('long joints: EN falls by 1/200 per diameter beyond 15 d, down to 0.75 at 65 d', () => {
    expect(en.longJointFactor(300, 20)).toBe(1);
    expect(en.longJointFactor(500, 20)).toBeCloseTo(0.95, 12);
    expect(en.longJointFactor(5000, 20)).toBe(0.75);
    expect(sans.longJointFactor(300, 20)).toBe(1);
    expect(sans.longJointFactor(500, 20)).toBeCloseTo(0.95, 12);
    expect(sans.longJointFactor(5000, 20)).toBe(0.75);
  });

  it('shear coefficient by property class, EN Table 3.4', () => {
    const rows = [
      [240, 400, 0.6],
      [320, 400, 0.5],
      [300, 500, 0.6],
      [400, 500, 0.5],
      [480, 600, 0.5],
      [640, 800, 0.6],
      [900, 1000, 0.5],
    ] as const;
    for (const [fyb, fub, alphaV] of rows) {
      expect(en.shearCoefficient(fyb, fub, true)).toBe(alphaV);
      expect(en.shearCoefficient(fyb, fub, false)).toBe(0.6);
    }
  });

  it('correlation factor by grade, EN Table 4.1, for each printing of fu', () => {
    const rows = [
      [235, 360, 0.8],
      [275, 410, 0.85],
      [265, 430, 0.85],
      [355, 470, 0.9],
      [345, 490, 0.9],
      [355, 510, 0.9],
      [420, 520, 1],
      [460, 550, 1],
    ] as const;
    for (const [fy, fu, betaW] of rows) expect(en.correlationFactor(fy, fu)).toBe(betaW);
  });

  it('curve c, EN 1993-1-1 6.3.1.2: chi 0.540 at a slenderness of 1.0 and 1 up to 0.2 (published table, from memory)', () => {
    expect(en.columnCurveC(0.2)).toBe(1);
    expect(en.columnCurveC(1)).toBeCloseTo(0.5399, 4);
    expect(en.columnCurveC(2)).toBeCloseTo(0.1962, 3);
  });

  it('shear with tension takes the worst of line and circle in SANS, and 1.4 on the tension in EN', () => {
    expect(sans.shearTensionUtilisation({ V: 70, Vr: 100, T: 70, Tr: 100 })).toBeCloseTo(1, 12);
    expect(sans.shearTensionUtilisation({ V: 100, Vr: 100, T: 0, Tr: 100 })).toBe(1);
    expect(sans.shearTensionUtilisation({ V: 90, Vr: 100, T: 45, Tr: 100 })).toBeCloseTo(
      Math.hypot(0.9, 0.45),
      12,
    );
    expect(en.shearTensionUtilisation({ Fv: 50, FvRd: 100, Ft: 70, FtRd: 100 })).toBeCloseTo(1, 12);
  });

  it('the root of the plastic interaction satisfies it', () => {
    const r = rootOfInteraction(3e-6, 2e-12, 5e-24);
    expect(3e-6 * r + 2e-12 * r ** 2 + 5e-24 * r ** 4).toBeCloseTo(1, 10);
    expect(rootOfInteraction(0, 0, 0)).toBe(Infinity);
    expect(rootOfInteraction(0, 4e-12, 0)).toBeCloseTo(5e5, 4);
  });
});

describe('the public door', () => {
  it('finds kinds and bases by name, and nothing by another', () => {
    expect(kinds.map(({ id }) => id)).toEqual(['gusset-plate', 'fin-plate', 'end-plate', 'angle-cleats']);
    expect(bases.map(({ id, resultLabel }) => [id, resultLabel])).toEqual([
      ['sans-10162-1-2011', 'factored resistance'],
      ['csa-s16-2019', 'factored resistance'],
      ['en-1993-1-8-2005', 'design resistance'],
      ['aisc-360-2022-lrfd', 'design strength'],
      ['aisc-360-2022-asd', 'allowable strength'],
    ]);
    for (const { title, short, notes } of bases) {
      expect(title.length > short.length && short.length > 5 && notes.length > 5).toBe(true);
    }
    expect(findKind('constructor')).toBeUndefined();
    expect(findBasis('constructor')).toBeUndefined();
    expect(findBasis('en-1993-1-8-2005')?.notes.length).toBeGreaterThan(5);
  });

  it('every parameter has help, a label and a default inside its limits', () => {
    for (const { name, help, label, minimum, maximum, default: value } of kinds[0]?.parameters ?? []) {
      expect(help.length, name).toBeGreaterThan(10);
      expect(label.length, name).toBeGreaterThan(3);
      if (typeof value === 'number') {
        expect(value, name).toBeGreaterThanOrEqual(minimum ?? NaN);
        expect(value, name).toBeLessThanOrEqual(maximum ?? NaN);
      }
    }
  });

  it('converts at the edge', () => {
    expect(toRadians(180)).toBe(Math.PI);
    expect(toDegrees(Math.PI / 2)).toBe(90);
    expect(kilonewtons(1500)).toBe(1.5);
  });
});
