import type { DetailKind, KindId } from '../types.ts';
import { angleCleats } from './angle-cleats/index.ts';
import { endPlate } from './end-plate/index.ts';
import { finPlate } from './fin-plate/index.ts';
import { gussetPlate } from './gusset-plate/index.ts';

/** Every kind of detail. A new one is a folder and a line here. */
const registry: Readonly<Record<KindId, DetailKind>> = {
  'gusset-plate': gussetPlate,
  'fin-plate': finPlate,
  'end-plate': endPlate,
  'angle-cleats': angleCleats,
};

export const kinds: readonly DetailKind[] = Object.values(registry);

/** The kind of that name, or undefined when there is none. */
export function findKind(id: string): DetailKind | undefined {
  return kinds.find((kind) => kind.id === id);
}
