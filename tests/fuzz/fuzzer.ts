import fc from 'fast-check';

/** A statement that must hold for every case that can be drawn. */
export interface Fuzzer {
  readonly name: string;
  /** What is drawn and what must hold. */
  readonly about: string;
  /** @throws with the smallest case that breaks the statement */
  readonly run: (cases: number, seed: number) => void;
}

/** A fuzzer of one statement, which throws for a case that breaks it. */
export function fuzzer<T>(
  name: string,
  about: string,
  cases: fc.Arbitrary<T>,
  holds: (given: T) => void,
): Fuzzer {
  return {
    name,
    about,
    run: (numRuns, seed) => fc.assert(fc.property(cases, holds), { numRuns, seed }),
  };
}
