import { describe, expect, it } from 'vitest';
import { findKind, type ParameterValues } from '@shared/engine/index.ts';
import { EN, everyBasis, LRFD, plain, prepare } from './support/fin-plate.ts';
import { catalogue } from './support/gusset.ts';

const broken = (values: ParameterValues, basis: Parameters<typeof prepare>[0] = EN) =>
  prepare(basis, { ...plain, ...values }).rejections;

describe('rules of validity', () => {
  it('the plain detail keeps them all', () => {
    for (const basis of everyBasis) expect(broken({}, basis)).toEqual([]);
  });

  it.each([
    ['bolt-count', { rows: 1, columns: 1, practice_rules: 'waived' }, 1, 2],
    ['hole-least', { hole_diameter: 22.2 }, 22.2, 22.5],
    // Oversize: 22 + 4; with it the least pitch, gauge, end and edge stay below those of the plain detail.
    ['hole-greatest', { hole_diameter: 27 }, 27, 26],
    // EN Table 3.3: 2.2 d_0 and 2.4 d_0; 14 t with the web of 8.5.
    ['pitch-least', { pitch: 52, practice_rules: 'waived' }, 52, 52.8],
    ['pitch-greatest', { pitch: 120, beam_top_to_row: 0, fit_checks: 'waived' }, 120, 119],
    ['gauge-least', { gauge: 57 }, 57, 57.6],
    ['gauge-greatest', { gauge: 120 }, 120, 119],
    // 1.2 d_0, and 4 t + 40 with the thinner part.
    ['plate-end-least', { plate_end_distance: 28, practice_rules: 'waived' }, 28, 28.8],
    ['plate-end-greatest', { plate_end_distance: 75, fit_checks: 'waived' }, 75, 74],
    ['plate-edge-least', { plate_edge_distance: 28 }, 28, 28.8],
    ['plate-edge-greatest', { plate_edge_distance: 75 }, 75, 74],
    ['web-end-least', { beam_gap: 34 }, 28, 28.8],
    ['web-end-greatest', { first_column: 90 }, 77, 74],
    // A throat of 4.1/sqrt(2) = 2.9.
    ['weld-throat-least', { weld_leg: 4.1 }, 4.1 / Math.SQRT2, 3],
    // 22 + 1.25 x 22 = 49.5.
    ['spanner-room', { weld_leg: 22, beam_gap: 22, first_column: 49 }, 49, 49.5],
    ['beam-clear-of-weld', { beam_gap: 8 }, 8, 9],
    ['ductile-thickness', { plate_thickness: 11.2 }, 11.2, 11],
    // 0.6 x 390; 2 x 75 + 2 x 41.
    ['plate-height-least', { plate_end_distance: 41 }, 232, 234],
  ] as const)('%s', (rule, values, value, limit) => {
    const found = broken(values).find((one) => one.rule === rule);
    expect(found?.value).toBeCloseTo(value, 9);
    expect(found?.limit).toBeCloseTo(limit, 9);
    expect(found?.message).toContain(`${Math.round(value * 100) / 100}`);
  });

  it('one millimetre the other way keeps each', () => {
    const kept: readonly (readonly [string, ParameterValues])[] = [
      ['pitch-least', { pitch: 53 }],
      ['gauge-greatest', { gauge: 119 }],
      ['plate-end-least', { plate_end_distance: 29 }],
      ['web-end-greatest', { first_column: 87 }],
      ['beam-clear-of-weld', { beam_gap: 9 }],
      ['ductile-thickness', { plate_thickness: 11 }],
      ['plate-height-least', { plate_end_distance: 42 }],
    ];
    for (const [rule, values] of kept) {
      expect(broken(values).map((one) => one.rule)).not.toContain(rule);
    }
  });

  it('a full-strength weld, EN: both fillets across the plate at least as strong as its yield', () => {
    // EN 4.5.3.2, two fillets pulled across: a = sqrt(2) beta_w gamma_M2 f_y t/(2 f_u) with S275 (275, 430), t 10:
    // sqrt(2) x 0.85 x 1.25 x 275 x 10/(2 x 430) = 4.805, leg 6.795. The published rule is a = 0.48 t.
    const plate = { plate_thickness: 10, plate_steel: { fy: 275, fu: 430 }, weld_size: 'full_strength' };
    const [found] = broken({ ...plate, weld_leg: 6.7 });
    expect(found?.rule).toBe('weld-full-strength');
    expect(found?.limit).toBeCloseTo(6.795, 3);
    expect(broken({ ...plate, weld_leg: 6.8 })).toEqual([]);
    expect(broken({ ...plate, weld_leg: 6.7, weld_size: 'as_designed' })).toEqual([]);
  });

  it('waived rules are said on the sheet', () => {
    const thick = { plate_thickness: 16, practice_rules: 'waived', fit_checks: 'waived', beam_gap: 8 };
    const detail = prepare(EN, { ...plain, ...thick });
    expect(detail.rejections).toEqual([]);
    const notes = detail.record(0, 'tension').find(({ id }) => id === 'notes');
    const text = notes?.lines.map(({ meaning }) => meaning).join(' ') ?? '';
    expect(text).toContain('rules of practice for ductility and torsion were waived');
    expect(text).toContain('Spanner room, root radii and clearances were waived');
  });

  it('a cell of a broken rule is not permitted, with its numbers, and the sheet says so', () => {
    const detail = prepare(LRFD, { ...plain, weld_leg: 3 });
    expect(detail.outcome(1, 'tension')).toMatchObject({
      status: 'not-permitted',
      // Table J2.4: 3/16 in, which is lower than the 5 mm of Table J2.4M.
      rejections: [{ rule: 'weld-leg-least', value: 3, limit: (3 / 16) * 25.4 }],
    });
    const sheet = detail.record(1, 'tension');
    expect(sheet.some(({ id }) => id === 'rules')).toBe(true);
  });
});

describe('faults', () => {
  const kind = findKind('fin-plate');
  const faults = (values: unknown, basis: Parameters<typeof prepare>[0] = EN) => {
    const result = kind?.prepare(values as ParameterValues, basis, catalogue);
    return result === undefined || result.ok ? [] : result.faults;
  };

  it.each([
    ['columns', 3],
    ['rows', 0],
    ['shear_line', 'middle'],
    ['beam_section', 'L100x100x10'],
    ['beam_section', { shape: 'flat', width: 100, thickness: 10 }],
    ['beam_section', { shape: 'i', depth: 300 }],
    ['cope_top_depth', -5],
    ['eccentricity', NaN],
    ['first_column', 'far'],
  ])('%s %j', (field, value) => {
    const found = faults({ ...plain, [field]: value });
    expect(found).toHaveLength(1);
    expect(found[0]?.field).toBe(field);
    expect(found[0]?.message.length).toBeGreaterThan(10);
  });

  it('a beam that is no I section is refused with what is accepted', () => {
    expect(faults({ beam_section: 'L100x100x10' })[0]?.message).toBe(
      'Section of the beam: accepted is an I section (shape "i"); "L100x100x10" is an angle (shape "angle")',
    );
  });

  it('the defaults are a sound detail in every basis', () => {
    for (const basis of everyBasis) {
      expect(prepare(basis, {}).rejections, basis).toEqual([]);
    }
  });
});
