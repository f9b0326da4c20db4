import { createHash } from 'node:crypto';
import { sweepChunk, variantValues } from '@shared/engine/sweep/index.ts';
import { canonicalJson } from '../canonical-json.ts';
import { engineCatalogue } from '../catalogue.ts';
import { layOut, type CheckedDefinition } from '../features/families/definition-service.ts';
import type { ChunkPlan } from './chunks.ts';

export interface ChunkTask extends ChunkPlan {
  /** Canonical JSON of the definition. */
  readonly definition: string;
}

/** A variant as it is stored. */
export interface PackedVariant {
  readonly ordinal: number;
  readonly params: Readonly<Record<string, unknown>>;
  readonly paramsHash: string;
  readonly mass: number;
  readonly boltCount: number;
  readonly weldVolume: number;
  readonly lowest: number | null;
  /** Float32 little-endian, kN. */
  readonly capacities: Uint8Array;
  readonly governing: Uint8Array;
}

let last: CheckedDefinition | undefined;

/** Runs in a worker thread: computes one chunk and packs it for storing. */
export default function sweepTask(task: ChunkTask): PackedVariant[] {
  if (last?.text !== task.definition) last = layOut(task.definition);
  const { definition, kind, grid } = last;
  const chunk = sweepChunk(definition, kind, grid, engineCatalogue(), task.firstOrdinal, task.variantCount);
  const perVariant = grid.cellCount / grid.variantCount;
  return Array.from({ length: task.variantCount }, (_, index) => {
    const ordinal = task.firstOrdinal + index;
    const values = variantValues(grid, ordinal);
    const params = Object.fromEntries(grid.axes.map(({ name }) => [name, values[name]]));
    const from = index * perVariant;
    const cells = chunk.capacities.slice(from, from + perVariant);
    return {
      ordinal,
      params,
      paramsHash: paramsHashOf(params),
      mass: finite(chunk.mass[index]!),
      boltCount: chunk.boltCount[index]!,
      weldVolume: finite(chunk.weldVolume[index]!),
      lowest: lowestOf(cells),
      capacities: new Uint8Array(cells.buffer),
      governing: chunk.governing.slice(from, from + perVariant),
    };
  });
}

/** Names a variant within its revision. */
export const paramsHashOf = (params: unknown): string =>
  createHash('sha256').update(canonicalJson(params)).digest('hex').slice(0, 32);

/** A variant with a field fault has no quantities; every one of its cells says so. */
const finite = (value: number): number => (Number.isFinite(value) ? value : 0);

function lowestOf(cells: Float32Array): number | null {
  let lowest = Infinity;
  for (const capacity of cells) if (capacity < lowest) lowest = capacity;
  return lowest === Infinity ? null : lowest;
}
