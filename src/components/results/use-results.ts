import type { ResultAxes, Revision } from '@shared/contracts/revisions.ts';
import { computed, ref, watch, type Ref } from 'vue';
import { useRoute, useRouter } from 'vue-router';
import { useNoticesStore } from '../../stores/notices.ts';
import { revisionWords } from '../../composables/title-strip.ts';
import { readAddress, writeAddress } from './address.ts';
import { blockOf } from './cells.ts';
import { copyText } from './copy-text.ts';
import { dimensionsOf } from './dimensions.ts';
import { fittingLayout, tableOf, usualLayout, type CellPlace, type Layout } from './layout.ts';
import { cellText, readCell } from './reading.ts';
import { boundsOfSelection, isOneCell, tsvOf, wholeTable, type Selection, type Spot } from './selection.ts';
import { ALL_UP_TO, useCells } from './use-cells.ts';

const start: Selection = { anchor: { row: 0, column: 0 }, focus: { row: 0, column: 0 } };

/** The state of the results page: layout, cells, selection and the chosen cell, all kept in the address. */
export function useResults(revision: Revision, axes: ResultAxes) {
  const route = useRoute();
  const router = useRouter();
  const notices = useNoticesStore();
  const dimensions = dimensionsOf(axes, revision.family.kind);
  const address = readAddress(route.query);
  const usual = usualLayout(dimensions, axes.senses[0] ?? 'tension');
  const picked = ref<Layout>(allowed({ ...usual, ...address.layout }));
  const heat = ref(address.heat);
  const place = ref<CellPlace | null>(address.cell && isIn(address.cell) ? address.cell : null);
  const { cells, filled, error, need, whenLoaded, retry } = useCells(revision.id, axes);

  const layout = computed({ get: () => picked.value, set: (next) => (picked.value = allowed(next)) });
  const table = computed(() => tableOf(picked.value, dimensions));
  const sense = computed(() => Math.max(0, axes.senses.indexOf(picked.value.sense)));
  const selection: Ref<Selection> = ref(selectionAt(place.value));

  function allowed(wanted: Layout): Layout {
    const sense = axes.senses.includes(wanted.sense) ? wanted.sense : usual.sense;
    return fittingLayout({ ...wanted, sense }, dimensions);
  }
  function isIn({ ordinal, angle }: CellPlace): boolean {
    return ordinal < axes.variants && angle < axes.angles.length;
  }
  function selectionAt(cell: CellPlace | null): Selection {
    const spot = cell && tableOf(picked.value, dimensions).find(cell);
    return spot ? { anchor: spot, focus: spot } : start;
  }

  watch(table, () => (selection.value = selectionAt(place.value)));
  watch([picked, place, heat], () => {
    void router.replace({ query: writeAddress(picked.value, place.value, heat.value) });
  });

  const readPlace = (at: CellPlace) => readCell(cells, axes, at, sense.value);
  /** Reads a cell of the table, and asks for its block where it is not there yet. */
  function read({ row, column }: Spot) {
    const at = table.value.placeOf(row, column);
    const reading = readPlace(at);
    if (reading.status === 'waiting') need([blockOf(cells, at.ordinal)]);
    return reading;
  }
  function choose({ row, column }: Spot): void {
    place.value = table.value.placeOf(row, column);
  }

  const name = `${revision.family.code} ${revisionWords(revision.letter)}`;
  const caption = computed(() => {
    const rest = table.value.rest.map(({ name, label, unit, titles }) =>
      `${label} ${titles[picked.value.picked[name] ?? 0]} ${unit}`.trim(),
    );
    const hash = revision.shortHash ? [`hash ${revision.shortHash}`] : [];
    return [name, picked.value.sense, ...rest, 'capacities in kN, rounded down', ...hash].join('; ');
  });
  async function copy(): Promise<void> {
    const bounds = isOneCell(selection.value) ? wholeTable(table.value) : boundsOfSelection(selection.value);
    const size = (bounds.bottom - bounds.top + 1) * (bounds.right - bounds.left + 1);
    if (size > ALL_UP_TO) {
      notices.say('That is too much to copy at once. Select fewer cells, or export the table.', 'bad');
      return;
    }
    const blocks = new Set<number>();
    for (let row = bounds.top; row <= bounds.bottom; row++)
      for (let column = bounds.left; column <= bounds.right; column++)
        blocks.add(blockOf(cells, table.value.placeOf(row, column).ordinal));
    if (!(await whenLoaded([...blocks]))) return;
    const textOf = (row: number, column: number) =>
      cellText(readPlace(table.value.placeOf(row, column)), axes.increment);
    await copyText(tsvOf(table.value, bounds, caption.value, textOf));
    notices.say(`${size} ${size === 1 ? 'cell' : 'cells'} copied.`);
  }

  return {
    dimensions,
    layout,
    table,
    heat,
    place,
    selection,
    cells,
    filled,
    error,
    retry,
    read,
    readPlace,
    choose,
    copy,
    caption,
  };
}
