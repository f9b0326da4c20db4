import { defineComponent, h, nextTick, ref, type Ref } from 'vue';
import { describe, expect, it, vi } from 'vitest';
import CapacityGrid from '../../src/components/results/CapacityGrid.vue';
import { dimensionsOf } from '../../src/components/results/dimensions.ts';
import { tableOf, usualLayout } from '../../src/components/results/layout.ts';
import type { CellReading } from '../../src/components/results/reading.ts';
import type { Selection, Spot } from '../../src/components/results/selection.ts';
import { mountInApp } from '../support/client/mount.ts';

const axis = { name: 'pitch', label: 'Pitch', symbol: 'p', unit: 'mm' };
const values = Array.from({ length: 5000 }, (_, at) => 60 + at);
const dimensions = dimensionsOf({ axes: [{ ...axis, values }], angles: [-30, 0, 30] }, 'gusset-plate');
const table = tableOf(usualLayout(dimensions, 'tension'), dimensions);
const governing = { id: 'bolt-shear', code: 'BS', title: 'Bolt shear', part: 'bolt', clause: '13.12' };
const rule = { rule: 'pitch', title: 'Pitch too small', clause: '22.3.1', cells: 1 };

function read({ row, column }: Spot): CellReading {
  if (row === 0 && column === 0) return { status: 'rejected', rule };
  return { status: 'capacity', capacity: 100 + row + column, governing };
}

async function gridWith() {
  const home = { row: 0, column: 0 };
  const selection: Ref<Selection> = ref({ anchor: home, focus: home });
  const [choose, copy] = [vi.fn(), vi.fn()];
  const props = {
    table,
    read,
    increment: 1,
    colours: new Map(),
    heat: null,
    filled: 1,
    label: 'Capacities',
    reading: 'reading',
    'onUpdate:modelValue': (next: Selection) => (selection.value = next),
    onChoose: choose,
    onCopy: copy,
  };
  const Holder = defineComponent({
    setup: () => () => h(CapacityGrid, { ...props, modelValue: selection.value }),
  });
  await mountInApp(Holder);
  await nextTick();
  const grid = document.querySelector<HTMLElement>('[role="grid"]');
  if (!grid) throw new Error('There is no grid');
  const press = async (key: string, more: KeyboardEventInit = {}) => {
    const target = grid.querySelector('[tabindex="0"]') ?? grid;
    target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...more }));
    await nextTick();
    await nextTick();
  };
  return { grid, press, selection, choose, copy };
}
const cells = (grid: Element) => [...grid.querySelectorAll('[role="gridcell"]')];

describe('the capacity table', () => {
  it('tells its whole size and puts only a part of it into the page', async () => {
    const { grid } = await gridWith();
    expect(grid.getAttribute('aria-rowcount')).toBe('5002');
    expect(grid.getAttribute('aria-colcount')).toBe('4');
    expect(grid.querySelectorAll('[role="row"]').length).toBeLessThan(40);
    const first = grid.querySelector('[aria-rowindex="3"]');
    expect(first?.querySelector('[role="rowheader"]')?.textContent).toBe('60');
    expect(first?.querySelector('[aria-colindex="3"]')?.textContent).toContain('101');
  });

  it('has the unit in the heading and not in the cells', async () => {
    const { grid } = await gridWith();
    const headings = [...grid.querySelectorAll('[role="columnheader"]')].map((one) => one.textContent);
    expect(headings.join(' ')).toMatch(/capacities in kN.*Pitch\s+p mm/);
    expect(cells(grid).some((cell) => cell.textContent?.includes('kN'))).toBe(false);
  });

  it('marks a rejected cell and names its rule', async () => {
    const { grid } = await gridWith();
    expect(cells(grid)[0]?.textContent).toContain('—');
    expect(cells(grid)[0]?.getAttribute('aria-label')).toBe('not permitted: Pitch too small');
  });

  it('has one cell in the tab order, moved by the arrows', async () => {
    const { grid, press } = await gridWith();
    await press('ArrowRight');
    await press('ArrowDown');
    const inOrder = grid.querySelectorAll('[role="gridcell"][tabindex="0"]');
    expect(inOrder.length).toBe(1);
    expect(document.activeElement).toBe(inOrder[0]);
    expect(inOrder[0]?.textContent).toContain('102');
  });

  it('selects with shift, and keeps the focus in the page at the far end', async () => {
    const { grid, press, selection } = await gridWith();
    await press('End', { ctrlKey: true, shiftKey: true });
    expect(selection.value).toEqual({ anchor: { row: 0, column: 0 }, focus: { row: 4999, column: 2 } });
    expect(document.activeElement?.closest('[role="row"]')?.getAttribute('aria-rowindex')).toBe('5002');
    expect(cells(grid).every((cell) => cell.getAttribute('aria-selected') === 'true')).toBe(true);
  });

  it('chooses by Enter and copies by Ctrl+C', async () => {
    const { press, choose, copy } = await gridWith();
    await press('ArrowDown');
    await press('Enter');
    await press('c', { ctrlKey: true });
    expect(choose).toHaveBeenCalledWith({ row: 1, column: 0 });
    expect(copy).toHaveBeenCalledOnce();
  });
});
