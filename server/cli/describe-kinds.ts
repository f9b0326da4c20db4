import {
  bases,
  type DetailKind,
  type EngineCatalogue,
  kinds,
  numberForms,
  type ParameterSpec,
  type ParameterType,
} from '@shared/engine/index.ts';

type CatalogueType = Exclude<ParameterType, 'length' | 'number' | 'count' | 'choice'>;

/** Where the names of a parameter's catalogue type come from. */
const lists: Readonly<Record<CatalogueType, keyof EngineCatalogue>> = {
  steel: 'steels',
  boltSize: 'boltSizes',
  boltGrade: 'boltGrades',
  electrode: 'electrodes',
  section: 'sections',
};

/** Everything that a script must know to write a case: kinds, bases, and values by name or by numbers. */
export function describeKinds(catalogue: EngineCatalogue) {
  return {
    kinds: kinds.map(describeKind),
    bases: bases.map(({ id, title, resultLabel, hasPartialFactors, defaultFactors, notes }) => ({
      id,
      title,
      resultLabel,
      factors: hasPartialFactors ? defaultFactors : null,
      notes,
    })),
    catalogueTypes: Object.fromEntries(
      (Object.keys(lists) as CatalogueType[]).map((type) => [type, describeType(type, catalogue)]),
    ),
  };
}

function describeKind(kind: DetailKind) {
  const { id, title, description, angleRange, senses, limitStates, rules, notes } = kind;
  return {
    id,
    title,
    description,
    angle: { unit: 'degrees', ...angleRange },
    senses,
    parameters: kind.parameters.map(describeParameter),
    limitStates,
    rules,
    notes,
  };
}

function describeParameter(spec: ParameterSpec) {
  const { name, label, symbol, group, type, unit, minimum, maximum, choices, help, when, bases: used } = spec;
  return {
    name,
    label,
    symbol,
    group,
    type,
    unit,
    minimum,
    maximum,
    choices: choices?.map(({ value, label: title, help: meaning }) => ({ value, title, meaning })),
    shapes: spec.shapes,
    default: spec.default,
    meaning: help,
    zeroMeans: spec.zero,
    usedWhen: when,
    usedByBases: used,
  };
}

/** A value of this type is one of the names, or an object of the numbers of one of the forms. */
function describeType(type: CatalogueType, catalogue: EngineCatalogue) {
  const forms =
    type === 'section'
      ? [
          { shape: 'angle', fields: numberForms.angle },
          { shape: 'flat', fields: numberForms.flat },
          { shape: 'i', fields: numberForms.i },
        ]
      : [{ fields: numberForms[type] }];
  return { names: catalogue[lists[type]].map(({ name }) => name), units: 'mm, mm², MPa', forms };
}
