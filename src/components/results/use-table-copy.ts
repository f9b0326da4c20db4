import type { ResultAxes } from '@shared/contracts/revisions.ts';
import type { Ref } from 'vue';
import { count } from '../../composables/format.ts';
import { useTask } from '../../composables/use-task.ts';
import { useNoticesStore } from '../../stores/notices.ts';
import { blockOf } from './cells.ts';
import { copyText } from './copy-text.ts';
import type { Layout, Table } from './layout.ts';
import { cellText, readCell } from './reading.ts';
import { tsvOf, type Bounds } from './selection.ts';
import type { useCells } from './use-cells.ts';

/** So many cells go to the clipboard at once; the whole of a larger table is for the export. */
const MOST = 250_000;

/** Copies cells with their headings as tab-separated text; blocks that are not there yet are loaded first. */
export function useTableCopy(
  store: ReturnType<typeof useCells>,
  axes: ResultAxes,
  table: Ref<Table>,
  layout: Ref<Layout>,
) {
  const notices = useNoticesStore();
  const sense = () => Math.max(0, axes.senses.indexOf(layout.value.sense));

  return useTask(async (bounds: Bounds) => {
    const rows = bounds.bottom - bounds.top + 1;
    const columns = bounds.right - bounds.left + 1;
    if (rows * columns > MOST)
      throw new Error(`${count(rows * columns)} cells are too many to copy; at most ${count(MOST)} are.`);
    const blocks = new Set<number>();
    for (let row = bounds.top; row <= bounds.bottom; row++)
      for (let column = bounds.left; column <= bounds.right; column++)
        blocks.add(blockOf(store.cells, table.value.placeOf(row, column).ordinal));
    if (!(await store.whenLoaded([...blocks]))) throw store.error.value;
    const text = tsvOf(table.value, bounds, `Capacity in kN, ${layout.value.sense}`, (row, column) => {
      const reading = readCell(store.cells, axes, table.value.placeOf(row, column), sense());
      return reading.status === 'capacity' ? cellText(reading, axes.increment) : 'not permitted';
    });
    await copyText(text);
    notices.say(
      rows * columns === 1
        ? 'The cell is copied.'
        : `${count(rows * columns)} cells are copied, with their headings.`,
    );
  });
}
