import { computed, shallowRef } from 'vue';
import { ProblemError } from '../api/problem.ts';

/** Runs something that the person asked for, once at a time, and keeps what went wrong. */
export function useTask<Arguments extends unknown[], Answer>(work: (...given: Arguments) => Promise<Answer>) {
  const busy = shallowRef(false);
  const error = shallowRef<unknown>(null);

  async function run(...given: Arguments): Promise<Answer | undefined> {
    if (busy.value) return undefined;
    busy.value = true;
    error.value = null;
    try {
      return await work(...given);
    } catch (fault) {
      error.value = fault;
      return undefined;
    } finally {
      busy.value = false;
    }
  }

  /** The faults of one field, for its error messages; matched by the last part of the path. */
  const faults = computed(() => (error.value instanceof ProblemError ? error.value.faults : []));
  const faultsOf = (field: string): string[] =>
    faults.value
      .filter((fault) => fault.field === field || fault.field.endsWith(`.${field}`))
      .map((fault) => fault.message);

  return { run, busy, error, faultsOf, clear: () => (error.value = null) };
}
