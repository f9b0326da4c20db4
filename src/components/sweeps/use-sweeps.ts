import type { Sweep } from '@shared/contracts/revisions.ts';
import { computed, onScopeDispose, watch } from 'vue';
import { fetchSweeps } from '../../api/sweeps.ts';
import { useLoad } from '../../composables/use-load.ts';
import { isLive } from './progress.ts';

const WHILE_LIVE = 1_000;
const OTHERWISE = 10_000;

/** The queue, asked for again every second while something in it runs, and now and then otherwise. */
export function useSweeps() {
  const { data, error, loading, reload } = useLoad((signal) => fetchSweeps(signal));
  const sweeps = computed<readonly Sweep[] | null>(() => data.value?.sweeps ?? null);
  let timer: ReturnType<typeof setTimeout> | undefined;

  watch(loading, (now) => {
    clearTimeout(timer);
    if (now) return;
    timer = setTimeout(() => void reload(), sweeps.value?.some(isLive) ? WHILE_LIVE : OTHERWISE);
  });
  onScopeDispose(() => clearTimeout(timer));
  return { sweeps, error, reload };
}
