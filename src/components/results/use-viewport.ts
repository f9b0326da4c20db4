import { computed, onBeforeUnmount, onMounted, ref, type Ref } from 'vue';
import { COLUMN, HEAD, ROW } from './grid-measures.ts';
import type { Table } from './layout.ts';
import type { Spot } from './selection.ts';
import { scrollTo, windowOf } from './virtual-window.ts';

/** What of the table is seen: follows the scrolling and the size of the box. */
export function useViewport(table: Ref<Table>, headingWidth: Ref<number>) {
  const box = ref<HTMLElement | null>(null);
  const top = ref(0);
  const left = ref(0);
  const height = ref(0);
  const width = ref(0);
  /** True where the heading columns would fill half of a narrow screen; they then scroll with the rest. */
  const loose = computed(() => headingWidth.value > width.value);
  let observer: ResizeObserver | undefined;

  function measure(): void {
    if (!box.value) return;
    top.value = box.value.scrollTop;
    left.value = box.value.scrollLeft;
    height.value = Math.max(0, box.value.clientHeight - HEAD);
    width.value = Math.max(0, box.value.clientWidth - headingWidth.value);
  }
  onMounted(() => {
    observer = new ResizeObserver(measure);
    if (box.value) observer.observe(box.value);
    measure();
  });
  onBeforeUnmount(() => observer?.disconnect());

  const rows = computed(() => windowOf(top.value, height.value, ROW, table.value.rows, 6));
  const columns = computed(() => {
    const away = loose.value ? headingWidth.value : 0;
    const from = Math.max(0, left.value - away);
    return windowOf(from, width.value + away, COLUMN, table.value.columns, 3);
  });
  const firstRow = computed(() => rows.value.first);
  const endRow = computed(() => rows.value.end);
  const firstColumn = computed(() => columns.value.first);
  const endColumn = computed(() => columns.value.end);
  const page = computed(() => Math.max(1, Math.floor(height.value / ROW) - 1));

  function reveal({ row, column }: Spot): void {
    if (!box.value) return;
    box.value.scrollTop = scrollTo(row, box.value.scrollTop, height.value, ROW, table.value.rows);
    box.value.scrollLeft = scrollTo(column, box.value.scrollLeft, width.value, COLUMN, table.value.columns);
    measure();
  }
  return { box, top, height, firstRow, endRow, firstColumn, endColumn, page, loose, measure, reveal };
}
