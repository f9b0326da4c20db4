import { describe, expect, it } from 'vitest';
import { findKind, type ParameterValues, toRadians } from '@shared/engine/index.ts';
import { plain, prepare, welded } from './support/angle-cleats.ts';
import { catalogue } from './support/gusset.ts';

const EN = 'en-1993-1-8-2005';
const CSA = 'csa-s16-2019';
const AISC = 'aisc-360-2022-lrfd';

const rulesOf = (values: ParameterValues, basis: typeof EN | typeof CSA | typeof AISC = EN) =>
  prepare(basis, values).rejections.map(({ rule }) => rule);
const rejection = (values: ParameterValues, rule: string, basis: typeof EN | typeof CSA | typeof AISC = EN) =>
  prepare(basis, values).rejections.find((one) => one.rule === rule);

describe('a sound detail', () => {
  it('breaks no rule, bolted or welded, in any basis', () => {
    for (const basis of [EN, CSA, AISC] as const) {
      expect(rulesOf(plain, basis)).toEqual([]);
      expect(rulesOf(welded, basis)).toEqual([]);
      expect(rulesOf({}, basis)).toEqual([]);
    }
  });
});

describe('each rule says what is measured, the value and the limit', () => {
  it.each<[string, ParameterValues, number, number]>([
    ['bolt-count', { rows: 1, support_rows: 2, cleat_length: 298 }, 1, 2],
    ['hole-least', { hole_diameter: 20 }, 20, 20.5],
    ['hole-greatest', { hole_diameter: 25 }, 25, 24],
    // EN Table 3.3: 2.2 · 22, 14 t with t = 11, 2.4 · 22, 1.2 · 22, 4 t + 40.
    ['pitch-least', { pitch: 48 }, 48, 48.4],
    ['pitch-greatest', { pitch: 155 }, 155, 154],
    ['gauge-least', { columns: 2, gauge: 52 }, 52, 52.8],
    ['cleat-end-least', { cleat_end_distance: 26 }, 26, 26.4],
    ['cleat-end-greatest', { cleat_end_distance: 85 }, 85, 84],
    ['web-leg-edge-least', { web_backmark: 69 }, 26, 26.4],
    ['web-leg-hole', { web_backmark: 21 }, 10, 11],
    ['web-leg-root-clear', { web_backmark: 39 }, 16, 17],
    ['spanner-room', { web_backmark: 35 }, 24, 25],
    ['support-bolt-count', { support_rows: 1 }, 1, 2],
    ['support-hole-least', { support_hole_diameter: 22 }, 22, 22.5],
    ['support-hole-greatest', { support_hole_diameter: 27 }, 27, 26],
    ['support-pitch-least', { support_pitch: 52 }, 52, 52.8],
    ['support-end-least', { support_pitch: 121 }, 28, 28.8],
    ['support-end-greatest', { support_pitch: 60 }, 89, 84],
    ['support-edge-least', { support_backmark: 72 }, 28, 28.8],
    ['support-leg-hole', { support_backmark: 22 }, 11, 12],
    ['support-root-clear', { support_backmark: 41 }, 18, 18.7],
    ['support-spanner-room', { support_backmark: 38 }, 27, 27.5],
    ['cleat-length-least', { beam_section: 'IPE550', beam_top_to_row: 0 }, 298, 330],
  ])('%s', (rule, values, value, limit) => {
    const found = rejection({ ...plain, ...values }, rule);
    expect(found?.value).toBeCloseTo(value, 9);
    expect(found?.limit).toBeCloseTo(limit, 9);
    expect(found?.message).toContain(':');
  });

  it('nuts of both legs at one height meet: 0.85 d beside the one, d and the leg above the other', () => {
    const section = { shape: 'angle', longLeg: 80, shortLeg: 80, thickness: 11, rootRadius: 5 };
    const level = { ...plain, cleat_section: section, support_rows: 4, support_pitch: 72 };
    const near = { ...level, web_backmark: 44, support_backmark: 45 };
    // 44 − 17 − (11 + 22) and 45 − 18.7 − (11 + 20).
    expect(rejection(near, 'nuts-clear')?.value).toBeCloseTo(-4.7, 9);
    expect(rejection({ ...near, fit_checks: 'waived' }, 'nuts-clear')).toBeUndefined();
    // Rows half-way between one another leave 36, more than 0.85 (20 + 22).
    expect(rejection({ ...near, support_rows: 3 }, 'nuts-clear')).toBeUndefined();
  });

  it('cleats thicker than 16 mm, and short ones, unless the rules of practice are waived', () => {
    const values = {
      ...plain,
      cleat_section: { ...plain.cleat_section, thickness: 17 },
      fit_checks: 'waived',
    };
    expect(rejection(values, 'ductile-thickness')).toMatchObject({ value: 17, limit: 16 });
    expect(rulesOf({ ...values, practice_rules: 'waived' })).toEqual([]);
  });

  it('welds: the least leg by the parts, the greatest along the toe, the least throat', () => {
    expect(rejection({ ...welded, weld_leg: 10 }, 'weld-leg-greatest', CSA)).toMatchObject({
      value: 10,
      limit: 9,
    });
    expect(rejection({ ...welded, weld_leg: 10 }, 'weld-leg-greatest', AISC)).toMatchObject({ limit: 9 });
    expect(rulesOf({ ...welded, weld_leg: 10 })).toEqual([]);
    // The support of 13 mm is the thicker part.
    expect(rejection({ ...welded, weld_leg: 5 }, 'weld-leg-least', CSA)).toMatchObject({
      value: 5,
      limit: 6,
    });
    expect(rejection({ ...welded, weld_leg: 4 }, 'weld-throat-least')?.limit).toBe(3);
  });

  it('the beam: its end, its cope, the cleats between the root radii', () => {
    expect(rejection({ ...plain, beam_gap: 26 }, 'web-end-least')).toMatchObject({ value: 26, limit: 26.4 });
    const low = { ...plain, cope_top_length: 0, cope_top_depth: 0, beam_top_to_row: 70 };
    expect(rejection(low, 'part-inside-web')?.value).toBeCloseTo(70 - 13.5 - 21 - 41, 9);
  });

  it('a steel or a grade without a strength there', () => {
    const rule = rejection(
      { ...plain, support_steel: 'S275', support_thickness: 120 },
      'support-steel-thickness',
    );
    expect(rule?.message).toBe('Steel of the support: the grade has no strength at 120 mm');
    const large = { d: 90, stressArea: 5500 };
    const grades = rulesOf({ ...plain, support_bolt_size: large, support_bolt_grade: 'A325M' }, CSA);
    expect(grades).toContain('support-bolt-grade-size');
  });
});

describe('bolts at the support', () => {
  it('of a size or a grade that the basis does not list are faults of their own fields, where they are used', () => {
    const kind = findKind('angle-cleats')!;
    const values = {
      ...plain,
      support_bolt_size: 'M14',
      support_hole_diameter: 0,
      support_bolt_grade: 'A307',
    };
    const prepared = kind.prepare(values, AISC, catalogue);
    expect(prepared).toMatchObject({ ok: false, faults: [{ field: 'support_bolt_size', value: 'M14' }] });
    const inEurope = kind.prepare({ ...values, support_bolt_size: 'M16' }, EN, catalogue);
    expect(inEurope).toMatchObject({ ok: false, faults: [{ field: 'support_bolt_grade', value: 'A307' }] });
    expect(kind.prepare({ ...values, support_connection: 'bolted' }, EN, catalogue).ok).toBe(true);
  });

  it('a parameter that is not one is named with what was meant', () => {
    const prepared = findKind('angle-cleats')!.prepare({ support_back_mark: 50 }, EN, catalogue);
    expect(prepared).toMatchObject({
      ok: false,
      faults: [
        { field: 'support_back_mark', message: expect.stringContaining('support_backmark') as string },
      ],
    });
  });
});

describe('the notes of a sheet', () => {
  it('say first what the family waived or left out', () => {
    const sheet = prepare(EN, { ...plain, fit_checks: 'waived', support_thickness: 0 }).record(
      toRadians(60),
      'tension',
    );
    const notes = sheet.at(-1)!.lines.map(({ meaning }) => meaning);
    expect(notes[0]).toMatch(/waived/);
    expect(notes[1]).toMatch(/thickness of the support is not given/);
  });
});

describe('every line of a sheet', () => {
  it('is a finite number or words, with no strength of bolts that are not there', () => {
    for (const basis of [EN, CSA, AISC] as const) {
      for (const values of [plain, welded, { ...plain, cleats: 1 }, { ...plain, shear_line: 'bolts' }]) {
        for (const angle of [0, 40, 90]) {
          if (prepare(basis, values).outcome(toRadians(angle), 'tension').status !== 'capacity') continue;
          for (const { id, lines } of prepare(basis, values).record(toRadians(angle), 'tension')) {
            for (const { symbol, value } of lines) {
              if (typeof value === 'number') expect(Math.abs(value), `${id} ${symbol}`).toBeLessThan(1e8);
            }
          }
        }
      }
    }
  });
});
