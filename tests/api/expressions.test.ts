import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Fault } from '@shared/contracts/common.ts';
import type { Definition } from '@shared/contracts/definition.ts';
import type { LookupAnswer, LookupDetails } from '@shared/contracts/lookup.ts';
import type { ResultAxes, Sheet } from '@shared/contracts/revisions.ts';
import { checkDefinition } from '@server/features/families/definition-service.ts';
import { createHarness, type Agent, type Harness } from './harness.ts';
import { smallDefinition } from './support/definition.ts';
import { makeSwept, type Made } from './support/swept-revision.ts';

let harness: Harness;
let manager: Agent;
let engineer: Agent;
let made: Made;

/** Two sizes of bolt and three numbers of rows; the pitch has no value with two rows. */
const definition: Definition = {
  ...smallDefinition,
  parameters: {
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
    rows: { mode: 'list', values: [2, 3, 4] },
    pitch: { mode: 'derived', expression: '150 / (rows - 2)' },
    gusset_end_distance: { mode: 'derived', expression: 'ceil(2 * bolt_d, 5)' },
    weld_length: { mode: 'fixed', value: 600 },
  },
  rules: [
    { expression: 'pitch <= 6 * bolt_d', message: 'Pitch above six bolt diameters' },
    { expression: 'rows < 4 or bolt_size = "M20"', message: 'Four rows for M20 only' },
  ],
};

beforeAll(async () => {
  harness = await createHarness();
  manager = await harness.signedIn('standards-manager');
  engineer = await harness.signedIn('engineer');
  made = await makeSwept(harness, { code: 'GP-01', definition });
});
afterAll(() => harness.close());

const create = (given: object, code = 'GP-50') =>
  manager.post('/api/families').send({ code, title: 'With expressions', definition: given });
const faultsOf = async (changes: object): Promise<Fault[]> => {
  const { body } = await create({ ...smallDefinition, ...changes }).expect(422);
  return (body as { errors: Fault[] }).errors;
};

describe('saving a definition', () => {
  test('names the field and the characters of every faulty expression', async () => {
    const faults = await faultsOf({
      parameters: { pitch: { mode: 'derived', expression: '2 * (bolt_dd + 1)' } },
      rules: [{ expression: 'rows + ', message: 'Not a rule' }],
    });
    expect(faults).toMatchObject([
      {
        field: 'definition.parameters.pitch.expression',
        value: 'bolt_dd',
        place: { start: 5, end: 12 },
        message: expect.stringContaining('did you mean bolt_d?') as string,
      },
      { field: 'definition.rules.0.expression', place: { start: 7, end: 7 } },
    ]);
  });

  test('names a circle in order', async () => {
    const [fault] = await faultsOf({
      parameters: {
        pitch: { mode: 'derived', expression: 'first_row + 10' },
        first_row: { mode: 'derived', expression: 'weld_length / 4' },
        weld_length: { mode: 'derived', expression: '5 * pitch' },
      },
    });
    expect(fault!.field).toMatch(/^definition\.parameters\.(pitch|first_row|weld_length)\.expression$/);
    expect(fault!.message).toMatch(/circle: \w+ → \w+ → \w+ → \w+\./);
  });

  test('refuses an expression for what is chosen from a list, and one that is too long', async () => {
    const chosen = { plate_steel: { mode: 'derived', expression: '355' } };
    const [fault] = await faultsOf({ parameters: chosen });
    expect(fault).toMatchObject({ field: 'definition.parameters.plate_steel', value: 'derived' });
    const long = { pitch: { mode: 'derived', expression: '1+'.repeat(300_000) } };
    const started = Date.now();
    const [first] = await faultsOf({ parameters: long });
    expect(Date.now() - started).toBeLessThan(1000);
    expect(first!.field).toBe('definition.parameters.pitch.expression');
  });

  test('keeps the hash of a definition without expressions', () => {
    // SHA-256 over the canonical JSON of the small definition, worked out by another program.
    const hash = '6ea10f4220aac01b01df7890ae33cc3b94b03386a29007cb9ac0ef1e80cb9d54';
    expect(checkDefinition(smallDefinition).hash).toBe(hash);
    expect(checkDefinition({ ...smallDefinition, rules: [] }).hash).toBe(hash);
    const ruled = { ...smallDefinition, rules: [{ expression: 'rows > 1', message: 'Two rows' }] };
    expect(checkDefinition(ruled).hash).not.toBe(hash);
  });

  test('keeps derived parameters and rules as they were given', async () => {
    const { body } = await create(definition, 'GP-51').expect(201);
    const { working } = body as { working: { id: number } };
    const revision = await manager.get(`/api/revisions/${working.id}`).expect(200);
    expect(revision.body).toMatchObject({ definition });
  });
});

describe('a family with expressions', () => {
  const look = async (bolt_size: string, rows: number): Promise<LookupAnswer> => {
    const question = { revisionId: made.row.id, choices: { bolt_size, rows }, angle: 10, sense: 'tension' };
    return (await engineer.post('/api/lookup').send(question).expect(200)).body as LookupAnswer;
  };

  test('asks only for what is swept, and says how the rest follows', async () => {
    const { body } = await engineer.get('/api/lookup/details').expect(200);
    const [detail] = (body as LookupDetails).details;
    expect(detail!.choices.map(({ name }) => name).sort()).toEqual(['bolt_size', 'rows']);
    expect(detail!.derived.map(({ name, expression }) => [name, expression])).toEqual(
      expect.arrayContaining([
        ['gusset_end_distance', 'ceil(2 * bolt_d, 5)'],
        ['pitch', '150 / (rows - 2)'],
      ]),
    );
    expect(detail!.fixed.some(({ name }) => name === 'pitch')).toBe(false);
  });

  test('gives between the angles of the grid what the same fixed values give', async () => {
    // Four rows of M20: pitch 150 / 2 = 75, end distance 2 × 20 = 40.
    const parameters: Definition['parameters'] = {
      ...definition.parameters,
      rows: { mode: 'fixed', value: 4 },
      bolt_size: { mode: 'list', values: ['M20'] },
      pitch: { mode: 'fixed', value: 75 },
      gusset_end_distance: { mode: 'fixed', value: 40 },
    };
    const { rules: _none, ...plain } = { ...definition, parameters };
    const fixed = await makeSwept(harness, { code: 'GP-02', definition: plain });
    const question = { revisionId: fixed.row.id, choices: { bolt_size: 'M20' }, angle: 10, sense: 'tension' };
    const { body } = await engineer.post('/api/lookup').send(question).expect(200);
    const derived = await look('M20', 4);
    expect(derived.outcome.status).toBe('capacity');
    expect(derived.outcome).toEqual((body as LookupAnswer).outcome);
  });

  test('rejects the one variant that divides by zero, with the reason', async () => {
    const { outcome } = await look('M20', 2);
    expect(outcome).toMatchObject({
      status: 'not-permitted',
      rejections: [{ rule: 'derived-value', message: expect.stringContaining('division by 0') as string }],
    });
  });

  test('rejects a variant with the message and numbers of the rule', async () => {
    // 150 / 1 = 150 above 6 × 20 = 120; 6 × 24 = 144.
    expect((await look('M20', 3)).outcome).toMatchObject({
      status: 'not-permitted',
      rejections: [
        { rule: 'family-rule-1', title: 'Pitch above six bolt diameters', value: 150, limit: 120 },
      ],
    });
    expect((await look('M24', 4)).outcome).toMatchObject({
      rejections: [{ rule: 'family-rule-2', title: 'Four rows for M20 only' }],
    });
  });

  test('counts the rejected cells in the legend, each rule under its own number', async () => {
    const { body } = await engineer.get(`/api/revisions/${made.row.id}/axes`).expect(200);
    const { rules } = body as ResultAxes;
    const cells = 2 * 9;
    const counted = rules.filter(({ rule }) => /^(derived|family)/.test(rule));
    expect(counted.map(({ rule, title, clause, cells: some }) => [rule, title, clause, some])).toEqual([
      ['derived-value', 'Derived parameter without a usable value', 'Definition of this family', 2 * cells],
      ['family-rule-1', 'Pitch above six bolt diameters', 'Rule 1 of this family', 2 * cells],
      ['family-rule-2', 'Four rows for M20 only', 'Rule 2 of this family', cells],
    ]);
  });

  test('shows derived values with their expressions on the sheet', async () => {
    const { ordinal } = await look('M20', 4);
    const sheetOf = async (variant: number) =>
      (
        await engineer
          .get(`/api/revisions/${made.row.id}/variants/${variant}/sheet?sense=tension&angle=0`)
          .expect(200)
      ).body as Sheet;
    const named = (sheet: Sheet, name: string) => sheet.parameters.find((one) => one.name === name);
    const sheet = await sheetOf(ordinal);
    expect(named(sheet, 'pitch')).toMatchObject({ value: 75, expression: '150 / (rows - 2)' });
    expect(named(sheet, 'rows')).toMatchObject({ value: 4, expression: null });
    const without = await sheetOf((await look('M20', 2)).ordinal);
    expect(named(without, 'pitch')).toMatchObject({ value: 'no usable value', unit: '' });
  });
});
