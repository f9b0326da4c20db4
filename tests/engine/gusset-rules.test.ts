import { describe, expect, it } from 'vitest';
import { NOT_COVERED, NOT_PERMITTED, type ParameterValues, toRadians } from '@shared/engine/index.ts';
import { broken, codes, EN, plain, prepare, SANS } from './support/gusset.ts';

type Case = readonly [rule: string, values: ParameterValues, value: number, limit: number];

function expectRule(basis: typeof SANS | typeof EN, [rule, values, value, limit]: Case) {
  const found = broken(basis, { ...plain, ...values }).find((rejection) => rejection.rule === rule);
  expect(found, rule).toBeDefined();
  expect(found?.value).toBeCloseTo(value, 6);
  expect(found?.limit).toBeCloseTo(limit, 6);
  expect(found?.clause).not.toBe('');
  expect(found?.message).toMatch(/\d/);
}

describe('rules of SANS 10162-1 (limits from memory of clause 22.3, Table 6 and welding practice)', () => {
  it.each<Case>([
    ['pitch-least', { pitch: 53 }, 53, 54],
    ['gauge-least', { gauge: 50 }, 50, 54],
    ['gusset-edge', { gusset_edge_distance: 33 }, 33, 34],
    ['gusset-end', { gusset_end_distance: 33 }, 33, 34],
    ['gusset-end-greatest', { gusset_end_distance: 149 }, 149, 144],
    ['member-end-least', { member_end_distance: 33 }, 33, 34],
    ['member-edge-least', { member_backmark: 70 }, 24, 26],
    ['member-end-greatest', { member_end_distance: 150 }, 150, 144],
    ['weld-leg-least', { weld_leg: 5 }, 5, 6],
    ['weld-leg-least', { weld_leg: 7, support_thickness: 25 }, 7, 8],
    ['hole-greatest', { hole_diameter: 24 }, 24, 22],
    ['hole-least', { hole_diameter: 20 }, 20, 20.5],
    ['bolt-count', { rows: 1, lines: 1 }, 1, 2],
  ])('%s', (...row) => {
    expectRule(SANS, row);
  });

  it('1.5 d at the end where there are two bolts or fewer in line: rolled, M24, 36 over 30', () => {
    const two = {
      rows: 2,
      bolt_size: 'M24',
      hole_diameter: 26,
      edge_finish: 'rolled',
      member_end_distance: 35,
    };
    expectRule(SANS, ['member-end-least', two, 35, 36]);
    expect(broken(SANS, { ...plain, ...two, rows: 3 }).map(({ rule }) => rule)).not.toContain(
      'member-end-least',
    );
  });
});

describe('rules of EN 1993-1-8 (Table 3.3, 4.5)', () => {
  it.each<Case>([
    ['pitch-least', { pitch: 48 }, 48, 48.4],
    ['gauge-least', { gauge: 52 }, 52, 52.8],
    ['pitch-greatest', { pitch: 170 }, 170, 168],
    ['gusset-end', { gusset_end_distance: 26 }, 26, 26.4],
    ['gusset-end-greatest', { gusset_end_distance: 90 }, 90, 88],
    ['member-end-least', { member_end_distance: 26 }, 26, 26.4],
    ['weld-throat-least', { weld_leg: 4 }, 4 / Math.SQRT2, 3],
    ['weld-length-least', { weld_length: 50, weld_leg: 14 }, 50, 84 / Math.SQRT2],
    ['hole-greatest', { hole_diameter: 25 }, 25, 24],
  ])('%s', (...row) => {
    expectRule(EN, row);
  });

  it('sheltered steel has no greatest edge distance', () => {
    const long = { ...plain, gusset_end_distance: 90, exposure: 'sheltered' };
    expect(broken(EN, long)).toEqual([]);
  });
});

describe('rules of any basis', () => {
  it('a grade without a strength at its thickness is rejected, not guessed', () => {
    const thick = { ...plain, plate_steel: { fy: 355, fu: 470 }, member_steel: 'S355' };
    expect(broken(EN, thick)).toEqual([]);
    const beyond = {
      ...plain,
      plate_steel: 'S355',
      plate_thickness: 100,
      support_thickness: 200,
      support_steel: 'S460',
    };
    expect(broken(EN, beyond).map(({ rule }) => rule)).toContain('support-steel-thickness');
  });

  it('two angles in star need two lines, each angle one', () => {
    expectRule(SANS, ['star-lines', { brace: 'star', lines: 1 }, 1, 2]);
  });

  it('an arrangement and a section that do not belong together', () => {
    const found = broken(SANS, { ...plain, brace: 'flat' });
    expect(found.map(({ rule }) => rule)).toContain('member-shape');
  });

  it('spanner room, root radius and clearance reject, and can be waived with a note', () => {
    const close = { ...plain, first_row: 65, member_backmark: 40, exposure: 'sheltered' };
    const rules = broken(EN, close).map(({ rule }) => rule);
    expect(rules).toEqual(['member-root-clear']);
    const near = broken(EN, { ...plain, first_row: 61 }).find(({ rule }) => rule === 'member-clearance');
    expect(near).toMatchObject({ value: 9, limit: 10 });
    const tight = broken(EN, { ...plain, first_row: 33 }).find(({ rule }) => rule === 'spanner-room');
    expect(tight).toMatchObject({ value: 33, limit: 34 });
    const waived = {
      ...plain,
      first_row: 65,
      member_end_distance: 60,
      fit_checks: 'waived',
      exposure: 'sheltered',
    };
    expect(broken(EN, waived)).toEqual([]);
    const sheet = prepare(EN, waived).record(0, 'tension');
    expect(sheet.at(-1)?.lines.some(({ meaning }) => meaning.includes('waived'))).toBe(true);
  });

  it('a hole in the weld is rejected even where fit is waived', () => {
    const inWeld = { ...plain, first_row: 19, fit_checks: 'waived' };
    expectRule(EN, ['hole-clear-of-weld', inWeld, 19, 20]);
  });

  it('the rectangular plate loses its edge distance as the brace turns', () => {
    const rectangular = { ...plain, outline: 'rectangular', projection: 480 };
    expect(broken(SANS, rectangular, 0)).toEqual([]);
    const steep = broken(SANS, rectangular, 60);
    expect(steep.map(({ rule }) => rule)).toContain('gusset-edge');
    const out = new Float64Array(codes.length);
    expect(prepare(SANS, rectangular).at(toRadians(60), 'tension', out)).toBe(NOT_PERMITTED);
  });

  it('a tapered plate turned so far that its cut end lies short of the weld is no outline', () => {
    const tall = { ...plain, weld_length: 1400 };
    const found = broken(SANS, tall, 60).find(({ rule }) => rule === 'outline-cut');
    // Cut end at 468; the upper end of the weld projects 700 sin 60 = 606.2 on the brace.
    expect(found?.value).toBeCloseTo(468, 6);
    expect(found?.limit).toBeCloseTo(606.2178, 3);
  });

  it('load angles beyond 80 degrees, and no angle at all, are not covered', () => {
    const detail = prepare(SANS, plain);
    const out = new Float64Array(codes.length);
    for (const degrees of [80.1, -81, 180, NaN, Infinity]) {
      expect(detail.at(toRadians(degrees), 'tension', out)).toBe(NOT_COVERED);
      expect(detail.outcome(toRadians(degrees), 'tension').status).toBe('not-covered');
      expect(detail.record(toRadians(degrees), 'tension').length).toBeGreaterThan(0);
    }
  });
});
