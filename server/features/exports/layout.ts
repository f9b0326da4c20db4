import type { Fault } from '@shared/contracts/common.ts';
import { ANGLE_AXIS, type ExportRequest } from '@shared/contracts/exports.ts';
import type { ParameterValue } from '@shared/engine/index.ts';
import { ordinalOf } from '@shared/engine/sweep/index.ts';
import { problem } from '../../http/problems.ts';
import { nameParameter, sameValue, type SweptRevision, valueText } from '../results/service.ts';

/** Something a table can be laid out over: a swept parameter, or the load angle. */
export interface Dimension {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
  readonly values: readonly ParameterValue[];
}

/** The place of each dimension's value, by name. */
export type Place = Readonly<Record<string, number>>;

export interface TableLayout {
  readonly down: readonly Dimension[];
  readonly across: Dimension;
  readonly held: readonly Dimension[];
  /** Dimensions that make one sheet a value. */
  readonly sheets: readonly Dimension[];
  readonly heldPlace: Place;
}
type Request = Pick<ExportRequest, 'down' | 'across' | 'held'>;

export const MOST_SHEETS = 60;
export const MOST_CELLS = 500_000;

const ANGLE = { name: ANGLE_AXIS, label: 'Load angle', symbol: 'θ', unit: '°' };

/** Everything that must stand somewhere: the swept parameters and the load angle. */
export function dimensionsOf(swept: SweptRevision): readonly Dimension[] {
  const parameters = swept.axes.map(({ name, values }) => ({ ...nameParameter(swept, name), values }));
  return [...parameters, { ...ANGLE, values: swept.angles }];
}

/**
 * Lays a table out.
 * @throws {ProblemError} validation with every fault
 */
export function layOutTable(swept: SweptRevision, request: Request): TableLayout {
  const dimensions = dimensionsOf(swept);
  const faults = [...faultsOfNames(dimensions, request), ...faultsOfHeld(dimensions, request)];
  if (faults.length > 0) return problem('validation', { errors: faults });
  const byName = (name: string) => dimensions.find((dimension) => dimension.name === name)!;
  const standing = new Set([...request.down, request.across, ...Object.keys(request.held)]);
  const held = dimensions.filter(({ name }) => Object.hasOwn(request.held, name));
  const layout: TableLayout = {
    down: request.down.map(byName),
    across: byName(request.across),
    held,
    sheets: dimensions.filter(({ name }) => !standing.has(name)),
    heldPlace: Object.fromEntries(
      held.map(({ name, values }) => [
        name,
        values.findIndex((value) => sameValue(value, request.held[name])),
      ]),
    ),
  };
  refuseTooLarge(layout);
  return layout;
}

function faultsOfNames(dimensions: readonly Dimension[], { down, across, held }: Request): Fault[] {
  const given = [
    ...down.map((name, index) => ({ field: `down.${index}`, name })),
    { field: 'across', name: across },
    ...Object.keys(held).map((name) => ({ field: `held.${name}`, name })),
  ];
  const known = dimensions.map(({ name }) => name);
  const faults = given.flatMap(({ field, name }, index): Fault[] => {
    if (!known.includes(name)) {
      return [{ field, value: name, message: `It is not swept here; choose among ${known.join(', ')}.` }];
    }
    const first = given.findIndex((other) => other.name === name);
    return first < index
      ? [{ field, value: name, message: `It stands in ${given[first]!.field} already.` }]
      : [];
  });
  if (!given.some(({ name }) => name === ANGLE_AXIS)) {
    const message = 'The load angle goes down or across, or is held at one of its values.';
    faults.push({ field: `held.${ANGLE_AXIS}`, message });
  }
  return faults;
}

function faultsOfHeld(dimensions: readonly Dimension[], { held }: Request): Fault[] {
  return dimensions.flatMap(({ name, label, unit, values }) => {
    if (!Object.hasOwn(held, name) || values.some((value) => sameValue(value, held[name]))) return [];
    const message = `${label} must be one of ${values.map(valueText).join(', ')}${unit && ` ${unit}`}.`;
    return [{ field: `held.${name}`, value: held[name], message }];
  });
}

const product = (dimensions: readonly Dimension[]): number =>
  dimensions.reduce((count, { values }) => count * values.length, 1);

function refuseTooLarge({ down, across, sheets }: TableLayout): void {
  const count = product(sheets);
  const cells = count * product(down) * across.values.length;
  const names = sheets.map(({ label }) => label).join(', ');
  const errors: Fault[] = [];
  if (count > MOST_SHEETS) {
    const message = `${count} sheets, one for every combination of ${names}; at most ${MOST_SHEETS}. Hold some of them, or put them down.`;
    errors.push({ field: 'held', value: count, message });
  }
  if (cells > MOST_CELLS) {
    const message = `${cells.toLocaleString('en')} cells; at most ${MOST_CELLS.toLocaleString('en')} in one file. Hold more parameters.`;
    errors.push({ field: 'held', value: cells, message });
  }
  if (errors.length > 0) problem('validation', { errors });
}

/** Every combination of values, the last dimension fastest. */
export function* combinations(dimensions: readonly Dimension[]): Generator<Place> {
  const count = product(dimensions);
  for (let number = 0; number < count; number++) {
    let rest = number;
    const place: Record<string, number> = {};
    for (const { name, values } of [...dimensions].reverse()) {
      place[name] = rest % values.length;
      rest = Math.floor(rest / values.length);
    }
    yield place;
  }
}

/** Where a cell is stored: its variant, and its load angle among those swept. */
export function cellAt({ axes }: SweptRevision, place: Place): { ordinal: number; angle: number } {
  const indices = axes.map(({ name }) => place[name] ?? 0);
  return { ordinal: ordinalOf(axes, indices), angle: place[ANGLE_AXIS] ?? 0 };
}
