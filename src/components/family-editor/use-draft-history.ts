import { computed, onScopeDispose, ref, shallowRef, watch } from 'vue';
import type { FamilyDraft } from './draft.ts';

/** Steps that are kept; typing on within a short while is one step. */
const MOST_STEPS = 200;
const PAUSE = 500;

/**
 * Undo and redo over the whole form. A step ends when nothing was changed for a moment, so that a number typed digit by digit
 * is one step.
 */
export function useDraftHistory(draft: FamilyDraft, take: (draft: FamilyDraft) => void) {
  const steps = shallowRef<readonly string[]>([JSON.stringify(draft)]);
  const place = ref(0);
  let timer: ReturnType<typeof setTimeout> | undefined;

  /** Ends the step that is being typed. */
  function settle(): void {
    clearTimeout(timer);
    timer = undefined;
    const now = JSON.stringify(draft);
    if (now === steps.value[place.value]) return;
    steps.value = [...steps.value.slice(0, place.value + 1), now].slice(-MOST_STEPS);
    place.value = steps.value.length - 1;
  }

  function go(to: number): void {
    const step = steps.value[to];
    if (step === undefined) return;
    place.value = to;
    take(JSON.parse(step) as FamilyDraft);
  }

  watch(
    () => JSON.stringify(draft),
    () => {
      clearTimeout(timer);
      timer = setTimeout(settle, PAUSE);
    },
  );
  onScopeDispose(() => clearTimeout(timer));

  const pending = computed(() => JSON.stringify(draft) !== steps.value[place.value]);
  return {
    canUndo: computed(() => place.value > 0 || pending.value),
    canRedo: computed(() => place.value < steps.value.length - 1 && !pending.value),
    undo() {
      settle();
      go(place.value - 1);
    },
    redo() {
      settle();
      go(place.value + 1);
    },
  };
}
