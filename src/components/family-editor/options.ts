import type { EngineCatalogue, ParameterSpec, ParameterValue, SectionShape } from '@shared/engine/types.ts';

export interface Option {
  readonly value: ParameterValue;
  readonly title: string;
  readonly help?: string;
}

/** A value as the person reads it; one given by its numbers is written out. */
export function titleOf(value: ParameterValue): string {
  if (typeof value !== 'object') return String(value);
  return Object.entries(value)
    .map(([name, part]) => `${name} ${part}`)
    .join(', ');
}

/** The shapes that the schema takes, narrowed by the brace where there is one. */
function shapesOf(
  spec: ParameterSpec,
  values: Readonly<Record<string, ParameterValue>>,
): readonly SectionShape[] | null {
  if (values.brace === undefined) return spec.shapes ?? null;
  return [values.brace === 'flat' ? 'flat' : 'angle'];
}

function named(
  spec: ParameterSpec,
  catalogue: EngineCatalogue | null,
  shapes: readonly SectionShape[] | null,
): readonly { readonly name: string }[] {
  if (!catalogue) return [];
  switch (spec.type) {
    case 'steel':
      return catalogue.steels;
    case 'boltSize':
      return catalogue.boltSizes;
    case 'boltGrade':
      return catalogue.boltGrades;
    case 'electrode':
      return catalogue.electrodes;
    case 'section':
      return catalogue.sections.filter((section) => shapes === null || shapes.includes(section.shape));
    default:
      return [];
  }
}

/**
 * What may be picked for a parameter: the kind's own choices, then the catalogue. A value that stands in the draft
 * but in neither (a steel given by its numbers, say) is offered too, so that it is never lost.
 * @param brace values of other parameters that narrow the choice: sections by the shape of the brace
 */
export function optionsOf(
  spec: ParameterSpec,
  catalogue: EngineCatalogue | null,
  present: readonly ParameterValue[],
  brace: Readonly<Record<string, ParameterValue>> = {},
): Option[] {
  const own = (spec.choices ?? []).map(({ value, label, help }) => ({ value, title: label, help }));
  const listed = named(spec, catalogue, shapesOf(spec, brace)).map(({ name }) => ({
    value: name,
    title: name,
  }));
  const options: Option[] = [...own, ...listed];
  for (const value of present)
    if (value !== '' && !options.some((option) => option.value === value))
      options.push({ value, title: titleOf(value) });
  return options;
}
