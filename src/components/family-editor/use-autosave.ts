import { onScopeDispose, watch, type Ref } from 'vue';

/** Milliseconds without a change after which the draft is saved. */
const QUIET = 3000;

/**
 * Saves a draft by itself when nothing was typed for a while. `may` says whether it can be: complete, without faults, and not
 * at the cost of a sweep.
 */
export function useAutosave(changes: Ref<unknown>, may: () => boolean, save: () => Promise<unknown>): void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  watch(changes, () => {
    clearTimeout(timer);
    timer = setTimeout(() => {
      if (may()) void save();
    }, QUIET);
  });
  onScopeDispose(() => clearTimeout(timer));
}
