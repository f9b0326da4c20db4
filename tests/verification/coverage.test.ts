import { expect, it } from 'vitest';
import { bases, findKind } from '@shared/engine/index.ts';
import { checks } from '@shared/verification/registry.ts';

/** Limit states that a basis does not have, so that nothing can be checked. */
const none = new Set(['en-1993-1-8-2005 WB']);

it('every limit state of the gusset plate is checked in every design basis', () => {
  const kind = findKind('gusset-plate')!;
  const missing = bases.flatMap(({ id }) => {
    const asked = new Set(
      checks
        .filter(({ basis, asks }) => basis === id && asks?.kind === kind.id)
        .map(({ asks }) => asks?.code),
    );
    return kind.limitStates
      .map(({ code }) => code)
      .filter((code) => !asked.has(code) && !none.has(`${id} ${code}`))
      .map((code) => `${id} ${code}`);
  });
  expect(missing).toEqual([]);
});

/** What the further kinds ask of a basis, and how the checks of it are known by their clause. */
const further: Readonly<Record<string, RegExp>> = {
  'tension of a bolt': /Table 3\.4|13\.12\.1\.[23]|J3\.7/,
  'shear and tension of a bolt': /Table 3\.4|13\.12\.1\.[34]|J3\.8/,
  'T-stub or prying': /Table 6\.2|6\.2\.4|prying|Part 9|13\.12\.1\.[23]/,
  'plate in shear': /6\.2\.6|13\.4|J4\.2/,
};

it.each(Object.entries(further))('%s is checked in every design basis', (_what, clause) => {
  for (const { id } of bases) {
    const found = checks.filter((check) => check.basis === id && clause.test(check.clause));
    expect(found.length, id).toBeGreaterThan(0);
  }
});
