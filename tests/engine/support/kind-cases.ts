import fc from 'fast-check';
import {
  type BasisId,
  bases,
  type DetailKind,
  findKind,
  type KindId,
  numberForms,
  type ParameterSpec,
  type ParameterValues,
  type Sense,
} from '@shared/engine/index.ts';
import { cleatValues } from './angle-cleats.ts';
import { gussetValues } from './arbitrary.ts';
import { endPlateValues } from './end-plate-values.ts';
import { finPlateValues } from './fin-plate-values.ts';

/** One call of the engine, as a script could make it: any values, any angle. */
export interface KindCase {
  readonly kind: KindId;
  readonly basis: BasisId;
  readonly values: Readonly<Record<string, unknown>>;
  readonly degrees: number;
  readonly sense: Sense;
}

const valuesOfKind: Readonly<Record<KindId, (wide: boolean) => fc.Arbitrary<ParameterValues>>> = {
  'gusset-plate': gussetValues,
  'fin-plate': finPlateValues,
  'angle-cleats': cleatValues,
  'end-plate': endPlateValues,
};

/** What a form, a file or a script can hold where a number or a name belongs. */
const hostile = fc.constantFrom<unknown>(
  NaN,
  Infinity,
  -Infinity,
  0,
  -0,
  -1,
  1e-300,
  1e300,
  Number.MAX_SAFE_INTEGER,
  2.5,
  '',
  '12',
  'NaN',
  '__proto__',
  'S355; DROP TABLE families',
  'x'.repeat(100_000),
  null,
  true,
  [],
  [12],
  {},
  { fy: NaN, fu: NaN },
  { fy: 355 },
  { d: 20, stressArea: 0 },
  { d: 0, stressArea: 0 },
  { fyb: 640, fub: -800 },
  { shape: 'angle', longLeg: 100, shortLeg: 100, thickness: 60 },
  { shape: 'i', depth: 100, width: 100, webThickness: 5, flangeThickness: 50 },
);

/** Details that keep more rules than a random one, so that capacities are tried as well as rejections. */
const waived = {
  fit_checks: 'waived',
  practice_rules: 'waived',
  weld_size: 'as_designed',
  exposure: 'sheltered',
};

function waivedOf({ parameters }: DetailKind): ParameterValues {
  const known = Object.entries(waived).filter(([name, value]) =>
    parameters.some((spec) => spec.name === name && spec.choices?.some((choice) => choice.value === value)),
  );
  return Object.fromEntries(known);
}

type Form = keyof typeof numberForms;

function byNumbers(form: Form): fc.Arbitrary<Record<string, unknown>> {
  const entries = numberForms[form].map(({ name, minimum, maximum }) => {
    return [name, fc.double({ min: minimum, max: maximum, noNaN: true })] as const;
  });
  const required = numberForms[form].filter((field) => !('optional' in field) || field.optional !== true);
  return fc
    .record(Object.fromEntries(entries), { requiredKeys: required.map(({ name }) => name) })
    .map((numbers) => (['angle', 'i', 'flat'].includes(form) ? { shape: form, ...numbers } : numbers));
}

/** A material or section by numbers of its form: often contradictory, which is a fault of its field. */
function numbersFor(spec: ParameterSpec): fc.Arbitrary<unknown> | undefined {
  if (spec.type === 'section')
    return fc.oneof(...(spec.shapes ?? (['angle', 'flat', 'i'] as const)).map(byNumbers));
  return spec.type in numberForms ? byNumbers(spec.type as Form) : undefined;
}

/** One to three fields, each with a value of `arbitrary`; none where the kind has no such field. */
function someOf(
  fields: readonly (readonly [string, fc.Arbitrary<unknown>])[],
): fc.Arbitrary<ParameterValues> {
  const one = fc.constantFrom(...fields).chain(([name, value]) => fc.tuple(fc.constant(name), value));
  return fc
    .array(one, { minLength: 1, maxLength: 3 })
    .map((entries) => Object.fromEntries(entries) as ParameterValues);
}

/** Angles of the kind's range, its ends and the axes, and some beyond it. */
function degreesOf({ angleRange: { minimum, maximum } }: DetailKind): fc.Arbitrary<number> {
  const within = fc.double({ min: minimum, max: maximum, noNaN: true });
  const special = fc.constantFrom(
    minimum,
    maximum,
    0,
    -0,
    90,
    -90,
    180,
    1e-9,
    91,
    -135,
    NaN,
    Infinity,
    1e300,
  );
  return fc.oneof({ weight: 6, arbitrary: within }, { weight: 1, arbitrary: special });
}

/**
 * Calls of one kind in every basis: values that make sense together, the whole of every range, materials by numbers,
 * and values that belong nowhere.
 */
export function kindCases(id: KindId): fc.Arbitrary<KindCase> {
  const kind = findKind(id);
  if (kind === undefined) throw new Error(`there is no kind ${id}`);
  const materials = kind.parameters.flatMap((spec) => {
    const numbers = numbersFor(spec);
    return numbers === undefined ? [] : [[spec.name, numbers] as const];
  });
  const likely = valuesOfKind[id](false);
  const eased = likely.map((values) => ({ ...values, ...waivedOf(kind) }));
  const anyField = [...kind.parameters.map(({ name }) => name), 'colour', 'constructor'];
  const overlaid = (changes: fc.Arbitrary<ParameterValues>) =>
    fc.tuple(eased, changes).map(([values, change]) => ({ ...values, ...change }));
  const values = fc.oneof(
    { weight: 4, arbitrary: eased },
    { weight: 2, arbitrary: likely },
    { weight: 2, arbitrary: valuesOfKind[id](true) },
    { weight: 3, arbitrary: overlaid(someOf(materials)) },
    { weight: 1, arbitrary: overlaid(someOf(anyField.map((name) => [name, hostile] as const))) },
  );
  return fc.record({
    kind: fc.constant(id),
    basis: fc.constantFrom(...bases.map((basis) => basis.id)),
    values,
    degrees: degreesOf(kind),
    sense: fc.constantFrom<Sense>('tension', 'compression'),
  });
}
