import type fc from 'fast-check';
import { findKind, type ParameterValues } from '@shared/engine/index.ts';
import { type Ranges, valuesOf } from './arbitrary.ts';

/** Values that make sense together more often than the whole of each range would. mm. */
const likely: Ranges = {
  support_thickness: [0, 30],
  plate_thickness: [8, 20],
  plate_width: [150, 260],
  plate_end_distance: [30, 60],
  weld_leg: [5, 12],
  rows: [1, 6],
  pitch: [55, 110],
  gauge: [80, 140],
  hole_diameter: [0, 0],
  beam_top_to_row: [0, 0],
};

/** Parameter values of an end plate that pass its schema; `wide` draws from the whole of every range. */
export function endPlateValues(wide: boolean): fc.Arbitrary<ParameterValues> {
  return valuesOf(findKind('end-plate')?.parameters ?? [], likely, wide);
}
