import type { DetailKind } from '../types.ts';

/** Packed governing codes: an index of a limit state, or this less the index of a rule. */
export const RULE_CODE = 255;

/** The rule that rejects a variant because a derived parameter has no usable value. */
export const DERIVED_VALUE = 'derived-value';

/** Rules that are not a kind's own. The order is the packed code, so it only grows at the end. */
const GENERAL_RULES = [
  { id: 'not-covered', title: 'Load angle not covered by the kind' },
  { id: 'field-fault', title: 'Parameters that contradict each other' },
  { id: DERIVED_VALUE, title: 'Derived parameter without a usable value' },
] as const;

/** The name of a family's own rule, by its place in the definition. */
export const familyRuleId = (index: number): string => `family-rule-${index + 1}`;

/**
 * The legend of rejected cells. It is fixed for a kind so that codes do not depend on what is swept; the rules of the
 * family stand last, in the order of its definition.
 */
export function ruleLegend(
  kind: DetailKind,
  familyRules: readonly { readonly message: string }[] = [],
): readonly { readonly id: string; readonly title: string }[] {
  const own = familyRules.map(({ message }, index) => ({ id: familyRuleId(index), title: message }));
  return [...kind.rules, ...GENERAL_RULES, ...own];
}
