import { afterAll, beforeAll, expect, test } from 'vitest';
import { verificationResponse } from '@shared/contracts/verification.ts';
import { createHarness, type Harness } from './harness.ts';

let harness: Harness;
beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());

test('everybody who is signed in reads what the engine was checked against', async () => {
  await harness.stranger().get('/api/verification').expect(401);
  const drafter = await harness.signedIn('drafter');
  const { body } = await drafter.get('/api/verification').expect(200);
  const register = verificationResponse.parse(body);
  expect(register.checks.length).toBeGreaterThan(500);
  expect(register.checks.filter(({ agrees }) => !agrees)).toEqual([]);
  // EN 1993-1-8 Table 3.4: 0.9 · 800 · 245/1.25 = 141.12 kN, printed as 141 in tables of bolts.
  const bolt = register.checks.find(({ id }) => id === 'bolt-tension-8.8-M20');
  expect(bolt?.ours).toBeCloseTo(141.12, 6);
  expect(register.disagreements.length).toBeGreaterThan(5);
});
