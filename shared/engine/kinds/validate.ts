import { nearestName } from '../numeric/nearest-name.ts';
import type {
  EngineCatalogue,
  FieldFault,
  ParameterSpec,
  ParameterType,
  PartialFactors,
  Section,
  SectionShape,
} from '../types.ts';
import { readObject } from './object-values.ts';
import { Resolved, type ResolvedValue } from './resolved.ts';

type Read = { readonly value: ResolvedValue } | { readonly fault: string };
export type Validated =
  | { readonly ok: true; readonly values: Resolved }
  | { readonly ok: false; readonly faults: readonly FieldFault[] };

/**
 * Checks given values against a schema; whatever is missing takes its default. Every fault is reported, with
 * the field, the value and what is accepted. Never throws, whatever it is given.
 */
export function validateParameters(
  specs: readonly ParameterSpec[],
  given: unknown,
  catalogue: EngineCatalogue,
): Validated {
  if (!isRecord(given)) {
    const message = 'Parameters must be an object of names and values';
    return { ok: false, faults: [{ field: 'parameters', value: brief(given), message }] };
  }
  const faults = unknownNames(specs, given);
  const values = new Map<string, ResolvedValue>();
  for (const spec of specs) {
    const value = Object.hasOwn(given, spec.name) ? given[spec.name] : spec.default;
    const read = readValue(spec, value === undefined ? spec.default : value, catalogue);
    if ('fault' in read) {
      faults.push({
        field: spec.name,
        value: brief(value),
        message: `${spec.label}: ${read.fault}`,
      });
    } else values.set(spec.name, read.value);
  }
  return faults.length > 0 ? { ok: false, faults } : { ok: true, values: new Resolved(values) };
}

const factorRange: Readonly<Record<keyof PartialFactors, readonly [number, number]>> = {
  gammaM0: [0.9, 2],
  gammaM1: [0.9, 2],
  gammaM2: [1, 2],
};

/** Checks a firm's partial factors; those left out are the basis's own. */
export function validateFactors(given: unknown): FieldFault[] {
  if (given === undefined || given === null) return [];
  if (!isRecord(given)) {
    return [{ field: 'factors', value: brief(given), message: 'Partial factors must be an object' }];
  }
  return Object.entries(given).flatMap(([name, value]) => {
    const range = Object.hasOwn(factorRange, name) ? factorRange[name as keyof PartialFactors] : undefined;
    const field = `factors.${name.slice(0, 40)}`;
    if (range === undefined) {
      return [{ field, value: brief(value), message: 'Accepted are gammaM0, gammaM1 and gammaM2' }];
    }
    if (value === undefined || (typeof value === 'number' && value >= range[0] && value <= range[1]))
      return [];
    return [{ field, value: brief(value), message: `Must be a number from ${range[0]} to ${range[1]}` }];
  });
}

function unknownNames(
  specs: readonly ParameterSpec[],
  given: Readonly<Record<string, unknown>>,
): FieldFault[] {
  const known = specs.map(({ name }) => name);
  return Object.keys(given)
    .filter((name) => !known.includes(name))
    .map((name) => {
      const near = nearestName(name, known);
      const hint = near === undefined ? 'the kind has no such parameter' : `did you mean ${near}?`;
      return { field: name.slice(0, 60), value: brief(given[name]), message: `Unknown parameter: ${hint}` };
    });
}

function readValue(spec: ParameterSpec, value: unknown, catalogue: EngineCatalogue): Read {
  switch (spec.type) {
    case 'length':
    case 'number':
    case 'count':
      return readNumber(spec, value);
    case 'choice':
      return readChoice(spec, value);
    default:
      if (typeof value === 'string') return readName(spec, value, catalogue);
      if (isRecord(value)) return readNumbers(spec, value);
      return { fault: 'give a catalogue name, or an object of numbers' };
  }
}

function readNumber(spec: ParameterSpec, value: unknown): Read {
  const unit = spec.unit === '' ? '' : ` ${spec.unit}`;
  const minimum = spec.minimum ?? -Infinity;
  const maximum = spec.maximum ?? Infinity;
  const whole = spec.type === 'count';
  const accepted = `${whole ? 'a whole number' : 'a number'} from ${minimum} to ${maximum}${unit}`;
  if (typeof value !== 'number' || !Number.isFinite(value)) return { fault: `must be ${accepted}` };
  if (value < minimum || value > maximum || (whole && !Number.isInteger(value))) {
    return { fault: `must be ${accepted}; ${value} was given` };
  }
  return { value };
}

function readChoice(spec: ParameterSpec, value: unknown): Read {
  const accepted = (spec.choices ?? []).map((choice) => choice.value);
  if (typeof value === 'string' && accepted.includes(value)) return { value };
  return { fault: `must be one of ${accepted.join(', ')}` };
}

function readName(spec: ParameterSpec, name: string, catalogue: EngineCatalogue): Read {
  if ((spec.choices ?? []).some((choice) => choice.value === name)) return { value: { same: true } };
  const found = byName(spec.type, name, catalogue);
  const misfit = shapeFault(spec, found);
  if (misfit !== undefined) return misfit;
  if (found !== undefined) return { value: found };
  const names = catalogueNames(spec, catalogue);
  const near = nearestName(name, names);
  const some = [...new Set([...(near === undefined ? [] : [near]), ...names.slice(0, 4)])].join(', ');
  return { fault: `no catalogue entry "${name.slice(0, 40)}"; accepted are for example ${some}` };
}

function byName(type: ParameterType, name: string, catalogue: EngineCatalogue): ResolvedValue | undefined {
  switch (type) {
    case 'steel': {
      const catalogued = catalogue.steels.find((entry) => entry.name === name);
      return catalogued && { catalogued };
    }
    case 'boltSize': {
      const catalogued = catalogue.boltSizes.find((entry) => entry.name === name);
      return catalogued && { size: catalogued, catalogued };
    }
    case 'boltGrade': {
      const catalogued = catalogue.boltGrades.find((entry) => entry.name === name);
      return catalogued && { catalogued };
    }
    case 'electrode':
      return catalogue.electrodes.find((entry) => entry.name === name);
    case 'section':
      return catalogue.sections.find((entry) => entry.name === name);
    default:
      return undefined;
  }
}

/** The names that a parameter may have in the catalogue; none where it is no catalogue choice. */
export function catalogueNames({ type, shapes }: ParameterSpec, catalogue: EngineCatalogue): string[] {
  switch (type) {
    case 'steel':
      return catalogue.steels.map(({ name }) => name);
    case 'boltSize':
      return catalogue.boltSizes.map(({ name }) => name);
    case 'boltGrade':
      return catalogue.boltGrades.map(({ name }) => name);
    case 'electrode':
      return catalogue.electrodes.map(({ name }) => name);
    case 'section':
      return catalogue.sections
        .filter(({ shape }) => shapes === undefined || shapes.includes(shape))
        .map(({ name }) => name);
    default:
      return [];
  }
}

function readNumbers(spec: ParameterSpec, given: Readonly<Record<string, unknown>>): Read {
  const { type } = spec;
  const read = readObject(type, given);
  if ('fault' in read) return read;
  const misfit = type === 'section' ? shapeFault(spec, read.value as Section) : undefined;
  if (misfit !== undefined) return misfit;
  if (type === 'boltSize') return { value: { size: read.value, catalogued: null } as ResolvedValue };
  if (type === 'steel' || type === 'boltGrade') return { value: { given: read.value } as ResolvedValue };
  return { value: read.value as ResolvedValue };
}

const shapeNames: Readonly<Record<SectionShape, string>> = {
  angle: 'an angle (shape "angle")',
  flat: 'a flat (shape "flat")',
  i: 'an I section (shape "i")',
};

/** The fault of a section whose shape the parameter does not take. */
function shapeFault(
  { type, shapes }: ParameterSpec,
  found: ResolvedValue | undefined,
): { readonly fault: string } | undefined {
  if (type !== 'section' || shapes === undefined || found === undefined) return undefined;
  const { name, shape } = found as Section;
  if (shapes.includes(shape)) return undefined;
  const accepted = shapes.map((one) => shapeNames[one]).join(' or ');
  return { fault: `accepted is ${accepted}; "${name}" is ${shapeNames[shape]}` };
}

function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A given value, short enough to repeat in an answer. */
function brief(value: unknown): unknown {
  if (typeof value === 'string') return value.length > 80 ? `${value.slice(0, 80)}…` : value;
  if (typeof value === 'number' && !Number.isFinite(value)) return String(value);
  if (typeof value === 'object' && value !== null) return Array.isArray(value) ? 'a list' : 'an object';
  return typeof value === 'number' || typeof value === 'boolean' ? value : String(value);
}
