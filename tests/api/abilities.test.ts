import { expect, test } from 'vitest';
import { abilitiesOf } from '@server/features/auth/policy.ts';
import { roles } from './harness.ts';

/** The office's rules: standards manager, engineer, drafter, admin. */
const table = {
  defineFamilies: [true, false, false, false],
  seeDrafts: [true, false, false, true],
  exportTables: [true, true, true, false],
  managePeople: [false, false, false, true],
  readAudit: [false, false, false, true],
};

test.each(roles.map((role, column) => [role, column] as const))('what a %s may do', (role, column) => {
  const expected = Object.fromEntries(Object.entries(table).map(([ability, row]) => [ability, row[column]]));
  expect(abilitiesOf(role)).toEqual(expected);
});
