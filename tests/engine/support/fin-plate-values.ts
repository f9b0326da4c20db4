import type fc from 'fast-check';
import { findKind, type ParameterValues } from '@shared/engine/index.ts';
import { type Ranges, valuesOf } from './arbitrary.ts';

/** Values that make sense together more often than the whole of each range would. mm. */
const likely: Ranges = {
  plate_thickness: [6, 16],
  plate_end_distance: [25, 80],
  plate_edge_distance: [25, 90],
  weld_leg: [5, 14],
  pitch: [40, 130],
  gauge: [40, 130],
  first_column: [40, 160],
  rows: [1, 7],
  hole_diameter: [0, 0],
  support_thickness: [0, 30],
  beam_gap: [5, 30],
  beam_top_to_row: [0, 0],
  cope_top_length: [0, 0],
  cope_top_depth: [0, 0],
  cope_bottom_length: [0, 0],
  cope_bottom_depth: [0, 0],
  eccentricity: [0, 200],
};

/** Parameter values of a fin plate that pass its schema; `wide` draws from the whole of every range. */
export function finPlateValues(wide: boolean): fc.Arbitrary<ParameterValues> {
  return valuesOf(findKind('fin-plate')?.parameters ?? [], likely, wide);
}
