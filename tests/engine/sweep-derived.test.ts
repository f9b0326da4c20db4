import { describe, expect, it } from 'vitest';
import { catalogue, toEngineCatalogue } from '@catalog/index.ts';
import { findKind, kinds, type ParameterValues, toRadians } from '@shared/engine/index.ts';
import {
  expandGrid,
  prepareVariant,
  RULE_CODE,
  ruleLegend,
  type Setting,
  sweepChunk,
  type SweepDefinition,
  variantValues,
} from '@shared/engine/sweep/index.ts';
import { formulaReader } from '@shared/expressions/index.ts';

const kind = findKind('gusset-plate')!;
const engineCatalogue = toEngineCatalogue(catalogue);
const limits = { variants: 1_000_000, cells: 20_000_000, angles: 721 };
const read = formulaReader(engineCatalogue);
const base: SweepDefinition = {
  kind: 'gusset-plate',
  basis: 'en-1993-1-8-2005',
  parameters: {},
  angles: { mode: 'list', values: [0, 45] },
  senses: ['tension'],
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
};
type Rules = NonNullable<SweepDefinition['rules']>;
const define = (parameters: Record<string, Setting>, rules: Rules = []): SweepDefinition => ({
  ...base,
  parameters,
  rules,
});
const list = (...values: (number | string)[]): Setting => ({ mode: 'list', values });
const derived = (expression: string): Setting => ({ mode: 'derived', expression });

function layOut(definition: SweepDefinition) {
  const laidOut = expandGrid(definition, kind, limits, read);
  if (!laidOut.ok) throw new Error(JSON.stringify(laidOut.faults));
  return laidOut.grid;
}
function faultsOf(definition: SweepDefinition) {
  const laidOut = expandGrid(definition, kind, limits, read);
  return laidOut.ok ? [] : laidOut.faults;
}
function variantsOf(definition: SweepDefinition) {
  const grid = layOut(definition);
  return Array.from({ length: grid.variantCount }, (_, ordinal) =>
    prepareVariant(definition, kind, grid.formulas, engineCatalogue, variantValues(grid, ordinal)),
  );
}
function sweep(definition: SweepDefinition) {
  const grid = layOut(definition);
  const chunk = sweepChunk(definition, kind, grid, engineCatalogue, 0, grid.variantCount);
  const legend = ruleLegend(kind, definition.rules);
  const cells = [...chunk.capacities].map((capacity, cell) =>
    Number.isNaN(capacity) ? legend[RULE_CODE - chunk.governing[cell]!]?.id : capacity,
  );
  return { ...chunk, cells, legend };
}

describe('Derived parameters in a sweep', () => {
  it('have the values worked out by hand, each after what it needs', () => {
    // M20: 2 × 20 = 40 and 2.5 × 20 = 50; M24: 48 up to 50 and 60. The pitch comes from the edge distance: + 25.
    const definition = define({
      bolt_size: list('M20', 'M24'),
      pitch: derived('gusset_edge_distance + 25'),
      gusset_edge_distance: derived('2.5 * bolt_d'),
      gusset_end_distance: derived('ceil(2 * bolt_d, 5)'),
    });
    const values = variantsOf(definition).map((variant) => variant.values);
    expect(values).toEqual([
      { bolt_size: 'M20', gusset_edge_distance: 50, gusset_end_distance: 40, pitch: 75 },
      { bolt_size: 'M24', gusset_edge_distance: 60, gusset_end_distance: 50, pitch: 85 },
    ]);
  });

  it('give cell for cell what the same values give when they are fixed', () => {
    const { cells, mass, boltCount } = sweep(
      define({ rows: list(2, 3, 4), weld_length: derived('max(250, (rows - 1) * pitch + 160)') }),
    );
    expect(cells).toHaveLength(6);
    // By hand, at the pitch of 70 by default: 230 → 250, 300, 370.
    [250, 300, 370].forEach((weld_length, index) => {
      const given: ParameterValues = { rows: index + 2, weld_length, pitch: 70 };
      const fixed = Object.entries(given).map(([name, value]) => [name, { mode: 'fixed', value }] as const);
      const alone = sweep(define(Object.fromEntries(fixed)));
      expect(cells.slice(2 * index, 2 * index + 2)).toEqual(alone.cells);
      expect(mass[index]).toBe(alone.mass[0]);
      expect(boltCount[index]).toBe(alone.boltCount[0]);
    });
  });

  it('use the default of a parameter that the definition leaves out', () => {
    const pitch = kind.parameters.find(({ name }) => name === 'pitch')!.default as number;
    const [variant] = variantsOf(define({ gusset_end_distance: derived('pitch - 20') }));
    expect(variant!.values).toEqual({ gusset_end_distance: pitch - 20 });
  });

  it('divide by zero in one variant, which alone is rejected, with the reason', () => {
    const definition = define({ rows: list(2, 3, 4), pitch: derived('140 / (rows - 2)') });
    const { cells } = sweep(definition);
    expect(cells.slice(0, 2)).toEqual(['derived-value', 'derived-value']);
    // 140/1 and 140/2.
    const [none, wide, usual] = variantsOf(definition);
    expect(wide!.values['pitch']).toBe(140);
    expect(usual!.values['pitch']).toBe(70);
    expect(cells[4]).toBeGreaterThan(0);
    if (none!.ok) throw new Error('prepared');
    expect(none!.rejections).toMatchObject([
      {
        rule: 'derived-value',
        message: 'Pitch = 140 / (rows - 2) has no value: division by 0 in 140 / (rows - 2).',
      },
    ]);
  });

  it('come out whole where a number of things is derived, or the variant is rejected', () => {
    const definition = define({ weld_length: list(300, 330, 3000), rows: derived('weld_length / 100') });
    const variants = variantsOf(definition);
    expect(variants[0]!.values['rows']).toBe(3);
    const reasons = variants.map((variant) => (variant.ok ? [] : variant.rejections[0]!.message));
    expect(reasons[1]).toMatch(/= weld_length \/ 100 gives 3\.3; a whole number is accepted/);
    expect(reasons[2]).toMatch(/gives 30; at most \d+ is accepted/);
    expect(sweep(definition).cells.slice(2)).toEqual(Array(4).fill('derived-value'));
  });

  it('read the numbers that a catalogue choice brings, and say where there are none', () => {
    // M20 hole 22 and M24 hole 26 mm (EN 1090-2 Table 11); 1.2 × 22 = 26.4, 1.2 × 26 = 31.2.
    const hole = define({ bolt_size: list('M20', 'M24'), gusset_end_distance: derived('1.2 * hole_d') });
    expect(variantsOf(hole).map(({ values }) => values['gusset_end_distance'])).toEqual([26.4, 31.2]);
    const own = { ...hole.parameters, hole_diameter: { mode: 'fixed', value: 30 } as const };
    expect(variantsOf(define(own))[0]!.values['gusset_end_distance']).toBe(36);
    const flat = define({
      section: { mode: 'fixed', value: { shape: 'flat', width: 100, thickness: 10 } },
      gusset_end_distance: derived('section_long_leg / 2'),
    });
    const [variant] = variantsOf(flat);
    if (variant!.ok) throw new Error('prepared');
    expect(variant!.rejections[0]!.message).toMatch(/long leg: there is none for this choice/);
    // Only what is worked out needs a value.
    const either = derived('if(rows > 1, 40, section_long_leg)');
    expect(variantsOf(define({ ...flat.parameters, gusset_end_distance: either }))[0]!.values).toMatchObject({
      gusset_end_distance: 40,
    });
  });
});

describe('Rules of a family in a sweep', () => {
  const rules: Rules = [
    { expression: 'rows <= 4', message: 'No more than four rows' },
    { expression: 'gusset_end_distance >= 1.5 * hole_d', message: 'End distance below 1.5 holes' },
  ];
  const definition = define(
    { rows: list(2, 6), bolt_size: list('M20', 'M24'), gusset_end_distance: list(36) },
    rules,
  );

  it('reject the variants that break them, each under its own code', () => {
    // Rows change fastest. 1.5 × 22 = 33 ≤ 36 holds for M20; 1.5 × 26 = 39 > 36 does not for M24.
    const { cells, rejected, legend, mass } = sweep(definition);
    const named = cells.map((cell) => (typeof cell === 'number' ? 'capacity' : cell));
    expect(named).toEqual([
      ...['capacity', 'capacity', 'family-rule-1', 'family-rule-1'],
      ...['family-rule-2', 'family-rule-2', 'family-rule-1', 'family-rule-1'],
    ]);
    const count = (rule: string) => rejected[legend.findIndex(({ id }) => id === rule)];
    expect([count('family-rule-1'), count('family-rule-2')]).toEqual([4, 2]);
    // It is a sound piece of steel all the same.
    expect(mass[3]).toBeGreaterThan(0);
  });

  it('say their message and numbers at every angle, all that are broken', () => {
    const last = variantsOf(definition)[3]!;
    if (!last.ok) throw new Error('not prepared');
    const outcome = last.detail.outcome(toRadians(30), 'tension');
    expect(outcome).toMatchObject({
      status: 'not-permitted',
      rejections: [
        {
          rule: 'family-rule-1',
          title: 'No more than four rows',
          message: 'rows <= 4 does not hold: 6 against 4.',
        },
        { rule: 'family-rule-2', value: 36, limit: 39, clause: 'Rule 2 of this family' },
      ],
    });
    expect(last.detail.geometry(0).holes.length).toBeGreaterThan(0);
    expect(last.detail.record(0, 'tension').length).toBeGreaterThan(0);
  });

  it('reject where they have no value', () => {
    const broken = define({ rows: list(2, 3) }, [
      { expression: 'pitch / (rows - 2) > 1', message: 'Never so' },
    ]);
    const [none, one] = variantsOf(broken);
    if (!none!.ok || !one!.ok) throw new Error('not prepared');
    expect(none!.detail.rejections[0]).toMatchObject({
      rule: 'family-rule-1',
      title: 'Never so',
      message: 'pitch / (rows - 2) > 1 has no value: division by 0 in pitch / (rows - 2).',
    });
    expect(one!.detail.rejections).toEqual([]);
  });

  it('see derived values and compare choices with words', () => {
    const chosen = define({ outline: list('tapered', 'rectangular'), pitch: derived('35 * 2') }, [
      { expression: 'outline = "tapered" and pitch = 70', message: 'Tapered only' },
    ]);
    expect(sweep(chosen).cells.slice(2)).toEqual(['family-rule-1', 'family-rule-1']);
  });

  it('leave the codes of all other rules as they are, unique in a byte and clear of the limit states', () => {
    const most = Array.from({ length: 20 }, (_, index) => ({ message: `Rule ${index}` }));
    for (const one of kinds) {
      const [plain, ruled] = [ruleLegend(one), ruleLegend(one, most)];
      expect(ruled.slice(0, plain.length)).toEqual(plain);
      expect(new Set(ruled.map(({ id }) => id)).size).toBe(ruled.length);
      expect(RULE_CODE - ruled.length).toBeGreaterThan(one.limitStates.length);
    }
  });
});

describe('Faults of expressions in a definition', () => {
  it('name the field and the characters', () => {
    const faults = faultsOf(
      define({ pitch: derived('2 * bolt_dd'), plate_steel: derived('1'), rows: derived('rows + 1') }, [
        { expression: 'rows', message: 'No comparison' },
      ]),
    );
    expect(faults).toMatchObject([
      { field: 'parameters.plate_steel' },
      { field: 'parameters.pitch.expression', value: 'bolt_dd', place: { start: 4, end: 11 } },
      { field: 'rules.0.expression', place: { start: 0, end: 4 } },
      { field: 'parameters.rows.expression', message: expect.stringContaining('rows → rows') },
    ]);
    expect(faults[1]!.message).toMatch(/^At character 5, bolt_dd: .*did you mean bolt_d\?/);
  });

  it('name a circle in order, through catalogue numbers too', () => {
    const circle = { plate_thickness: derived('plate_fy / 30'), pitch: derived('5 * plate_thickness') };
    const [fault] = faultsOf(define(circle));
    expect(fault!.message).toContain('plate_thickness → plate_fy → plate_thickness.');
    expect(
      faultsOf(define({ pitch: derived('first_row'), first_row: derived('pitch') }))[0]!.message,
    ).toContain('pitch → first_row → pitch.');
  });

  it('refuse a parameter that has no effect in the detail, with the reason', () => {
    const messages = (definition: SweepDefinition) => faultsOf(definition).map(({ message }) => message);
    const projection = derived('projection / 5');
    expect(messages(define({ gusset_end_distance: projection }))).toEqual([
      'At character 1, projection: Projection from the face has no effect unless Outline is rectangular.',
    ]);
    const outlines = { outline: list('tapered', 'rectangular'), gusset_end_distance: projection };
    expect(messages(define(outlines))).toEqual([]);
    // Hole making counts in SANS and CSA only.
    const rule = { expression: 'hole_making = "drilled"', message: 'Drilled holes only' };
    expect(messages(define({}, [rule]))).toEqual([
      'At character 1, hole_making: Holes has no effect in EN 1993-1-8.',
    ]);
  });

  it('never let a derived parameter fall back on its default', () => {
    expect(() =>
      sweepChunk(
        define({ pitch: derived('70') }),
        kind,
        { ...layOut(base), formulas: null },
        engineCatalogue,
        0,
        1,
      ),
    ).toThrow(/expressions/);
  });
});

describe('Names of catalogue numbers', () => {
  it('stand beside the parameters of each kind and hide none', () => {
    for (const one of kinds) {
      const definition = { ...base, kind: one.id, rules: [{ expression: 'bolt_d > 0', message: 'Always' }] };
      const senses = one.senses.slice(0, 1);
      expect(expandGrid({ ...definition, senses }, one, limits, read)).toMatchObject({ ok: true });
    }
  });

  it.each([
    // ISO 898-1 and EN 1993-1-8 Table 3.1.
    ['bolt_d', 20],
    ['bolt_area', 245],
    ['bolt_fub', 800],
    // EN 10025-2: S355 over 16 up to 40 mm.
    ['plate_fy', 345],
    // EN 10056-1, from memory: L100x100x10 has a root radius of 12 mm.
    ['section_long_leg', 100],
    ['section_thickness', 10],
    ['section_root', 12],
  ])('%s is %d', (name, value) => {
    const parameters: Record<string, Setting> = {
      plate_thickness: { mode: 'fixed', value: 20 },
      section: { mode: 'fixed', value: 'L100x100x10' },
      work_line_offset: derived(name),
    };
    expect(variantsOf(define(parameters))[0]!.values['work_line_offset']).toBe(value);
  });
});
