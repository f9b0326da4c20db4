import type { Sense } from '@shared/engine/types.ts';
import type { LocationQuery, LocationQueryRaw } from 'vue-router';
import type { CellPlace, Layout } from './layout.ts';

/** What the address of the page holds, so that a link shows what the sender saw. */
export interface ResultsAddress {
  readonly layout: Partial<Layout>;
  readonly cell: CellPlace | null;
  readonly heat: boolean;
}

const text = (value: LocationQuery[string] | undefined) => (typeof value === 'string' ? value : '');
const list = (value: LocationQuery[string] | undefined) => text(value).split(',').filter(Boolean);
const isSense = (value: string): value is Sense => value === 'tension' || value === 'compression';

function cellOf(value: string): CellPlace | null {
  const found = /^(\d{1,9})\.(\d{1,4})$/.exec(value);
  return found ? { ordinal: Number(found[1]), angle: Number(found[2]) } : null;
}

/** Reads an address; whatever it says that cannot be read is left out. */
export function readAddress(query: LocationQuery): ResultsAddress {
  const pairs = list(query.pick).flatMap((pair) => {
    const [, name = '', place] = /^([\w-]+):(\d{1,4})$/.exec(pair) ?? [];
    return place === undefined ? [] : [[name, Number(place)] as const];
  });
  const sense = text(query.sense);
  return {
    layout: {
      ...(query.down === undefined ? {} : { down: list(query.down) }),
      ...(query.across === undefined ? {} : { across: text(query.across) }),
      ...(isSense(sense) ? { sense } : {}),
      picked: Object.fromEntries(pairs),
    },
    cell: cellOf(text(query.cell)),
    heat: query.heat !== 'off',
  };
}

/** Writes an address; the usual things are left out of it by the caller. */
export function writeAddress(layout: Layout, cell: CellPlace | null, heat: boolean): LocationQueryRaw {
  const pick = Object.entries(layout.picked).map(([name, place]) => `${name}:${place}`);
  return {
    down: layout.down.join(','),
    across: layout.across,
    sense: layout.sense,
    ...(pick.length ? { pick: pick.join(',') } : {}),
    ...(heat ? {} : { heat: 'off' }),
    ...(cell ? { cell: `${cell.ordinal}.${cell.angle}` } : {}),
  };
}
