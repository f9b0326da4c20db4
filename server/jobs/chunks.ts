/** Cells that are computed and stored as one piece: small enough to lose, large enough to be quick. */
const CELLS = 40_000;
/** Variants in one piece: each is a row. */
const MOST_VARIANTS = 1000;

export interface ChunkPlan {
  readonly number: number;
  readonly firstOrdinal: number;
  readonly variantCount: number;
}

/** Cuts a grid into runs of whole variants. */
export function planChunks(variantCount: number, cellCount: number): ChunkPlan[] {
  const perVariant = cellCount / variantCount;
  const size = Math.max(1, Math.min(MOST_VARIANTS, Math.floor(CELLS / perVariant)));
  return Array.from({ length: Math.ceil(variantCount / size) }, (_, number) => ({
    number,
    firstOrdinal: number * size,
    variantCount: Math.min(size, variantCount - number * size),
  }));
}
