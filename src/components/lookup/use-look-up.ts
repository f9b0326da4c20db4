import type { LookupAnswer } from '@shared/contracts/lookup.ts';
import { computed, onScopeDispose, ref, shallowRef, watch } from 'vue';
import { useRoute, useRouter } from 'vue-router';
import { lookUp } from '../../api/lookup.ts';
import { isAbort } from '../../api/problem.ts';
import {
  fittingQuestion,
  readQuestion,
  requestOf,
  writeQuestion,
  type LookUpDetail,
  type Question,
} from './question.ts';

/** Typing rests for so long before it is asked, ms. */
const REST = 150;

/** Asks as the person types. A newer question aborts the older one; an answer never stands beside another question. */
export function useLookUp(details: readonly LookUpDetail[]) {
  const route = useRoute();
  const router = useRouter();
  const asked = ref<Question>(fitting(readQuestion(route.query)));
  const answer = shallowRef<LookupAnswer | null>(null);
  const error = shallowRef<unknown>(null);
  const busy = ref(false);
  let timer: ReturnType<typeof setTimeout> | undefined;
  let running: AbortController | undefined;

  const detail = computed(() => details.find(({ code }) => code === asked.value.code) ?? null);
  const question = computed({ get: () => asked.value, set: (next) => (asked.value = fitting(next)) });
  const request = computed(() => detail.value && requestOf(asked.value, detail.value));

  function fitting(wanted: Question): Question {
    const found = details.find(({ code }) => code === wanted.code);
    return found ? fittingQuestion(wanted, found) : { ...wanted, code: '', places: {} };
  }

  async function ask(): Promise<void> {
    clearTimeout(timer);
    running?.abort();
    const body = request.value;
    if (!body) return;
    const mine = (running = new AbortController());
    try {
      const found = await lookUp(body, mine.signal);
      if (mine !== running) return;
      answer.value = found;
      error.value = null;
    } catch (fault) {
      if (mine !== running || isAbort(fault)) return;
      error.value = fault;
      answer.value = null;
    }
    busy.value = false;
  }

  watch(
    request,
    (body, before) => {
      running?.abort();
      clearTimeout(timer);
      busy.value = body !== null;
      // Another detail's number must not be read as this one's, not even for a moment.
      if (body?.revisionId !== before?.revisionId) answer.value = null;
      if (body) timer = setTimeout(() => void ask(), before ? REST : 0);
      else answer.value = null;
    },
    { immediate: true },
  );
  watch(asked, (now) => void router.replace({ query: writeQuestion(now) }));
  onScopeDispose(() => {
    clearTimeout(timer);
    running?.abort();
  });

  return { question, detail, answer, error, busy, ask };
}
