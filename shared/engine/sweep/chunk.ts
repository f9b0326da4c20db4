import { toRadians } from '../numeric/units.ts';
import {
  type DetailKind,
  type EngineCatalogue,
  NOT_COVERED,
  NOT_PERMITTED,
  type PreparedDetail,
  type Sense,
} from '../types.ts';
import { variantValues } from './grid.ts';
import { roundDown } from './rounding.ts';
import type { SweepDefinition, SweepGrid } from './types.ts';

/** Packed governing codes: an index of a limit state, or this less the index of a rule. */
export const RULE_CODE = 255;

/** Rules that are not a kind's own: the load angle is not covered, or a field of this one variant is at fault. */
const GENERAL_RULES = [
  { id: 'not-covered', title: 'Load angle not covered by the kind' },
  { id: 'field-fault', title: 'Parameters that contradict each other' },
] as const;

/** The legend of rejected cells, fixed for a kind so that codes do not depend on what is swept. */
export function ruleLegend(kind: DetailKind): readonly { readonly id: string; readonly title: string }[] {
  return [...kind.rules, ...GENERAL_RULES];
}

/** The packed results of some whole variants; a variant's cells lie together, senses outside, angles inside. */
export interface SweptChunk {
  readonly firstOrdinal: number;
  readonly variantCount: number;
  /** kN, rounded down to the increment; NaN where a cell has no capacity. */
  readonly capacities: Float32Array;
  readonly governing: Uint8Array;
  /** kg, number, mm3 per variant; NaN where a field of the variant is at fault. */
  readonly mass: Float64Array;
  readonly boltCount: Uint32Array;
  readonly weldVolume: Float64Array;
  /** Cells each rule of the legend rejects. */
  readonly rejected: Uint32Array;
}

/** Works out the variants `firstOrdinal` to `firstOrdinal + variantCount - 1`. Deterministic to the bit. */
export function sweepChunk(
  definition: SweepDefinition,
  kind: DetailKind,
  grid: SweepGrid,
  catalogue: EngineCatalogue,
  firstOrdinal: number,
  variantCount: number,
): SweptChunk {
  const chunk = emptyChunk(kind, grid, firstOrdinal, variantCount);
  const sweeper = new VariantSweeper(kind, grid, definition.increment, chunk);
  for (let index = 0; index < variantCount; index++) {
    const values = variantValues(grid, firstOrdinal + index);
    const prepared = kind.prepare(values, definition.basis, catalogue, definition.factors);
    if (prepared.ok) sweeper.sweep(index, prepared.detail);
    else sweeper.reject(index);
  }
  return chunk;
}

function emptyChunk(
  kind: DetailKind,
  grid: SweepGrid,
  firstOrdinal: number,
  variantCount: number,
): SweptChunk {
  const cells = variantCount * grid.senses.length * grid.angles.length;
  return {
    firstOrdinal,
    variantCount,
    capacities: new Float32Array(cells).fill(NaN),
    governing: new Uint8Array(cells),
    mass: new Float64Array(variantCount).fill(NaN),
    boltCount: new Uint32Array(variantCount),
    weldVolume: new Float64Array(variantCount).fill(NaN),
    rejected: new Uint32Array(ruleLegend(kind).length),
  };
}

/** Fills a chunk variant by variant; allocates nothing for a cell that has a capacity. */
class VariantSweeper {
  private readonly out: Float64Array;
  private readonly angles: Float64Array;
  private readonly rules: ReadonlyMap<string, number>;

  constructor(
    kind: DetailKind,
    private readonly grid: SweepGrid,
    private readonly increment: number,
    private readonly chunk: SweptChunk,
  ) {
    this.out = new Float64Array(kind.limitStates.length);
    this.angles = Float64Array.from(grid.angles, toRadians);
    this.rules = new Map(ruleLegend(kind).map(({ id }, index) => [id, index]));
  }

  sweep(index: number, detail: PreparedDetail): void {
    const { chunk, angles, grid } = this;
    chunk.mass[index] = detail.quantities.mass;
    chunk.boltCount[index] = detail.quantities.boltCount;
    chunk.weldVolume[index] = detail.quantities.weldVolume;
    let cell = index * grid.senses.length * angles.length;
    for (const sense of grid.senses) {
      for (let angle = 0; angle < angles.length; angle++) this.fill(cell++, detail, angles[angle]!, sense);
    }
  }

  reject(index: number): void {
    const perVariant = this.grid.senses.length * this.angles.length;
    for (let cell = index * perVariant; cell < (index + 1) * perVariant; cell++)
      this.mark(cell, 'field-fault');
  }

  private fill(cell: number, detail: PreparedDetail, theta: number, sense: Sense): void {
    const { chunk, out } = this;
    const governing = detail.at(theta, sense, out);
    if (governing >= 0) {
      chunk.capacities[cell] = roundDown(out[governing]!, this.increment);
      chunk.governing[cell] = governing;
    } else if (governing === NOT_COVERED) this.mark(cell, 'not-covered');
    else if (governing === NOT_PERMITTED) this.mark(cell, firstRule(detail, theta, sense));
  }

  private mark(cell: number, rule: string): void {
    const index = this.rules.get(rule);
    if (index === undefined) throw new Error(`The kind does not list its rule "${rule}"`);
    this.chunk.governing[cell] = RULE_CODE - index;
    this.chunk.rejected[index]!++;
  }
}

function firstRule(detail: PreparedDetail, theta: number, sense: Sense): string {
  const lasting = detail.rejections[0];
  if (lasting !== undefined) return lasting.rule;
  const outcome = detail.outcome(theta, sense);
  return outcome.status === 'not-permitted' ? (outcome.rejections[0]?.rule ?? 'not-covered') : 'not-covered';
}
