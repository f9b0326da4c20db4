import { findBasis, findKind, kinds } from '@shared/engine/index.ts';
import type { DetailKind } from '@shared/engine/types.ts';
import { computed, reactive, ref, toRaw, watch } from 'vue';
import { useCatalogueStore } from '../../stores/catalogue.ts';
import { isOfOtherKind, ofKind } from './change-kind.ts';
import { countsOf, refusalOf } from './counts.ts';
import type { FamilyDraft } from './draft.ts';
import { provideExpressions } from './expression-context.ts';
import { readDraft, type FieldFault } from './read-draft.ts';
import { usePreview } from './use-preview.ts';

/** The form of a family: what was typed, what it means, its size, and a live sample. */
export function useFamilyForm(start: FamilyDraft) {
  const draft = reactive(structuredClone(start)) as FamilyDraft;
  const saved = ref(JSON.stringify(start));
  const catalogues = useCatalogueStore();
  /** Faults that the server found, until the next save. */
  const serverFaults = ref<readonly FieldFault[]>([]);

  const kind = computed((): DetailKind => findKind(draft.kind) ?? (kinds[0] as DetailKind));
  const read = computed(() => readDraft(draft, kind.value, catalogues.catalogue));
  const faults = computed(() => [...read.value.faults, ...serverFaults.value]);
  const counts = computed(() => countsOf(read.value.settings, read.value.angles, draft.senses.length));
  const tooLarge = computed(() => refusalOf(counts.value));
  const changed = computed(() => JSON.stringify(draft) !== saved.value);
  const basis = computed(() => draft.basis);
  const factors = computed(() => {
    const own = findBasis(draft.basis)?.defaultFactors ?? { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 };
    return read.value.definition?.factors ?? own;
  });
  const live = usePreview({ kind, basis, read, factors, catalogue: computed(() => catalogues.catalogue) });

  provideExpressions({ kind, draft, read, live, catalogue: computed(() => catalogues.catalogue) });

  /** Lays another draft into the form. */
  function take(other: FamilyDraft): void {
    Object.assign(draft, structuredClone(other));
  }
  watch(
    () => draft.kind,
    (_now, before) => {
      const from = findKind(before);
      // A draft that was taken whole has its parameters already.
      if (from && isOfOtherKind(draft, kind.value)) take(ofKind(toRaw(draft), from, kind.value));
    },
    { flush: 'sync' },
  );

  /** What stands in the form now is what is stored. */
  function settle(): void {
    saved.value = JSON.stringify(draft);
    serverFaults.value = [];
  }

  return { draft, kind, read, faults, serverFaults, counts, tooLarge, changed, live, take, settle };
}

export type FamilyForm = ReturnType<typeof useFamilyForm>;
