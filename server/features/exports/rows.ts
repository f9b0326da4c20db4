import type { Sense } from '@shared/engine/index.ts';
import type { App } from '../../context.ts';
import type { HeaderValue, TableCell, TableRow } from '../../documents/xlsx/types.ts';
import {
  cellsOf,
  placeOfSense,
  readCells,
  type StoredCells,
  type SweptRevision,
} from '../results/service.ts';
import { cellAt, combinations, type Dimension, type Place, type TableLayout } from './layout.ts';
import { shownValue } from './wording.ts';

/** Cells read before they are written. */
const CELLS_AT_ONCE = 2000;

/** Reads the rows of one sheet from what is stored, some at a time. */
export class SheetRows {
  private readonly across: readonly Place[];
  private readonly first: number;

  constructor(
    private readonly app: App,
    private readonly swept: SweptRevision,
    private readonly layout: TableLayout,
    private readonly codes: readonly string[],
    private readonly sheet: Place,
    sense: Sense,
  ) {
    this.across = [...combinations([layout.across])];
    this.first = placeOfSense(swept, sense) * swept.angles.length;
  }

  async *read(): AsyncGenerator<TableRow> {
    const atOnce = Math.max(1, Math.floor(CELLS_AT_ONCE / this.across.length));
    let waiting: Place[] = [];
    for (const down of combinations(this.layout.down)) {
      waiting.push(down);
      if (waiting.length < atOnce) continue;
      yield* await this.readSome(waiting);
      waiting = [];
    }
    if (waiting.length > 0) yield* await this.readSome(waiting);
  }

  private async readSome(downs: readonly Place[]): Promise<TableRow[]> {
    const rows = downs.map((down) => ({
      labels: this.layout.down.map((dimension) => this.label(dimension, down)),
      places: this.across.map((across) => this.locate({ ...down, ...across })),
    }));
    const ordinals = new Set(rows.flatMap(({ places }) => places.map(({ ordinal }) => ordinal)));
    const stored = await readCells(this.app, this.swept.row.id, [...ordinals]);
    const byOrdinal = new Map(stored.map((variant) => [variant.ordinal, variant]));
    return rows.map(({ labels, places }) => ({
      labels,
      cells: places.map(({ ordinal, angle }) => this.cell(byOrdinal.get(ordinal), ordinal, angle)),
    }));
  }

  private locate(place: Place) {
    return cellAt(this.swept, { ...this.layout.heldPlace, ...this.sheet, ...place });
  }

  private label(dimension: Dimension, place: Place): HeaderValue {
    return shownValue(this.swept, dimension.name, dimension.values[place[dimension.name] ?? 0] ?? '');
  }

  private cell(stored: StoredCells | undefined, ordinal: number, angle: number): TableCell {
    if (!stored) throw new Error(`Revision ${this.swept.row.id} has no variant ${ordinal}`);
    const { capacity: capacities, governing } = cellsOf(
      stored,
      this.first + angle,
      1,
      this.swept.summary.increment,
    );
    const capacity = capacities[0] ?? null;
    const code = governing[0] ?? -1;
    if (capacity === null) return { capacity: null, rule: -code };
    return { capacity, code: this.codes[code] ?? `limit state ${code}` };
  }
}
