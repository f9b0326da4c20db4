import { defineStore } from 'pinia';
import { computed, ref } from 'vue';

export type Tone = 'good' | 'bad' | 'plain';
export interface Notice {
  readonly id: number;
  readonly text: string;
  readonly tone: Tone;
}

/** Short sentences that say what has just happened, one after the other. */
export const useNoticesStore = defineStore('notices', () => {
  const waiting = ref<Notice[]>([]);
  const current = computed(() => waiting.value[0] ?? null);
  let last = 0;

  function say(text: string, tone: Tone = 'good'): void {
    waiting.value.push({ id: ++last, text, tone });
  }

  function dismiss(): void {
    waiting.value.shift();
  }

  return { current, say, dismiss };
});
