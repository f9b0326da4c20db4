import type {
  AngleSection,
  BoltGrade,
  BoltSize,
  Electrode,
  FlatSection,
  ISection,
  ParameterType,
  Steel,
} from '../types.ts';

/** One number of a value given by its numbers instead of by a catalogue name. */
export interface NumberField {
  readonly name: string;
  readonly minimum: number;
  readonly maximum: number;
  readonly optional?: boolean;
}

const field = (name: string, minimum: number, maximum: number, optional = false): NumberField => ({
  name,
  minimum,
  maximum,
  optional,
});

/** The forms that a value by numbers can take; the section's is chosen by its shape. mm, mm2, MPa. */
export const forms = {
  steel: [field('fy', 100, 1000), field('fu', 150, 1500)],
  boltSize: [field('d', 5, 100), field('stressArea', 5, 8000)],
  boltGrade: [field('fyb', 100, 1500), field('fub', 200, 2000)],
  electrode: [field('xu', 200, 1200)],
  angle: [
    field('longLeg', 20, 500),
    field('shortLeg', 20, 500),
    field('thickness', 2, 80),
    field('rootRadius', 0, 60, true),
    field('area', 20, 100_000, true),
    field('centroidLong', 1, 500, true),
    field('centroidShort', 1, 500, true),
  ],
  i: [
    field('depth', 50, 2500),
    field('width', 20, 1200),
    field('webThickness', 2, 100),
    field('flangeThickness', 2, 200),
    field('rootRadius', 0, 80, true),
    field('area', 100, 500_000, true),
  ],
  flat: [field('width', 10, 2000), field('thickness', 2, 200), field('area', 20, 400_000, true)],
} as const satisfies Record<string, readonly NumberField[]>;

export type ObjectRead = { readonly value: object } | { readonly fault: string };

/** Reads a value given by its numbers, e.g. `{ fy: 355, fu: 490 }`. The fault says what is accepted. */
export function readObject(type: ParameterType, given: Readonly<Record<string, unknown>>): ObjectRead {
  switch (type) {
    case 'steel':
      return build(given, forms.steel, ['name'], (n) => checkOrder<Steel>(n, 'fy', 'fu'));
    case 'boltSize':
      return build(given, forms.boltSize, ['name'], checkBoltSize);
    case 'boltGrade':
      return build(given, forms.boltGrade, ['name'], (n) => checkOrder<BoltGrade>(n, 'fyb', 'fub'));
    case 'electrode':
      return build(given, forms.electrode, ['name'], (n) => ({ value: n as unknown as Electrode }));
    case 'section':
      return readSection(given);
    default:
      return { fault: 'a plain value is accepted here, not an object' };
  }
}

function readSection(given: Readonly<Record<string, unknown>>): ObjectRead {
  if (given['shape'] === 'angle') return build(given, forms.angle, ['name', 'shape'], checkAngle);
  if (given['shape'] === 'flat') return build(given, forms.flat, ['name', 'shape'], checkFlat);
  if (given['shape'] === 'i') return build(given, forms.i, ['name', 'shape'], checkI);
  return { fault: 'a section by numbers needs shape "angle", "flat" or "i"' };
}

type Numbers = Readonly<Record<string, number>>;

function build(
  given: Readonly<Record<string, unknown>>,
  fields: readonly NumberField[],
  words: readonly string[],
  finish: (numbers: Numbers) => ObjectRead,
): ObjectRead {
  const accepted = fields
    .map(({ name, optional }) => (optional === true ? `${name} (optional)` : name))
    .join(', ');
  const unknown = Object.keys(given).find(
    (key) => !words.includes(key) && !fields.some(({ name }) => name === key),
  );
  if (unknown !== undefined)
    return { fault: `"${unknown.slice(0, 40)}" is not known here; accepted: ${accepted}` };
  const numbers: Record<string, number> = {};
  for (const { name, minimum, maximum, optional } of fields) {
    const value = Object.hasOwn(given, name) ? given[name] : undefined;
    if (value === undefined && optional === true) continue;
    if (typeof value !== 'number' || !(value >= minimum && value <= maximum)) {
      return { fault: `${name} must be a number from ${minimum} to ${maximum}; accepted: ${accepted}` };
    }
    numbers[name] = value;
  }
  const read = finish(numbers);
  if ('fault' in read) return read;
  const name =
    typeof given['name'] === 'string' && given['name'] !== '' ? given['name'].slice(0, 60) : 'by numbers';
  return { value: { name, ...read.value } };
}

function checkOrder<T>(numbers: Numbers, yieldName: string, tensileName: string): ObjectRead {
  if ((numbers[tensileName] ?? 0) < (numbers[yieldName] ?? 0)) {
    return { fault: `${tensileName} must not be below ${yieldName}` };
  }
  return { value: numbers as T & object };
}

function checkBoltSize(numbers: Numbers): ObjectRead {
  const { d = 0, stressArea = 0 } = numbers;
  const shank = (Math.PI * d * d) / 4;
  if (stressArea > shank)
    return { fault: `stressArea must not exceed the shank area ${shank.toFixed(1)} mm²` };
  return { value: { d, stressArea } satisfies Omit<BoltSize, 'name'> };
}

/** An area below this share of what the lengths give is a slip of the pen, not a rounding of a table. */
const LEAST_SHARE = 0.9;

/** Share of the square of a radius that a root fillet adds to a corner. */
const CORNER = 1 - Math.PI / 4;

function checkAngle(numbers: Numbers): ObjectRead {
  const { longLeg = 0, shortLeg = 0, thickness = 0, rootRadius = 0 } = numbers;
  if (shortLeg > longLeg) return { fault: 'shortLeg must not exceed longLeg' };
  if (2 * thickness + rootRadius > shortLeg) return { fault: 'thickness and rootRadius leave no leg' };
  // Toe radii half the root radius, as EN 10056-1 angles have.
  const computed = (longLeg + shortLeg - thickness) * thickness + (CORNER * rootRadius * rootRadius) / 2;
  const { area = computed } = numbers;
  if (area > (longLeg + shortLeg) * thickness * 1.1) return { fault: 'area exceeds what the legs can hold' };
  if (area < LEAST_SHARE * computed) return { fault: smallArea('the legs', computed) };
  const { centroidLong, centroidShort } = numbers;
  if ((centroidLong ?? 0) >= shortLeg || (centroidShort ?? 0) >= longLeg) {
    return { fault: 'centroidLong must lie within the short leg and centroidShort within the long leg' };
  }
  const value: Omit<AngleSection, 'name'> = {
    shape: 'angle',
    longLeg,
    shortLeg,
    thickness,
    rootRadius,
    area,
    ...(centroidLong === undefined ? {} : { centroidLong }),
    ...(centroidShort === undefined ? {} : { centroidShort }),
  };
  return { value };
}

function smallArea(parts: string, area: number): string {
  return `area is below what ${parts} give; about ${area.toFixed(0)} mm² is accepted`;
}

function checkFlat(numbers: Numbers): ObjectRead {
  const { width = 0, thickness = 0 } = numbers;
  if (thickness > width) return { fault: 'thickness must not exceed width' };
  const { area = width * thickness } = numbers;
  if (area > width * thickness * 1.001) return { fault: 'area exceeds width times thickness' };
  if (area < LEAST_SHARE * width * thickness) {
    return { fault: smallArea('width times thickness', width * thickness) };
  }
  return { value: { shape: 'flat', width, thickness, area } satisfies Omit<FlatSection, 'name'> };
}

function checkI(numbers: Numbers): ObjectRead {
  const { depth = 0, width = 0, webThickness = 0, flangeThickness = 0, rootRadius = 0 } = numbers;
  if (webThickness > width) return { fault: 'webThickness must not exceed width' };
  const web = depth - 2 * flangeThickness;
  if (web <= 2 * rootRadius) return { fault: 'flangeThickness and rootRadius leave no web' };
  const computed = 2 * width * flangeThickness + web * webThickness + 4 * CORNER * rootRadius * rootRadius;
  const { area = computed } = numbers;
  if (area > computed * 1.1) return { fault: 'area exceeds what web and flanges can hold' };
  if (area < LEAST_SHARE * computed) return { fault: smallArea('web and flanges', computed) };
  const value: Omit<ISection, 'name'> = {
    shape: 'i',
    depth,
    width,
    webThickness,
    flangeThickness,
    rootRadius,
    area,
  };
  return { value };
}
