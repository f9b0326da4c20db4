import type { Fuzzer } from './fuzzer.ts';
import { groupFuzzers } from './groups.ts';
import { kindFuzzers } from './kinds.ts';

/** Every fuzzer that `npm run fuzz` knows. */
export const fuzzers: readonly Fuzzer[] = [...kindFuzzers, ...groupFuzzers];
