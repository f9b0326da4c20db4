import type { DetailKind } from '@shared/engine/types.ts';
import { newDraft, type FamilyDraft } from './draft.ts';

/** Whether a draft holds the parameters of another kind than the one it names. */
export const isOfOtherKind = (draft: FamilyDraft, kind: DetailKind): boolean =>
  kind.parameters.some(({ name }) => draft.parameters[name] === undefined);

/**
 * A draft laid out for another kind: its defaults, angles and senses; what was changed by hand is carried over where the
 * new kind has such a parameter.
 */
export function ofKind(draft: FamilyDraft, from: DetailKind, to: DetailKind): FamilyDraft {
  const { code, title, basis, increment, factors, rules } = draft;
  const usual = { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 };
  const fresh = newDraft(to, basis, { increment, factors: usual });
  const untouched = newDraft(from, basis, { increment, factors: usual });
  for (const { name, type } of to.parameters) {
    const own = draft.parameters[name];
    const same = from.parameters.find((spec) => spec.name === name)?.type === type;
    if (!own || !same) continue;
    if (JSON.stringify(own) !== JSON.stringify(untouched.parameters[name]))
      fresh.parameters[name] = structuredClone(own);
  }
  return { ...fresh, code, title, factors: { ...factors }, rules: structuredClone(rules) };
}
