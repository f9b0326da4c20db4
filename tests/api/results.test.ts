import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Curve, ResultAxes, ResultBlock, Sheet } from '@shared/contracts/revisions.ts';
import { CAUTIONS } from '@shared/wording/cautions.ts';
import { createHarness, type Agent, type Harness } from './harness.ts';
import { makeSwept, type Made } from './support/swept-revision.ts';

let harness: Harness;
let engineer: Agent;
let made: Made;
let old: Made;

beforeAll(async () => {
  harness = await createHarness();
  engineer = await harness.signedIn('engineer');
  made = await makeSwept(harness, { code: 'GP-01' });
  old = await makeSwept(harness, { code: 'GP-02', engineVersion: '0.9.0' });
});
afterAll(() => harness.close());

const get = async <T>(path: string, of = made) => {
  const answer = await engineer.get(`/api/revisions/${of.row.id}/${path}`);
  expect(answer.status, JSON.stringify(answer.body)).toBe(200);
  return answer.body as T;
};

describe('axes', () => {
  test('name what is swept, in the order of the grid, with the whole legend', async () => {
    const axes = await get<ResultAxes>('axes');
    expect(axes.axes.map(({ name, unit, values }) => [name, unit, values])).toEqual([
      ['plate_thickness', 'mm', [10, 12]],
      ['bolt_size', '', ['M20', 'M24']],
    ]);
    expect(axes.angles).toEqual([-80, -60, -40, -20, 0, 20, 40, 60, 80]);
    expect(axes.senses).toEqual(['tension', 'compression']);
    expect(axes.variants).toBe(4);
    expect(axes.limitStates[3]).toMatchObject({ code: 'BS', title: 'Bolt shear' });
    // Shear of bolts is clause 13.12.1.2 of SANS 10162-1:2011 (from memory).
    expect(axes.limitStates[3]!.clause).toContain('13.12.1');
    const kind = made.laidOut.kind;
    expect(axes.rules.slice(0, kind.rules.length).map(({ rule }) => rule)).toEqual(
      kind.rules.map(({ id }) => id),
    );
    expect(axes.rules.reduce((sum, { cells }) => sum + cells, 0)).toBe(axes.rejectedCells);
    expect(axes.rejectedCells).toBeGreaterThan(0);
    for (const { rule, cells, clause } of axes.rules) if (cells > 0) expect(clause, rule).not.toBe('');
  });

  test('a draft has none, and what a person may not see is not there', async () => {
    const { Revision } = harness.db.models;
    const draft = await Revision.create({
      familyId: made.familyId,
      sequence: 2,
      definition: made.row.definition,
      definitionHash: made.row.definitionHash,
      authorId: made.row.authorId,
    });
    const manager = await harness.signedIn('standards-manager');
    const { body } = await manager.get(`/api/revisions/${draft.id}/axes`).expect(409);
    expect(body).toMatchObject({
      code: 'state-conflict',
      detail: expect.stringContaining('not been swept') as string,
    });
    await engineer.get(`/api/revisions/${draft.id}/axes`).expect(404);
    await engineer.get(`/api/revisions/${draft.id}/cells`).expect(404);
  });
});

describe('cells', () => {
  test('are those that are stored, rejected ones without a value', async () => {
    const block = await get<ResultBlock>('cells');
    expect(block).toMatchObject({ from: 0, count: 4 });
    expect(block.capacity).toHaveLength(4 * 2 * 9);
    let cell = 0;
    for (let ordinal = 0; ordinal < 4; ordinal++)
      for (let sense = 0; sense < 2; sense++)
        for (let angle = 0; angle < 9; angle++, cell++) {
          const stored = made.stored(ordinal, sense, angle);
          expect(block.capacity[cell]).toBe(Number.isNaN(stored) ? null : stored);
          const code = made.code(ordinal, sense, angle);
          expect(block.governing[cell]).toBe(code < 200 ? code : -1 - (255 - code));
        }
    expect(block.capacity.filter((capacity) => capacity === null).length).toBe(made.row.rejectedCells);
    // Two rows in one line unless the definition says otherwise.
    expect(block.boltCount).toEqual(made.variants.map(({ boltCount }) => boltCount));
    expect(block.mass).toEqual(made.variants.map(({ mass }) => mass));
  });

  test('come in blocks, and none beyond the end', async () => {
    const all = await get<ResultBlock>('cells');
    const some = await get<ResultBlock>('cells?from=1&count=2');
    expect(some).toMatchObject({ from: 1, count: 2 });
    expect(some.capacity).toEqual(all.capacity.slice(18, 54));
    expect(await get<ResultBlock>('cells?from=4&count=2')).toMatchObject({
      count: 0,
      capacity: [],
      mass: [],
    });
    await engineer.get(`/api/revisions/${made.row.id}/cells?from=-1`).expect(422);
    await engineer.get(`/api/revisions/${made.row.id}/cells?count=20001`).expect(422);
  });
});

describe('curve', () => {
  test('passes through the stored cells and never above a limit state', async () => {
    const curve = await get<Curve>('variants/1/curve?sense=tension&step=10');
    expect(curve.angles).toHaveLength(17);
    made.laidOut.grid.angles.forEach((angle, index) => {
      const at = curve.angles.indexOf(angle);
      const stored = made.stored(1, 0, index);
      expect(curve.capacity[at], `${angle}`).toBe(Number.isNaN(stored) ? null : stored);
    });
    expect(curve.limitStates.map(({ code }) => code)).toContain('WM');
    curve.capacity.forEach((capacity, at) => {
      if (capacity === null) return expect(curve.governing[at]).toBe(-1);
      const governing = curve.limitStates[curve.governing[at]!]!.capacity[at]!;
      expect(Math.floor(governing + 1e-9)).toBe(capacity);
      for (const state of curve.limitStates)
        expect(state.capacity[at] ?? Infinity).toBeGreaterThanOrEqual(capacity);
    });
  });

  test('of another engine is what is stored', async () => {
    const curve = await get<Curve>('variants/2/curve?sense=compression', old);
    expect(curve.angles).toEqual(old.laidOut.grid.angles);
    expect(curve.limitStates).toEqual([]);
    const stored = curve.angles.map((_, angle) => old.stored(2, 1, angle));
    expect(curve.capacity).toEqual(stored.map((capacity) => (Number.isNaN(capacity) ? null : capacity)));
  });

  test('of a variant that is not there is not there', async () => {
    await engineer.get(`/api/revisions/${made.row.id}/variants/4/curve?sense=tension`).expect(404);
  });
});

describe('sheet', () => {
  test('shows the least capacity of its sections, in kN, with cautions and notes', async () => {
    const sheet = await get<Sheet>('variants/1/sheet?sense=tension&angle=0');
    const stored = made.stored(1, 0, 4);
    expect(sheet.outcome).toMatchObject({ status: 'capacity', rounded: stored });
    if (sheet.outcome.status !== 'capacity') return;
    const capacities = sheet.sections.flatMap(({ capacity }) => (capacity === null ? [] : [capacity]));
    expect(Math.min(...capacities)).toBeCloseTo(sheet.outcome.capacity, 9);
    expect(
      sheet.sections.find(({ id }) => id === (sheet.outcome as { governing: string }).governing),
    ).toBeDefined();
    expect(sheet.sections.find(({ code }) => code === 'BS')).toMatchObject({ title: 'Bolt shear' });
    expect(sheet.parameters.find(({ name }) => name === 'bolt_size')).toMatchObject({ value: 'M24' });
    expect(sheet.parameters.find(({ name }) => name === 'projection')).toBeUndefined();
    expect(sheet.cautions).toEqual(CAUTIONS);
    for (const note of made.laidOut.kind.notes) expect(sheet.notes).toContain(note);
    expect(sheet.notes[0]).not.toContain('engine');
  });

  test('of a rejected cell gives the rules with their numbers', async () => {
    const rejected = [0, 1, 2, 3].flatMap((ordinal) =>
      made.laidOut.grid.angles.map((angle, index) => ({
        ordinal,
        angle,
        code: made.code(ordinal, 0, index),
      })),
    );
    const { ordinal, angle, code } = rejected.find((cell) => cell.code >= 200)!;
    const sheet = await get<Sheet>(`variants/${ordinal}/sheet?sense=tension&angle=${angle}`);
    expect(sheet.outcome.status).toBe('not-permitted');
    if (sheet.outcome.status !== 'not-permitted') return;
    expect(sheet.outcome.rejections[0]!.rule).toBe(made.laidOut.kind.rules[255 - code]!.id);
    expect(sheet.outcome.rejections[0]!.message).toMatch(/\d/);
  });

  test('of another engine says so first', async () => {
    const sheet = await get<Sheet>('variants/1/sheet?sense=tension&angle=0', old);
    expect(sheet.notes[0]).toBe(
      'Worked out with engine 1.0.0; revision A was swept with engine 0.9.0, and its stored values stand.',
    );
  });

  test('beyond the angles of the kind is not covered', async () => {
    const sheet = await get<Sheet>('variants/1/sheet?sense=tension&angle=90');
    expect(sheet.outcome).toMatchObject({ status: 'not-covered' });
    await engineer.get(`/api/revisions/${made.row.id}/variants/1/sheet?sense=tension&angle=200`).expect(422);
  });
});
