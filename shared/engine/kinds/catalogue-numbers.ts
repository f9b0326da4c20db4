import type { Basis } from '../standards/basis.ts';
import { createBasis } from '../standards/registry.ts';
import type {
  BasisId,
  DetailKind,
  EngineCatalogue,
  ParameterSpec,
  ParameterValues,
  PartialFactors,
  Section,
} from '../types.ts';
import type { BoltPrefix } from './parts.ts';
import { type Resolved, steelAt } from './resolved.ts';
import { sectionNumbers } from './section-numbers.ts';
import { validateParameters } from './validate.ts';

/** A number that comes with a catalogue choice, under a name of its own: `bolt_d` comes with `bolt_size`. */
export interface CatalogueNumber {
  readonly name: string;
  readonly label: string;
  readonly unit: 'mm' | 'mm²' | 'MPa';
  /** The parameters that it follows from. */
  readonly needs: readonly string[];
}

/** Reads one such number of a variant; null, with the reason, where its choices have none. */
export type CatalogueReading = { readonly value: number } | { readonly value: null; readonly reason: string };

type Read = (values: Resolved, basis: Basis) => number | null;
type Readable = CatalogueNumber & { readonly read: Read };

/** The numbers that the choices of a kind bring with them, in the order of its schema. */
export function catalogueNumbersOf(kind: DetailKind): readonly CatalogueNumber[] {
  return readables(kind).map(({ name, label, unit, needs }) => ({ name, label, unit, needs }));
}

/** Reads the catalogue numbers of variants by their names, for one basis and catalogue. Undefined without such a basis. */
export function catalogueReader(
  kind: DetailKind,
  basisId: BasisId,
  catalogue: EngineCatalogue,
  factors?: Partial<PartialFactors>,
): ((name: string, values: ParameterValues) => CatalogueReading) | undefined {
  const basis = createBasis(basisId, factors);
  if (basis === undefined) return undefined;
  const known = new Map(
    readables(kind).map((one) => [
      one.name,
      { one, specs: kind.parameters.filter(({ name }) => one.needs.includes(name)) },
    ]),
  );
  return (name, values) => {
    const entry = known.get(name);
    if (entry === undefined) return { value: null, reason: `The kind has no number ${name}` };
    const given = Object.fromEntries(
      entry.one.needs.filter((need) => Object.hasOwn(values, need)).map((need) => [need, values[need]]),
    );
    const checked = validateParameters(entry.specs, given, catalogue);
    if (!checked.ok) return { value: null, reason: checked.faults.map(({ message }) => message).join('; ') };
    const value = entry.one.read(checked.values, basis);
    return value === null
      ? { value, reason: `${entry.one.label}: there is none for this choice` }
      : { value };
  };
}

function readables(kind: DetailKind): readonly Readable[] {
  const names = new Set(kind.parameters.map(({ name }) => name));
  return kind.parameters.flatMap((spec) => {
    if (spec.type === 'boltSize') return boltNumbers(spec);
    if (spec.type === 'boltGrade') return gradeNumbers(spec);
    if (spec.type === 'steel') return steelNumbers(spec, names);
    if (spec.type === 'electrode') return electrodeNumbers(spec);
    return spec.type === 'section' ? numbersOfSection(spec) : [];
  });
}

function boltNumbers({ name, label }: ParameterSpec): readonly Readable[] {
  const prefix = name.slice(0, -'bolt_size'.length) as BoltPrefix;
  const hole = `${prefix}hole_diameter`;
  return [
    {
      name: `${prefix}bolt_d`,
      label: `${label}: nominal diameter`,
      unit: 'mm',
      needs: [name],
      read: (values) => values.size(name).size.d,
    },
    {
      name: `${prefix}bolt_area`,
      label: `${label}: tensile stress area`,
      unit: 'mm²',
      needs: [name],
      read: (values) => values.size(name).size.stressArea,
    },
    {
      name: `${prefix}hole_d`,
      label: `${label}: diameter of the hole, given or the normal one of the basis`,
      unit: 'mm',
      needs: [name, hole],
      read: (values, basis) => {
        const { size, catalogued } = values.size(name);
        return values.number(hole) || basis.normalHole(size, catalogued);
      },
    },
  ];
}

function gradeNumbers({ name, label }: ParameterSpec): readonly Readable[] {
  const prefix = name.slice(0, -'bolt_grade'.length);
  const size = `${prefix}bolt_size`;
  const read: Read = (values, basis) => {
    const choice = values.grade(name);
    if ('given' in choice) return choice.given.fub;
    return basis.grade(choice.catalogued, values.size(size).size.d)?.fub ?? null;
  };
  const meaning = `${label}: tensile strength that the basis uses for the size`;
  return [{ name: `${prefix}bolt_fub`, label: meaning, unit: 'MPa', needs: [size, name], read }];
}

/** Strengths at the thickness of the same part, where the kind has it as a parameter. */
function steelNumbers(spec: ParameterSpec, names: ReadonlySet<string>): readonly Readable[] {
  const part = spec.name.slice(0, -'_steel'.length);
  const thickness = `${part}_thickness`;
  if (!names.has(thickness) || spec.choices !== undefined) return [];
  const strength = (symbol: 'fy' | 'fu', word: string): Readable => ({
    name: `${part}_${symbol}`,
    label: `${spec.label}: ${word} strength at the thickness`,
    unit: 'MPa',
    needs: [spec.name, thickness],
    read: (values) => steelAt(values.steel(spec.name), values.number(thickness), null)?.[symbol] ?? null,
  });
  return [strength('fy', 'yield'), strength('fu', 'tensile')];
}

function electrodeNumbers({ name, label }: ParameterSpec): readonly Readable[] {
  const read: Read = (values) => values.electrode(name).xu;
  return [{ name: `${name}_xu`, label: `${label}: tensile strength`, unit: 'MPa', needs: [name], read }];
}

function numbersOfSection({ name, label, shapes }: ParameterSpec): readonly Readable[] {
  return sectionNumbers
    .filter((one) => shapes === undefined || one.shapes.some((shape) => shapes.includes(shape)))
    .map(({ suffix, meaning, unit, read }) => ({
      name: `${name}_${suffix}`,
      label: `${label}: ${meaning}`,
      unit,
      needs: [name],
      read: (values) => read(values.section<Section>(name)),
    }));
}
