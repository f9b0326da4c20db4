import type { Verification, VerificationCheck } from '@shared/contracts/verification.ts';
import { ENGINE_VERSION } from '@shared/engine/index.ts';
import { type Check, verdictOf } from '@shared/verification/check.ts';
import { disagreements, notYetAnswered } from '@shared/verification/disagreements.ts';
import { checks } from '@shared/verification/registry.ts';

/** The decimals that the source prints. */
const asPrinted = ({ value, place }: Check['published']): string =>
  value.toFixed(Math.max(0, Math.round(-Math.log10(place))));

function present(check: Check): VerificationCheck {
  const { id, basis, clause, source, evidence, inputs, published, unit, roundedFirst, weak, note } = check;
  const remarks = [
    ...(roundedFirst === undefined ? [] : [`Rounded first in the source: ${roundedFirst.what}`]),
    ...(weak === undefined ? [] : [`Weak: ${weak}`]),
    ...(note === undefined ? [] : [note]),
  ];
  const verdict = verdictOf(check);
  return {
    id,
    basis,
    clause,
    source,
    evidence,
    inputs,
    published: asPrinted(published),
    unit,
    ...verdict,
    remarks,
  };
}

let computed: Verification | undefined;

/** Every check, worked out by this very engine; once for a process, since neither changes while it runs. */
export function verification(): Verification {
  computed ??= {
    engineVersion: ENGINE_VERSION,
    checks: checks.map(present),
    disagreements: [...disagreements],
    notYetAnswered: [...notYetAnswered],
  };
  return computed;
}
