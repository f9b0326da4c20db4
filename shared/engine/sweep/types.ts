import type {
  BasisId,
  DetailKind,
  FieldFault,
  KindId,
  ParameterValue,
  ParameterValues,
  PartialFactors,
  Rejection,
  Sense,
} from '../types.ts';

/** How one parameter varies. `range` counts from `from` to `to` inclusive; `derived` follows from others. */
export type Setting =
  | { readonly mode: 'fixed'; readonly value: ParameterValue }
  | { readonly mode: 'list'; readonly values: readonly ParameterValue[] }
  | { readonly mode: 'range'; readonly from: number; readonly to: number; readonly step: number }
  | { readonly mode: 'derived'; readonly expression: string };

/** Load angles in degrees. */
export type AngleSetting =
  | { readonly mode: 'list'; readonly values: readonly number[] }
  | { readonly mode: 'range'; readonly from: number; readonly to: number; readonly step: number };

/** What a sweep needs of a family's definition. */
export interface SweepDefinition {
  readonly kind: KindId;
  readonly basis: BasisId;
  readonly parameters: Readonly<Record<string, Setting>>;
  /** Rules that reject a variant for which the expression does not hold. */
  readonly rules?: readonly { readonly expression: string; readonly message: string }[];
  readonly angles: AngleSetting;
  readonly senses: readonly Sense[];
  /** kN. */
  readonly increment: number;
  readonly factors: PartialFactors;
}

/** The most that one family may have. */
export interface SweepLimits {
  readonly variants: number;
  readonly cells: number;
  readonly angles: number;
}

/** A swept parameter and its values, in the order of the kind's schema. */
export interface SweptAxis {
  readonly name: string;
  readonly values: readonly ParameterValue[];
}

/** What a definition's expressions say of a variant; absent where it has none. */
export interface VariantFormulas {
  /** Adds the derived values to those that are fixed or swept, and asks the family's rules. */
  complete(given: ParameterValues): CompletedValues;
}
export interface CompletedValues {
  /** Whether every derived parameter has a value. */
  readonly complete: boolean;
  readonly values: ParameterValues;
  /** The derived parameter that has no usable value, or the family's rules that do not hold. */
  readonly rejections: readonly Rejection[];
}

/** Reads the expressions of a definition. The engine is given one: it knows no expressions itself. */
export type FormulaReader = (
  definition: SweepDefinition,
  kind: DetailKind,
) =>
  | { readonly ok: true; readonly formulas: VariantFormulas }
  | { readonly ok: false; readonly faults: readonly FieldFault[] };

/** A definition laid out: the last axis varies fastest. */
export interface SweepGrid {
  readonly axes: readonly SweptAxis[];
  readonly fixed: Readonly<Record<string, ParameterValue>>;
  readonly variantCount: number;
  readonly cellCount: number;
  /** Degrees. */
  readonly angles: readonly number[];
  readonly senses: readonly Sense[];
  readonly formulas: VariantFormulas | null;
}

export type GridResult =
  | { readonly ok: true; readonly grid: SweepGrid }
  | { readonly ok: false; readonly faults: readonly FieldFault[] };
