import type { EngineCatalogue, PartialFactors, Sense } from '@shared/engine/types.ts';
import { computed, onScopeDispose, ref, shallowRef, watch, type Ref } from 'vue';
import type { DetailKind } from '@shared/engine/types.ts';
import { outcomeAt, previewOf, sampleValues, sweptOf, type Preview, type Sample } from './preview.ts';
import type { ReadDraft } from './read-draft.ts';

interface Sources {
  readonly kind: Ref<DetailKind>;
  readonly basis: Ref<string>;
  readonly read: Ref<ReadDraft>;
  readonly factors: Ref<PartialFactors>;
  readonly catalogue: Ref<EngineCatalogue | null>;
}

/** The sample variant, computed by the engine in the browser, at most once a frame. */
export function usePreview({ kind, basis, read, factors, catalogue }: Sources) {
  const sample = ref<Sample>({});
  const angle = ref(0);
  const sense = ref<Sense>('tension');
  const preview = shallowRef<Preview | null>(null);
  /** True while a fault in the form keeps the picture at the last complete entry. */
  const held = ref(false);
  let frame = 0;

  watch(kind, ({ senses }) => {
    if (!senses.includes(sense.value)) sense.value = senses[0] ?? 'tension';
  });

  const complete = computed(() => read.value.faults.every(({ field }) => /^(angles|senses)/.test(field)));

  function compute(): void {
    frame = 0;
    held.value = !complete.value;
    if (!catalogue.value || !complete.value) return;
    const values = sampleValues(read.value.settings, sample.value);
    const inputs = {
      kind: kind.value,
      basis: basis.value,
      catalogue: catalogue.value,
      factors: factors.value,
      formulas: read.value.formulas,
    };
    preview.value = previewOf(inputs, values, sense.value);
  }
  function soon(): void {
    frame ||= requestAnimationFrame(compute);
  }
  watch([kind, basis, read, factors, catalogue, sample, sense], soon, { immediate: true, deep: 1 });
  onScopeDispose(() => cancelAnimationFrame(frame));

  const swept = computed(() => sweptOf(kind.value, read.value.settings));
  const outcome = computed(() =>
    preview.value?.ok ? outcomeAt(preview.value.detail, angle.value, sense.value) : null,
  );
  const geometry = computed(() =>
    preview.value?.ok ? preview.value.detail.geometry((angle.value * Math.PI) / 180) : null,
  );
  return { sample, angle, sense, preview, held, swept, outcome, geometry };
}
