import type { Me } from '@shared/contracts/auth.ts';
import { defineStore } from 'pinia';
import { computed, ref } from 'vue';
import * as auth from '../api/auth.ts';
import { ProblemError } from '../api/problem.ts';
import { sessionHint } from '../composables/session-hint.ts';

const NOBODY: Me['can'] = {
  defineFamilies: false,
  seeDrafts: false,
  exportTables: false,
  managePeople: false,
  readAudit: false,
};

/** Who is signed in, and what that person may do. */
export const useSessionStore = defineStore('session', () => {
  const me = ref<Me | null>(null);
  const can = computed(() => me.value?.can ?? NOBODY);
  let asked: Promise<void> | undefined;

  async function fetchWho(): Promise<void> {
    if (!sessionHint.isSet()) return;
    try {
      me.value = await auth.fetchMe();
    } catch (error) {
      if (!(error instanceof ProblemError) || error.status !== 401) throw error;
      me.value = null;
    }
  }

  /** Asks the server once who is here; later calls share the answer. */
  function ready(): Promise<void> {
    asked ??= fetchWho().catch((error: unknown) => {
      asked = undefined;
      throw error;
    });
    return asked;
  }

  async function signIn(email: string, password: string): Promise<void> {
    await auth.signIn({ email, password });
    sessionHint.set();
    me.value = await auth.fetchMe();
    asked = Promise.resolve();
  }

  function forget(): void {
    sessionHint.clear();
    me.value = null;
    asked = Promise.resolve();
  }

  async function signOut(): Promise<void> {
    await auth.signOut();
    forget();
  }

  return { me, can, ready, signIn, signOut, forget };
});
