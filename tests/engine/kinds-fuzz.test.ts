import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kinds } from '@shared/engine/index.ts';
import { kindCases } from './support/kind-cases.ts';
import { type Ending, endsWell } from './support/kind-properties.ts';

/** The long run is `npm run fuzz -- --cases 100000`; this one keeps every kind honest in each test run. */
const CASES = 1500;

describe.each(kinds)('$id, given anything', ({ id }) => {
  it('ends in faults, rules, a reason, or a finite capacity that the sheet repeats', () => {
    const endings: Record<Ending, number> = { faults: 0, 'not-permitted': 0, 'not-covered': 0, capacity: 0 };
    fc.assert(
      fc.property(kindCases(id), (given) => {
        endings[endsWell(given)]++;
      }),
      { numRuns: CASES },
    );
    for (const [ending, count] of Object.entries(endings)) expect(count, ending).toBeGreaterThan(10);
  });
});
