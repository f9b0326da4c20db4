import {
  type BasisInfo,
  bases,
  type DetailKind,
  type FieldFault,
  findBasis,
  findKind,
  kinds,
  type ParameterValues,
  type PartialFactors,
  type Sense,
} from '@shared/engine/index.ts';

const KEYS = ['kind', 'basis', 'parameters', 'options', 'angle', 'sense', 'factors'];

/** What a case names. Its parameters and factors are checked by the kind itself. */
export interface NamedCase {
  readonly kind: DetailKind;
  readonly basis: BasisInfo;
  readonly values: ParameterValues;
  /** Degrees; a band where both ends differ. */
  readonly angles: { readonly from: number; readonly to: number };
  readonly sense: Sense;
  readonly factors: Partial<PartialFactors> | undefined;
}

/** `named` is there when kind and basis are, so that the faults of the parameters can be told as well. */
export interface CheckedCase {
  readonly faults: readonly FieldFault[];
  readonly named?: NamedCase;
}

type Given = Readonly<Record<string, unknown>>;

/** Checks everything of a case but its parameters and factors. Every fault is reported. */
export function checkCase(entry: unknown): CheckedCase {
  const faults: FieldFault[] = [];
  const fault: Fault = (field, value, message) => {
    faults.push({ field: field.slice(0, 60), value: brief(value), message });
  };
  if (!isObject(entry)) {
    fault('case', entry, `A case is an object with ${KEYS.join(', ')}`);
    return { faults };
  }
  const { kind, basis } = namedIn(entry, fault);
  const values = mergedValues(entry, fault);
  if (kind === undefined || basis === undefined) return { faults };
  const angles = anglesIn(entry.angle) ?? { from: 0, to: 0 };
  const sense = (entry.sense as Sense | undefined) ?? kind.senses[0] ?? 'tension';
  const factors = basis.hasPartialFactors ? (entry.factors as Partial<PartialFactors>) : undefined;
  return { faults, named: { kind, basis, values, angles, sense, factors } };
}

function namedIn(
  given: Given,
  fault: Fault,
): { kind?: DetailKind | undefined; basis?: BasisInfo | undefined } {
  for (const key of Object.keys(given)) {
    if (!KEYS.includes(key)) {
      fault(key, given[key], `A case has no such entry; accepted are ${KEYS.join(', ')}`);
    }
  }
  const kind = typeof given.kind === 'string' ? findKind(given.kind) : undefined;
  if (kind === undefined) fault('kind', given.kind, `Must be one of ${kinds.map(({ id }) => id).join(', ')}`);
  const basis = typeof given.basis === 'string' ? findBasis(given.basis) : undefined;
  if (basis === undefined) {
    fault('basis', given.basis, `Must be one of ${bases.map(({ id }) => id).join(', ')}`);
  }
  if (anglesIn(given.angle) === undefined) {
    const accepted =
      'Must be a load angle from -180 to 180 degrees, or a band of them as { "from": 0, "to": 15 }';
    fault('angle', given.angle, accepted);
  }
  const senses: readonly unknown[] = kind?.senses ?? ['tension', 'compression'];
  if (given.sense !== undefined && !senses.includes(given.sense))
    fault('sense', given.sense, `Must be one of ${senses.join(', ')}`);
  checkFactors(given, basis, fault);
  return { kind, basis };
}

/** One angle, or a band whose ends are in order; undefined for anything else. */
function anglesIn(given: unknown): NamedCase['angles'] | undefined {
  const isAngle = (value: unknown): value is number => typeof value === 'number' && Math.abs(value) <= 180;
  if (isAngle(given)) return { from: given, to: given };
  if (!isObject(given) || Object.keys(given).some((key) => key !== 'from' && key !== 'to')) return undefined;
  const { from, to } = given;
  return isAngle(from) && isAngle(to) && from <= to ? { from, to } : undefined;
}

type Fault = (field: string, value: unknown, message: string) => void;

/** A basis that has its factors in the standard takes none from a case: to ignore them would mislead. */
function checkFactors(given: Given, basis: BasisInfo | undefined, fault: Fault): void {
  if (given.factors !== undefined && basis !== undefined && !basis.hasPartialFactors) {
    fault('factors', given.factors, `${basis.short} has its factors in the standard; leave them out`);
  }
}

/** Options are parameters too, kept apart by those who like to; a name may not stand in both. */
function mergedValues(given: Given, fault: Fault): ParameterValues {
  const { parameters = {}, options = {} } = given;
  if (!isObject(parameters)) fault('parameters', parameters, 'Must be an object of names and values');
  if (!isObject(options)) fault('options', options, 'Must be an object of names and values');
  if (!isObject(parameters) || !isObject(options)) return {};
  for (const name of Object.keys(options)) {
    if (Object.hasOwn(parameters, name)) {
      fault(`options.${name}`, options[name], 'Stands in parameters as well; give it once');
    }
  }
  return { ...parameters, ...options } as ParameterValues;
}

function isObject(value: unknown): value is Given {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A given value, short enough to repeat; what is missing is null, as JSON has it. */
function brief(value: unknown): unknown {
  if (value === undefined) return null;
  if (typeof value === 'string') return value.length > 80 ? `${value.slice(0, 80)}…` : value;
  if (typeof value === 'number') return Number.isFinite(value) ? value : String(value);
  if (typeof value === 'object' && value !== null) return Array.isArray(value) ? 'a list' : 'an object';
  return value;
}
