import type { ResultAxes } from '@shared/contracts/revisions.ts';
import { onScopeDispose, shallowRef } from 'vue';
import { fetchCells } from '../../api/results.ts';
import { isAbort } from '../../api/problem.ts';
import { boundsOf, emptyCells, fillCells } from './cells.ts';

/** Up to so many cells are all loaded; of a larger revision only what is looked at. */
export const ALL_UP_TO = 400_000;
const AT_ONCE = 3;

/** Loads the cells of a revision in blocks: first what is asked for, then the rest. */
export function useCells(revisionId: number, axes: ResultAxes) {
  const cells = emptyCells(axes);
  /** Counts up with every loaded block; whoever draws cells reads it. */
  const filled = shallowRef(0);
  const error = shallowRef<unknown>(null);
  const stop = new AbortController();
  const asked = new Set<number>();
  const all = cells.capacity.length <= ALL_UP_TO ? cells.loaded.length : 0;
  let queue: number[] = Array.from({ length: all }, (_, block) => block);
  let waiting: (() => void)[] = [];

  async function fetchBlock(block: number): Promise<void> {
    asked.add(block);
    try {
      const { from, count } = boundsOf(cells, block);
      fillCells(cells, await fetchCells(revisionId, from, count, stop.signal));
      filled.value++;
    } catch (fault) {
      if (isAbort(fault)) return;
      error.value = fault;
      queue.unshift(block);
    } finally {
      asked.delete(block);
    }
    const told = waiting;
    waiting = [];
    for (const tell of told) tell();
    proceed();
  }

  function proceed(): void {
    while (!error.value && asked.size < AT_ONCE) {
      const block = queue.shift();
      if (block === undefined) return;
      if (!cells.loaded[block] && !asked.has(block)) void fetchBlock(block);
    }
  }

  /** Brings blocks to the head of the queue. */
  function need(blocks: Iterable<number>): void {
    const missing = [...new Set(blocks)].filter((block) => !cells.loaded[block] && !asked.has(block));
    if (missing.length === 0) return;
    queue = [...missing, ...queue.filter((block) => !missing.includes(block))];
    proceed();
  }

  /** Resolves to true when all the blocks are there, to false when one could not be loaded. */
  async function whenLoaded(blocks: readonly number[]): Promise<boolean> {
    need(blocks);
    while (!error.value && blocks.some((block) => !cells.loaded[block]))
      await new Promise<void>((resolve) => waiting.push(resolve));
    return !error.value;
  }

  function retry(): void {
    error.value = null;
    proceed();
  }

  onScopeDispose(() => stop.abort());
  proceed();
  return { cells, filled, error, need, whenLoaded, retry };
}
