import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { LookupAnswer, LookupDetails } from '@shared/contracts/lookup.ts';
import type { Problem } from '@shared/contracts/common.ts';
import { readLoad } from '@server/features/lookup/load.ts';
import { createHarness, type Agent, type Harness } from './harness.ts';
import { makeSwept, type Made } from './support/swept-revision.ts';

let harness: Harness;
let drafter: Agent;
let made: Made;
let old: Made;
let gone: Made;

beforeAll(async () => {
  harness = await createHarness();
  drafter = await harness.signedIn('drafter');
  made = await makeSwept(harness, { code: 'GP-01', state: 'locked' });
  old = await makeSwept(harness, { code: 'GP-02', engineVersion: '0.9.0' });
  gone = await makeSwept(harness, { code: 'GP-03', state: 'superseded' });
  await makeSwept(harness, { code: 'GP-04', state: 'checked' });
});
afterAll(() => harness.close());

const choices = { plate_thickness: 10, bolt_size: 'M20' };
const ask = (question: object, of = made) =>
  drafter
    .post('/api/lookup')
    .send({ revisionId: of.row.id, choices, angle: 0, sense: 'tension', ...question });
const answered = async (question: object, of = made) => {
  const { status, body } = await ask(question, of);
  expect(status, JSON.stringify(body)).toBe(200);
  return body as LookupAnswer;
};
const refused = async (question: object, of = made) => (await ask(question, of).expect(422)).body as Problem;

/** The first cell of the first sense that is (or is not) rejected, as a question. */
function cell(of: Made, rejected: boolean) {
  const { axes, angles } = of.laidOut.grid;
  for (let ordinal = 0; ordinal < 4; ordinal++)
    for (const [place, angle] of angles.entries()) {
      const stored = of.stored(ordinal, 0, place);
      if (Number.isNaN(stored) !== rejected) continue;
      const [thickness, bolt] = [axes[0]!.values[ordinal >> 1], axes[1]!.values[ordinal & 1]];
      return {
        ordinal,
        place,
        stored,
        question: { angle, choices: { plate_thickness: thickness, bolt_size: bolt } },
      };
    }
  throw new Error('There is no such cell');
}

test('only what is in force can be looked up', async () => {
  const { body } = await drafter.get('/api/lookup/details').expect(200);
  const { details } = body as LookupDetails;
  expect(details.map(({ code, state }) => [code, state])).toEqual([
    ['GP-01', 'locked'],
    ['GP-02', 'published'],
  ]);
  expect(details[0]).toMatchObject({
    letter: 'A',
    angleMinimum: -80,
    angleMaximum: 80,
    shortHash: 'c0ffee000000',
  });
  expect(details[0]!.choices.map(({ name, values }) => [name, values])).toEqual([
    ['plate_thickness', [10, 12]],
    ['bolt_size', ['M20', 'M24']],
  ]);
  const fixed = details[0]!.fixed;
  expect(fixed.find(({ name }) => name === 'weld_leg')).toMatchObject({ value: 8, unit: 'mm' });
  expect(fixed.some(({ name }) => name === 'bolt_size' || name === 'projection')).toBe(false);
  const { body: conflict } = await ask({}, gone).expect(409);
  expect(conflict).toMatchObject({ code: 'state-conflict' });
});

describe('a capacity', () => {
  test('at a swept angle is the published one', async () => {
    const { ordinal, place, stored, question } = cell(made, false);
    const answer = await answered(question);
    expect(answer.ordinal).toBe(ordinal);
    expect(answer.outcome).toMatchObject({
      status: 'capacity',
      capacity: stored,
      utilisation: null,
      adequate: null,
    });
    if (answer.outcome.status !== 'capacity') return;
    expect(answer.legend[made.code(ordinal, 0, place)]!.code).toBe(answer.outcome.governing.code);
    expect(answer.outcome.unrounded).toBeGreaterThanOrEqual(stored);
    expect(answer.outcome.unrounded).toBeLessThan(stored + 1);
    expect(answer.cautions).toHaveLength(3);
    expect(answer.revision).toMatchObject({ letter: 'A', state: 'locked', engineVersion: '1.0.0' });
  });

  test('between the swept angles stands on the curve, rounded down', async () => {
    const { question } = cell(made, false);
    const answer = await answered({ ...question, angle: question.angle + 3 });
    expect(answer.curve.angles).toHaveLength(161);
    const at = answer.curve.angles.indexOf(question.angle + 3);
    const outcome = answer.outcome.status === 'capacity' ? answer.outcome.capacity : null;
    expect(answer.curve.capacity[at]).toBe(outcome);
    if (answer.outcome.status === 'capacity')
      expect(outcome).toBe(Math.floor(answer.outcome.unrounded + 1e-9));
  });

  test('is read against a load, the utilisation rounded up', async () => {
    const { stored, question } = cell(made, false);
    const just = await answered({ ...question, load: stored });
    expect(just.outcome).toMatchObject({ utilisation: 1, adequate: true });
    const over = await answered({ ...question, load: stored + 0.0001 });
    expect(over.outcome).toMatchObject({ utilisation: 1.001, adequate: false });
    // 100 / 300 = 0.333…; 21 / 300 = 0.07, which floating point makes 0.07000000000000001.
    expect(readLoad(100, 300)).toEqual({ utilisation: 0.334, adequate: true });
    expect(readLoad(21, 300)).toEqual({ utilisation: 0.07, adequate: true });
    expect(readLoad(5, 0)).toEqual({ utilisation: null, adequate: false });
  });
});

test('what is not permitted names its rules', async () => {
  const { ordinal, place, question } = cell(made, true);
  const { outcome } = await answered({ ...question, load: 10 });
  expect(outcome.status).toBe('not-permitted');
  if (outcome.status !== 'not-permitted') return;
  expect(outcome.rejections[0]!.rule).toBe(made.laidOut.kind.rules[255 - made.code(ordinal, 0, place)]!.id);
  expect(outcome.rejections[0]!.message).toMatch(/\d/);
  expect((await answered({ angle: 85 })).outcome).toMatchObject({ status: 'not-covered' });
});

describe('choices', () => {
  test('are exactly the swept parameters, and the fault says what is accepted', async () => {
    const { errors } = await refused({ choices: { plate_thickness: 11, weld_leg: 8 } });
    expect(errors?.map(({ field }) => field).sort()).toEqual([
      'choices.bolt_size',
      'choices.plate_thickness',
      'choices.weld_leg',
    ]);
    const thickness = errors?.find(({ field }) => field === 'choices.plate_thickness');
    expect(thickness).toMatchObject({ value: 11, message: 'Plate thickness must be one of 10, 12 mm.' });
  });

  test('a load that is not above zero and an unknown sense are refused', async () => {
    expect((await refused({ load: 0 })).errors![0]!.field).toBe('load');
    expect((await refused({ sense: 'sideways' })).errors![0]!.field).toBe('sense');
  });
});

describe('a revision of another engine', () => {
  test('answers with what is stored, at its own angles only', async () => {
    const { stored, question } = cell(old, false);
    const answer = await answered({ ...question, load: 1 }, old);
    expect(answer.outcome).toMatchObject({ status: 'capacity', capacity: stored, unrounded: stored });
    expect(answer.notes[0]).toContain('swept with engine 0.9.0');
    expect(answer.curve.angles).toEqual(old.laidOut.grid.angles);
    const { errors } = await refused({ ...question, angle: question.angle + 3 }, old);
    expect(errors![0]).toMatchObject({
      field: 'angle',
      message: expect.stringContaining('-80, -60, -40') as string,
    });
  });

  test('names the rule of a rejected cell', async () => {
    const { question } = cell(old, true);
    const { outcome } = await answered(question, old);
    expect(outcome).toMatchObject({
      status: 'not-covered',
      reason: expect.stringMatching(/^Not permitted when it was published: .+\.$/) as string,
    });
  });
});
