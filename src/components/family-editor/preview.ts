import type { ParameterSetting } from '@shared/contracts/definition.ts';
import { kilonewtons, toRadians } from '@shared/engine/index.ts';
import { prepareVariant, valuesOf, type VariantFormulas } from '@shared/engine/sweep/index.ts';
import type {
  BasisId,
  CellOutcome,
  DetailKind,
  EngineCatalogue,
  FieldFault,
  LimitStateInfo,
  ParameterValues,
  PartialFactors,
  PreparedDetail,
  Rejection,
  Sense,
} from '@shared/engine/types.ts';
import type { CapacityCurve } from '../load-dial/types.ts';

/** Which value of each swept parameter the sample has; the place in its list. */
export type Sample = Readonly<Record<string, number>>;

export type Preview =
  | {
      readonly ok: false;
      readonly faults: readonly FieldFault[];
      /** The derived parameter that has no usable value. */
      readonly rejections: readonly Rejection[];
      readonly values: ParameterValues;
    }
  | {
      readonly ok: true;
      readonly detail: PreparedDetail;
      /** The fixed, the sampled and the derived values. */
      readonly values: ParameterValues;
      readonly limitStates: readonly LimitStateInfo[];
      readonly curve: CapacityCurve;
    };

/** The parameters that are swept, with the values that can be looked at. */
export function sweptOf(kind: DetailKind, settings: Readonly<Record<string, ParameterSetting>>) {
  return kind.parameters.flatMap((spec) => {
    const setting = settings[spec.name];
    const swept = setting?.mode === 'list' || setting?.mode === 'range';
    return swept ? [{ spec, values: valuesOf(setting) }] : [];
  });
}

/** One variant without what is derived: the fixed values, and of each swept parameter the sampled one (the first, when out of reach). */
export function sampleValues(
  settings: Readonly<Record<string, ParameterSetting>>,
  sample: Sample,
): ParameterValues {
  return Object.fromEntries(
    Object.entries(settings).flatMap(([name, setting]) => {
      const values = valuesOf(setting);
      const value = values[sample[name] ?? 0] ?? values[0];
      return value === undefined ? [] : [[name, value]];
    }),
  );
}

function curveOf(detail: PreparedDetail, kind: DetailKind, sense: Sense): CapacityCurve {
  const { minimum, maximum } = kind.angleRange;
  const angles = Array.from({ length: maximum - minimum + 1 }, (_, at) => minimum + at);
  const out = new Float64Array(detail.limitStates.length);
  const governing = new Array<number>(angles.length);
  const capacity = angles.map((angle, at) => {
    const index = detail.at(toRadians(angle), sense, out);
    governing[at] = index;
    return index < 0 ? null : kilonewtons(out[index] ?? NaN);
  });
  return { angles, capacity, governing };
}

export interface PreviewInputs {
  readonly kind: DetailKind;
  readonly basis: string;
  readonly catalogue: EngineCatalogue;
  readonly factors: PartialFactors;
  readonly formulas: VariantFormulas | null;
}

/** Prepares the sample by the engine and runs it round the angles. */
export function previewOf(
  { kind, basis, catalogue, factors, formulas }: PreviewInputs,
  given: ParameterValues,
  sense: Sense,
): Preview {
  const definition = { basis: basis as BasisId, factors };
  const variant = prepareVariant(definition, kind, formulas, catalogue, given);
  if (!variant.ok) return variant;
  const { detail, values } = variant;
  const curve = curveOf(detail, kind, sense);
  return { ok: true, detail, values, limitStates: detail.limitStates, curve };
}

/** The outcome at one angle, degrees. */
export const outcomeAt = (detail: PreparedDetail, angle: number, sense: Sense): CellOutcome =>
  detail.outcome(toRadians(angle), sense);
