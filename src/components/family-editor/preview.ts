import type { ParameterSetting } from '@shared/contracts/definition.ts';
import { kilonewtons, toRadians } from '@shared/engine/index.ts';
import { valuesOf } from '@shared/engine/sweep/index.ts';
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
  Sense,
} from '@shared/engine/types.ts';
import type { CapacityCurve } from '../load-dial/types.ts';

/** Which value of each swept parameter the sample has; the place in its list. */
export type Sample = Readonly<Record<string, number>>;

export type Preview =
  | { readonly ok: false; readonly faults: readonly FieldFault[] }
  | {
      readonly ok: true;
      readonly detail: PreparedDetail;
      readonly limitStates: readonly LimitStateInfo[];
      readonly curve: CapacityCurve;
    };

/** The parameters that are swept, with the values that can be looked at. */
export function sweptOf(kind: DetailKind, settings: Readonly<Record<string, ParameterSetting>>) {
  return kind.parameters.flatMap((spec) => {
    const setting = settings[spec.name];
    return setting && setting.mode !== 'fixed' ? [{ spec, values: valuesOf(setting) }] : [];
  });
}

/** One variant: the fixed values, and of each swept parameter the sampled one (the first, when out of reach). */
export function sampleValues(
  settings: Readonly<Record<string, ParameterSetting>>,
  sample: Sample,
): ParameterValues {
  return Object.fromEntries(
    Object.entries(settings).map(([name, setting]) => {
      const values = valuesOf(setting);
      return [name, values[sample[name] ?? 0] ?? values[0] ?? ''];
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

/** Prepares the sample by the engine and runs it round the angles. */
export function previewOf(
  kind: DetailKind,
  basis: string,
  catalogue: EngineCatalogue,
  factors: PartialFactors,
  values: ParameterValues,
  sense: Sense,
): Preview {
  const prepared = kind.prepare(values, basis as BasisId, catalogue, factors);
  if (!prepared.ok) return prepared;
  const { detail } = prepared;
  return { ok: true, detail, limitStates: detail.limitStates, curve: curveOf(detail, kind, sense) };
}

/** The outcome at one angle, degrees. */
export const outcomeAt = (detail: PreparedDetail, angle: number, sense: Sense): CellOutcome =>
  detail.outcome(toRadians(angle), sense);
