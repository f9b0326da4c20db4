import fc from 'fast-check';
import {
  findKind,
  type ParameterSpec,
  type ParameterValue,
  type ParameterValues,
} from '@shared/engine/index.ts';
import { catalogue } from './gusset.ts';

const parameters = findKind('gusset-plate')?.parameters ?? [];

export type Ranges = Readonly<Record<string, readonly [number, number]>>;

/** Values that make sense together more often than the whole of each range would. mm. */
const gussetRanges: Ranges = {
  plate_thickness: [6, 30],
  projection: [250, 900],
  gusset_end_distance: [30, 110],
  gusset_edge_distance: [30, 130],
  weld_length: [150, 900],
  weld_leg: [5, 14],
  work_line_offset: [-150, 150],
  pitch: [40, 130],
  gauge: [40, 130],
  first_row: [80, 600],
  rows: [1, 7],
  hole_diameter: [0, 0],
  support_thickness: [0, 30],
  member_backmark: [0, 0],
  member_end_distance: [30, 80],
  clearance: [0, 30],
  buckling_k: [0.5, 2],
};

/** Names that every basis has values for. */
function names({ type, shapes }: ParameterSpec): string[] {
  switch (type) {
    case 'steel':
      return catalogue.steels.map(({ name }) => name);
    case 'boltSize':
      return catalogue.boltSizes
        .filter(({ hole }) => hole.aisc !== null && hole.csa !== null)
        .map(({ name }) => name);
    case 'boltGrade':
      return catalogue.boltGrades.filter(({ nominal }) => nominal !== null).map(({ name }) => name);
    case 'electrode':
      return catalogue.electrodes.map(({ name }) => name);
    default:
      return catalogue.sections
        .filter(({ shape }) => shapes === undefined || shapes.includes(shape))
        .map(({ name }) => name);
  }
}

function arbitraryValue(spec: ParameterSpec, likely: Ranges, wide: boolean): fc.Arbitrary<ParameterValue> {
  const [minimum, maximum] = (wide ? undefined : likely[spec.name]) ?? [spec.minimum ?? 0, spec.maximum ?? 0];
  if (spec.type === 'count') return fc.integer({ min: minimum, max: maximum });
  if (spec.type === 'length' || spec.type === 'number') {
    return fc.double({ min: minimum, max: maximum, noNaN: true });
  }
  if (spec.type === 'choice') return fc.constantFrom(...(spec.choices ?? []).map(({ value }) => value));
  return fc.constantFrom(...names(spec));
}

/**
 * Parameter values that pass the schema of a kind.
 * @param likely ranges that make sense together; `wide` draws from the whole of every range instead
 */
export function valuesOf(
  specs: readonly ParameterSpec[],
  likely: Ranges,
  wide: boolean,
): fc.Arbitrary<ParameterValues> {
  const entries = specs.map((spec) => [spec.name, arbitraryValue(spec, likely, wide)] as const);
  return fc.record(Object.fromEntries(entries));
}

/** Parameter values of a gusset plate that pass its schema. */
export function gussetValues(wide: boolean): fc.Arbitrary<ParameterValues> {
  return valuesOf(parameters, gussetRanges, wide);
}
