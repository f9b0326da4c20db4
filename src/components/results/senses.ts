import type { Sense } from '@shared/engine/types.ts';

export const SENSES: readonly { readonly value: Sense; readonly title: string }[] = [
  { value: 'tension', title: 'Tension' },
  { value: 'compression', title: 'Compression' },
];
