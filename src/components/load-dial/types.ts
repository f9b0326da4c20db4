/** Capacity in kN by load angle in degrees; `governing` is the place in the legend, below zero where there is none. */
export interface CapacityCurve {
  readonly angles: readonly number[];
  readonly capacity: readonly (number | null)[];
  readonly governing: readonly number[];
}

export interface LegendEntry {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly part: string;
}
