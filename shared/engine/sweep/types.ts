import type { BasisId, FieldFault, KindId, ParameterValue, PartialFactors, Sense } from '../types.ts';

/** How one parameter varies. `range` counts from `from` to `to` inclusive. */
export type Setting =
  | { readonly mode: 'fixed'; readonly value: ParameterValue }
  | { readonly mode: 'list'; readonly values: readonly ParameterValue[] }
  | { readonly mode: 'range'; readonly from: number; readonly to: number; readonly step: number };

/** Load angles in degrees. */
export type AngleSetting =
  | { readonly mode: 'list'; readonly values: readonly number[] }
  | { readonly mode: 'range'; readonly from: number; readonly to: number; readonly step: number };

/** What a sweep needs of a family's definition. */
export interface SweepDefinition {
  readonly kind: KindId;
  readonly basis: BasisId;
  readonly parameters: Readonly<Record<string, Setting>>;
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

/** A definition laid out: the last axis varies fastest. */
export interface SweepGrid {
  readonly axes: readonly SweptAxis[];
  readonly fixed: Readonly<Record<string, ParameterValue>>;
  readonly variantCount: number;
  readonly cellCount: number;
  /** Degrees. */
  readonly angles: readonly number[];
  readonly senses: readonly Sense[];
}

export type GridResult =
  | { readonly ok: true; readonly grid: SweepGrid }
  | { readonly ok: false; readonly faults: readonly FieldFault[] };
