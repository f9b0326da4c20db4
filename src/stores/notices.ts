import { defineStore } from 'pinia';
import { readonly, shallowRef } from 'vue';

export type Tone = 'good' | 'bad' | 'plain';
export interface Notice {
  readonly id: number;
  readonly text: string;
  readonly tone: Tone;
}

/** A short sentence that says what has just happened; the newest takes the place of the one before. */
export const useNoticesStore = defineStore('notices', () => {
  const current = shallowRef<Notice | null>(null);
  let last = 0;

  function say(text: string, tone: Tone = 'good'): void {
    current.value = { id: ++last, text, tone };
  }

  function dismiss(): void {
    current.value = null;
  }

  return { current: readonly(current), say, dismiss };
});
