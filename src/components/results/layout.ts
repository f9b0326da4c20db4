import type { Sense } from '@shared/engine/types.ts';
import { ANGLE, type Dimension } from './dimensions.ts';

/** How the person has laid the table out. */
export interface Layout {
  /** One or more dimensions down the side, the last fastest. */
  readonly down: readonly string[];
  readonly across: string;
  /** Of every other dimension, the place of the chosen value. */
  readonly picked: Readonly<Record<string, number>>;
  readonly sense: Sense;
}

export interface CellPlace {
  readonly ordinal: number;
  /** Place of the load angle. */
  readonly angle: number;
}

/** A laid-out table: its size, its headings, and where each of its cells stands. */
export interface Table {
  readonly rows: number;
  readonly columns: number;
  readonly down: readonly Dimension[];
  readonly across: Dimension;
  /** Dimensions with one chosen value. */
  readonly rest: readonly Dimension[];
  placeOf(row: number, column: number): CellPlace;
  /** Row and column of a cell, or null where the table does not show it. */
  find(place: CellPlace): { row: number; column: number } | null;
  /** Titles of a row, one a dimension down. */
  rowTitles(row: number): string[];
}

/** Every size down the side, the load angles across. */
export function usualLayout(dimensions: readonly Dimension[], sense: Sense): Layout {
  const swept = dimensions.filter(({ name }) => name !== ANGLE).map(({ name }) => name);
  if (swept.length) return { down: swept, across: ANGLE, picked: {}, sense };
  return { down: [ANGLE], across: '', picked: {}, sense };
}

/** A layout that these dimensions allow; what does not fit is left out, and something always stands down. */
export function fittingLayout(layout: Layout, dimensions: readonly Dimension[]): Layout {
  const names = dimensions.map(({ name }) => name);
  const across = names.includes(layout.across) ? layout.across : '';
  const down = [...new Set(layout.down)].filter((name) => names.includes(name) && name !== across);
  const first = names.find((name) => name !== across) ?? names[0] ?? ANGLE;
  const sides = down.length ? down : [first];
  const picked = Object.fromEntries(
    dimensions
      .filter(({ name }) => name !== across && !sides.includes(name))
      .map(({ name, titles }) => [name, clamp(layout.picked[name] ?? 0, titles.length)]),
  );
  return { down: sides, across: sides.includes(across) ? '' : across, picked, sense: layout.sense };
}

const clamp = (place: number, size: number) => Math.min(Math.max(0, Math.trunc(place) || 0), size - 1);
const one: Dimension = { name: '', label: 'Capacity', symbol: '', unit: 'kN', titles: [''], stride: 0 };

/** Puts the dimensions in their places. The layout must be a fitting one. */
export function tableOf(layout: Layout, dimensions: readonly Dimension[]): Table {
  const byName = new Map(dimensions.map((dimension) => [dimension.name, dimension]));
  const down = layout.down.flatMap((name) => byName.get(name) ?? []);
  const across = byName.get(layout.across) ?? one;
  const rest = dimensions.filter(({ name }) => name !== across.name && !layout.down.includes(name));
  const placesOfRow = (row: number): number[] => {
    let left = row;
    return down
      .toReversed()
      .map(({ titles }) => {
        const place = left % titles.length;
        left = Math.floor(left / titles.length);
        return place;
      })
      .toReversed();
  };
  const rows = down.reduce((product, { titles }) => product * titles.length, 1);
  return {
    rows,
    columns: across.titles.length,
    down,
    across,
    rest,
    placeOf(row, column) {
      const places = placesOfRow(row);
      const given: [Dimension, number][] = [
        ...down.map((dimension, at): [Dimension, number] => [dimension, places[at] ?? 0]),
        ...rest.map((dimension): [Dimension, number] => [dimension, layout.picked[dimension.name] ?? 0]),
        [across, column],
      ];
      const ordinal = given.reduce((sum, [{ stride }, place]) => sum + stride * place, 0);
      return { ordinal, angle: given.find(([{ name }]) => name === ANGLE)?.[1] ?? 0 };
    },
    find(place) {
      const at = (dimension: Dimension) => indexIn(dimension, place);
      const hidden = rest.some((dimension) => at(dimension) !== (layout.picked[dimension.name] ?? 0));
      if (hidden) return null;
      const row = down.reduce((sum, dimension) => sum * dimension.titles.length + at(dimension), 0);
      return row < rows ? { row, column: at(across) } : null;
    },
    rowTitles: (row) => placesOfRow(row).map((place, at) => down[at]?.titles[place] ?? ''),
  };
}

function indexIn({ name, stride, titles }: Dimension, { ordinal, angle }: CellPlace): number {
  if (name === ANGLE) return angle;
  return stride > 0 ? Math.floor(ordinal / stride) % titles.length : 0;
}
