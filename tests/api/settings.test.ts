import { afterAll, beforeAll, expect, test } from 'vitest';
import { createHarness, type Agent, type Harness } from './harness.ts';

let harness: Harness;
let admin: Agent;

beforeAll(async () => {
  harness = await createHarness();
  admin = await harness.signedIn('admin');
});
afterAll(() => harness.close());

const wanted = {
  firm: 'Harrow Quay Structural',
  increment: 0.5,
  factors: { gammaM0: 1, gammaM1: 1.1, gammaM2: 1.3 },
  weldSymbols: 'aws-a2.4',
};
const put = (version: number, body: object) =>
  admin.put('/api/settings').set('If-Match', `"${version}"`).send(body);

test('settings begin with the recommended partial factors of EN 1993-1-1 6.1 and EN 1993-1-8 table 2.1', async () => {
  const { body } = await admin.get('/api/settings').expect(200).expect('ETag', '"0"');
  expect(body).toEqual({
    firm: 'The firm',
    increment: 1,
    factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
    weldSymbols: 'iso-2553',
    lockVersion: 0,
  });
});

test('settings are changed by the version that was read, with an audit entry', async () => {
  await admin.put('/api/settings').send(wanted).expect(428);
  const { body } = await put(0, wanted).expect(200);
  expect(body).toEqual({ ...wanted, lockVersion: 1 });
  expect((await put(0, wanted).expect(412)).body).toMatchObject({ current: { lockVersion: 1 } });
  const engineer = await harness.signedIn('engineer');
  expect((await engineer.get('/api/settings').expect(200)).body).toEqual({ ...wanted, lockVersion: 1 });
  const entries = await harness.db.select<{ action: string }>(
    "SELECT action FROM audit WHERE subject_type = 'settings'",
  );
  expect(entries).toEqual([{ action: 'settings.changed' }]);
});

test.each([
  [{ ...wanted, increment: 0 }, 'increment', 'increment must be more than 0, not 0.'],
  [{ ...wanted, increment: 1e9 }, 'increment', 'increment must be at most 100, not 1000000000.'],
  [{ ...wanted, increment: '1' }, 'increment', 'increment must be a number, not "1".'],
  [
    { ...wanted, factors: { ...wanted.factors, gammaM2: 0.5 } },
    'factors.gammaM2',
    'factors.gammaM2 must be at least 1, not 0.5.',
  ],
  [
    { ...wanted, factors: { gammaM0: 1, gammaM1: 1 } },
    'factors.gammaM2',
    'factors.gammaM2 is missing; it must be a number.',
  ],
  [{ ...wanted, id: 2 }, 'id', 'id is not a field that can be given here.'],
])('refuses %o', async (body, field, message) => {
  const answer = await put(1, body).expect(422);
  expect((answer.body as { errors: object[] }).errors[0]).toMatchObject({ field, message });
});

test('of many who save at once one wins each version', async () => {
  const answers = await Promise.all(
    Array.from({ length: 12 }, (_, n) => put(1, { ...wanted, firm: `Firm ${n}` })),
  );
  expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
  expect(answers.filter(({ status }) => status === 412)).toHaveLength(11);
});
