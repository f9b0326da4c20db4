import type { ResultAxes, ResultBlock } from '@shared/contracts/revisions.ts';

/** Governing code of a cell that has not been loaded. */
export const NOT_LOADED = -32768;
const CELLS_IN_BLOCK = 20_000;
const VARIANTS_IN_BLOCK = 20_000;

/** The cells of a revision as flat columns, filled block by block. */
export interface Cells {
  readonly senses: number;
  readonly angles: number;
  readonly variants: number;
  /** Whole variants in a block. */
  readonly blockSize: number;
  readonly loaded: Uint8Array;
  /** kN; NaN where a cell has none. */
  readonly capacity: Float32Array;
  /** Place of the limit state, -1 - k for rule k, or NOT_LOADED. */
  readonly governing: Int16Array;
  readonly mass: Float32Array;
  readonly boltCount: Uint16Array;
  readonly weldVolume: Float32Array;
}

export function emptyCells({
  variants,
  senses,
  angles,
}: Pick<ResultAxes, 'variants' | 'senses' | 'angles'>): Cells {
  const each = senses.length * angles.length;
  const blockSize = Math.min(VARIANTS_IN_BLOCK, Math.max(1, Math.floor(CELLS_IN_BLOCK / each)));
  return {
    senses: senses.length,
    angles: angles.length,
    variants,
    blockSize,
    loaded: new Uint8Array(Math.ceil(variants / blockSize)),
    capacity: new Float32Array(variants * each).fill(NaN),
    governing: new Int16Array(variants * each).fill(NOT_LOADED),
    mass: new Float32Array(variants),
    boltCount: new Uint16Array(variants),
    weldVolume: new Float32Array(variants),
  };
}

/** Puts a loaded block in its place. */
export function fillCells(cells: Cells, block: ResultBlock): void {
  const first = block.from * cells.senses * cells.angles;
  cells.capacity.set(
    Float32Array.from(block.capacity, (value) => value ?? NaN),
    first,
  );
  cells.governing.set(block.governing, first);
  cells.mass.set(block.mass, block.from);
  cells.boltCount.set(block.boltCount, block.from);
  cells.weldVolume.set(block.weldVolume, block.from);
  cells.loaded[Math.floor(block.from / cells.blockSize)] = 1;
}

/** Where a cell stands in the flat columns. */
export const cellIndex = (cells: Cells, ordinal: number, sense: number, angle: number): number =>
  (ordinal * cells.senses + sense) * cells.angles + angle;

export const blockOf = (cells: Cells, ordinal: number): number => Math.floor(ordinal / cells.blockSize);

/** First ordinal and count of a block. */
export function boundsOf(cells: Cells, block: number): { from: number; count: number } {
  const from = block * cells.blockSize;
  return { from, count: Math.min(cells.blockSize, cells.variants - from) };
}
