import { expect, it } from 'vitest';
import { aiscChecks } from './aisc/index.ts';
import { csaChecks } from './csa/index.ts';
import { verdictOf } from './check.ts';

it.each([...csaChecks, ...aiscChecks].map((check) => [check.id, check] as const))('%s', (_id, check) => {
  const { difference, tolerance, agrees } = verdictOf(check);
  expect(agrees, `${check.inputs}: ${difference} against ${tolerance} ${check.unit}`).toBe(true);
});
