import type { ResultAxes } from '@shared/contracts/revisions.ts';
import { decimalsOf, degrees, fixed, upTo } from '../../composables/format.ts';
import { cellIndex, NOT_LOADED, type Cells } from './cells.ts';
import { placesOf, type Dimension } from './dimensions.ts';
import type { CellPlace } from './layout.ts';

type LimitState = ResultAxes['limitStates'][number];
type Rule = ResultAxes['rules'][number];

/** What one cell holds, as it is shown. */
export type CellReading =
  | { readonly status: 'waiting' }
  | { readonly status: 'capacity'; readonly capacity: number; readonly governing: LimitState }
  | { readonly status: 'rejected'; readonly rule: Rule | null };

export function readCell(
  cells: Cells,
  axes: Pick<ResultAxes, 'limitStates' | 'rules' | 'increment'>,
  { ordinal, angle }: CellPlace,
  sense: number,
): CellReading {
  const index = cellIndex(cells, ordinal, sense, angle);
  const code = cells.governing[index] ?? NOT_LOADED;
  if (code === NOT_LOADED) return { status: 'waiting' };
  if (code < 0) return { status: 'rejected', rule: axes.rules[-1 - code] ?? null };
  const governing = axes.limitStates[code];
  const stored = cells.capacity[index] ?? NaN;
  if (!governing || Number.isNaN(stored)) return { status: 'rejected', rule: null };
  // Single precision is undone to the decimals that the value was rounded down to.
  const capacity = Number(stored.toFixed(decimalsOf(axes.increment)));
  return { status: 'capacity', capacity, governing };
}

/** The text of a cell: digits to the decimals of the increment, or a dash. */
export function cellText(reading: CellReading, increment: number): string {
  if (reading.status === 'waiting') return '';
  return reading.status === 'capacity' ? fixed(reading.capacity, decimalsOf(increment)) : '—';
}

/** The cell in words: capacity and governing limit state, or the rule that rejects it. */
export function spokenReading(reading: CellReading, increment: number): string {
  if (reading.status === 'waiting') return 'loading';
  if (reading.status === 'rejected') return `not permitted: ${reading.rule?.title ?? 'no rule is named'}`;
  const { code, title } = reading.governing;
  return `${cellText(reading, increment)} kN, ${title} (${code}) governs`;
}

/** The sizes of a variant: one line a swept parameter. */
export function variantLines(dimensions: readonly Dimension[], ordinal: number) {
  const places = placesOf(dimensions, ordinal);
  return dimensions
    .filter(({ stride }) => stride > 0)
    .map(({ name, label, symbol, unit, titles }) => {
      const value = titles[places[name] ?? 0] ?? '';
      return { name, label, symbol, value: unit ? `${value} ${unit}` : value };
    });
}

export const angleTitle = (axes: Pick<ResultAxes, 'angles'>, place: number): string =>
  degrees(axes.angles[place] ?? 0);

/** What a variant weighs and takes to make. `mass` in kg, `weldVolume` in mm3. */
export interface Quantities {
  readonly mass: number;
  readonly boltCount: number;
  readonly weldVolume: number;
}

/** The quantities as lines, weld metal in cm3. A variant that cannot be made has none. */
export const quantityLines = ({ mass, boltCount, weldVolume }: Quantities) => [
  { label: 'Mass of the plate', value: Number.isNaN(mass) ? '—' : `${upTo(mass, 2)} kg` },
  { label: 'Bolts', value: String(boltCount) },
  { label: 'Weld volume', value: Number.isNaN(weldVolume) ? '—' : `${upTo(weldVolume / 1000, 1)} cm³` },
];
