import type {
  DetailKind,
  EngineCatalogue,
  FieldFault,
  ParameterValues,
  PreparedDetail,
  Rejection,
} from '../types.ts';
import { DERIVED_VALUE } from './rule-legend.ts';
import { RuledDetail } from './ruled-detail.ts';
import type { SweepDefinition, VariantFormulas } from './types.ts';

/** A variant with its derived values: prepared, or why it cannot be. */
export type VariantResult =
  | { readonly ok: true; readonly values: ParameterValues; readonly detail: PreparedDetail }
  | {
      readonly ok: false;
      readonly values: ParameterValues;
      /** The rule of the legend that rejects all of its cells. */
      readonly rule: 'field-fault' | typeof DERIVED_VALUE;
      readonly faults: readonly FieldFault[];
      readonly rejections: readonly Rejection[];
    };

/**
 * The one way from fixed and swept values to a prepared detail, for sweep, look-up, sheet and preview alike: derived
 * values first, then the kind, then the family's rules.
 * @param formulas null where the definition has no expressions
 */
export function prepareVariant(
  { basis, factors }: Pick<SweepDefinition, 'basis' | 'factors'>,
  kind: DetailKind,
  formulas: VariantFormulas | null,
  catalogue: EngineCatalogue,
  given: ParameterValues,
): VariantResult {
  const { complete, values, rejections } = formulas?.complete(given) ?? plain(given);
  if (!complete) return { ok: false, values, rule: DERIVED_VALUE, faults: [], rejections };
  const prepared = kind.prepare(values, basis, catalogue, factors);
  if (!prepared.ok) return { ok: false, values, rule: 'field-fault', faults: prepared.faults, rejections };
  const { detail } = prepared;
  return { ok: true, values, detail: rejections.length > 0 ? new RuledDetail(detail, rejections) : detail };
}

const plain = (values: ParameterValues) => ({ complete: true, values, rejections: [] });
