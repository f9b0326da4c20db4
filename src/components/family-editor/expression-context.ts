import { findBasis } from '@shared/engine/index.ts';
import { familyRuleId } from '@shared/engine/sweep/index.ts';
import type { BasisId, DetailKind, EngineCatalogue } from '@shared/engine/types.ts';
import { type NameInfo, scopeOf } from '@shared/expressions/index.ts';
import { computed, type ComputedRef, inject, type InjectionKey, provide, type Ref } from 'vue';
import { upTo } from '../../composables/format.ts';
import type { FamilyDraft } from './draft.ts';
import type { ReadDraft } from './read-draft.ts';
import type { usePreview } from './use-preview.ts';

/** What the expressions of a form may use, and what they come to for the sample variant. */
export interface ExpressionContext {
  readonly names: ComputedRef<readonly NameInfo[]>;
  /** The value of a derived parameter in words, or why it has none; null while the form is not complete. */
  derived(name: string, unit: string): string | null;
  /** Whether a rule holds for the sample variant, in words; null while that is not known. */
  rule(index: number): string | null;
}

const key: InjectionKey<ExpressionContext> = Symbol('expressions');
const none: ExpressionContext = { names: computed(() => []), derived: () => null, rule: () => null };

interface Sources {
  readonly kind: Ref<DetailKind>;
  readonly draft: FamilyDraft;
  readonly read: Ref<ReadDraft>;
  readonly catalogue: Ref<EngineCatalogue | null>;
  readonly live: ReturnType<typeof usePreview>;
}

/** Lays the context ready for the fields of the form. */
export function provideExpressions({ kind, draft, read, catalogue, live }: Sources): void {
  const names = computed(() => {
    if (!catalogue.value) return [];
    const basis = (findBasis(draft.basis)?.id ?? draft.basis) as BasisId;
    const chosen = { basis, parameters: read.value.settings };
    return [...scopeOf(kind.value, catalogue.value, chosen).values()];
  });
  const sample = () => (live.held.value ? null : live.preview.value);
  const rejections = () => {
    const preview = sample();
    return preview?.ok ? preview.detail.rejections : (preview?.rejections ?? []);
  };

  provide(key, {
    names,
    derived(name, unit) {
      const preview = sample();
      if (!preview) return null;
      const value = preview.values[name];
      if (typeof value === 'number') return `= ${upTo(value, 3)}${unit && ` ${unit}`} in the sample variant`;
      return rejections()[0]?.message ?? null;
    },
    rule(index) {
      const broken = rejections().find(({ rule }) => rule === familyRuleId(index));
      if (broken) return `Not so in the sample variant: ${broken.message}`;
      return sample()?.ok ? 'Holds for the sample variant.' : null;
    },
  });
}

export const useExpressions = (): ExpressionContext => inject(key, none);
