import type { NameInfo } from '@shared/expressions/index.ts';
import { computed, nextTick, ref, type Ref, shallowRef } from 'vue';
import { completionAt, written, type Completion, type Offer } from './offers.ts';

/** The list of what may be written at the caret of a text field, and its keys. */
export function useCompletion(
  field: Readonly<Ref<HTMLTextAreaElement | null>>,
  text: Ref<string>,
  names: () => readonly NameInfo[],
) {
  const completion = shallowRef<Completion | null>(null);
  const active = ref(0);
  const offers = computed(() => completion.value?.offers ?? []);

  /** What stands in the field; the model follows only when the form is drawn again. */
  const typed = () => field.value?.value ?? text.value;

  /** Looks again at what stands before the caret. */
  function look(asked = false): void {
    const caret = field.value?.selectionStart ?? typed().length;
    completion.value = completionAt(typed(), caret, names(), asked);
    active.value = 0;
  }
  function close(): void {
    completion.value = null;
  }
  async function take(offer: Offer | undefined): Promise<void> {
    if (!offer || !completion.value) return;
    const after = written(typed(), completion.value, offer);
    text.value = after.text;
    close();
    await nextTick();
    field.value?.focus();
    field.value?.setSelectionRange(after.caret, after.caret);
  }

  const move = (by: number) => {
    active.value = (active.value + by + offers.value.length) % offers.value.length;
  };

  /** Keys while the list is open; returns whether the key is used up. */
  function keyInList(key: string): boolean {
    if (key === 'ArrowDown') move(1);
    else if (key === 'ArrowUp') move(-1);
    else if (key === 'Enter') void take(offers.value[active.value]);
    else if (key === 'Escape') close();
    else return false;
    return true;
  }

  function onKey(event: KeyboardEvent): void {
    if (event.isComposing) return;
    const wanted = event.key === ' ' && event.ctrlKey;
    if (wanted) look(true);
    // An expression is one line: Enter never breaks it.
    if (wanted || (offers.value.length > 0 && keyInList(event.key)) || event.key === 'Enter')
      event.preventDefault();
  }

  return { offers, active, look, close, take, onKey };
}
