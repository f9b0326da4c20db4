import type { VerificationCheck } from '@shared/contracts/verification.ts';
import { upTo } from '../../composables/format.ts';

export interface CheckFilter {
  readonly basis: string | null;
  readonly evidence: VerificationCheck['evidence'] | null;
  readonly text: string;
}

/** The checks that a filter leaves, in their order. */
export function matching(checks: readonly VerificationCheck[], { basis, evidence, text }: CheckFilter) {
  const wanted = text.trim().toLowerCase();
  return checks.filter(
    (check) =>
      (basis === null || check.basis === basis) &&
      (evidence === null || check.evidence === evidence) &&
      (wanted === '' ||
        [check.id, check.clause, check.source, check.inputs].some((one) =>
          one.toLowerCase().includes(wanted),
        )),
  );
}

/** Six significant figures: enough to see any difference that the source's rounding leaves. */
export const significant = (value: number): string => upTo(Number(value.toPrecision(6)), 6);

/** A difference beside its tolerance, e.g. +0.021. */
export const signed = (value: number): string =>
  value === 0 ? '0' : `${value > 0 ? '+' : '−'}${significant(Math.abs(Number(value.toPrecision(2))))}`;

/** What the words of the evidence mean. */
export const EVIDENCE: Readonly<Record<VerificationCheck['evidence'], string>> = {
  'found in text': 'read in the named publication',
  'from memory': 'remembered from the named publication, which was not at hand',
  'rule evaluation': 'worked out by hand from the clause: guards against change, no evidence from outside',
};
