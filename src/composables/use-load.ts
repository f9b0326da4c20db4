import { onScopeDispose, shallowRef, watch, type WatchSource } from 'vue';
import { isAbort } from '../api/problem.ts';

/**
 * Loads something now and whenever a source changes. A newer request aborts the older one, so answers never cross.
 * The last good data stay while the next load runs.
 */
export function useLoad<T>(load: (signal: AbortSignal) => Promise<T>, sources: WatchSource[] = []) {
  const data = shallowRef<T | null>(null);
  const error = shallowRef<unknown>(null);
  const loading = shallowRef(false);
  let running: AbortController | undefined;

  async function reload(): Promise<void> {
    running?.abort();
    const mine = (running = new AbortController());
    loading.value = true;
    try {
      const answer = await load(mine.signal);
      if (mine !== running) return;
      data.value = answer;
      error.value = null;
    } catch (fault) {
      if (mine === running && !isAbort(fault)) error.value = fault;
    } finally {
      if (mine === running) loading.value = false;
    }
  }

  if (sources.length) watch(sources, () => void reload());
  onScopeDispose(() => running?.abort());
  void reload();
  return { data, error, loading, reload };
}
