import type { EngineCatalogue } from '@shared/engine/types.ts';
import { defineStore } from 'pinia';
import { shallowRef } from 'vue';
import { fetchCatalogue } from '../api/catalogue.ts';

/** The reference data that the engine computes with in the browser; asked for once. */
export const useCatalogueStore = defineStore('catalogue', () => {
  const catalogue = shallowRef<EngineCatalogue | null>(null);
  let asked: Promise<EngineCatalogue> | undefined;

  function load(): Promise<EngineCatalogue> {
    asked ??= fetchCatalogue()
      .then((answer) => (catalogue.value = answer))
      .catch((error: unknown) => {
        asked = undefined;
        throw error;
      });
    return asked;
  }

  return { catalogue, load };
});
