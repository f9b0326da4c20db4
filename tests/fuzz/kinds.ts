import { kinds } from '@shared/engine/index.ts';
import { kindCases } from '../engine/support/kind-cases.ts';
import { endsWell } from '../engine/support/kind-properties.ts';
import { fuzzer, type Fuzzer } from './fuzzer.ts';

export const kindFuzzers: readonly Fuzzer[] = kinds.map(({ id, title }) =>
  fuzzer(
    id,
    `${title}, any values in any basis: faults, rules, a reason, or a finite capacity with its governing limit state`,
    kindCases(id),
    (given) => void endsWell(given),
  ),
);
