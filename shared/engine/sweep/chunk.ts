import { toRadians } from '../numeric/units.ts';
import {
  type DetailKind,
  type EngineCatalogue,
  NOT_COVERED,
  NOT_PERMITTED,
  type PreparedDetail,
  type Sense,
} from '../types.ts';
import { hasExpressions, variantValues } from './grid.ts';
import { roundDown } from './rounding.ts';
import { RULE_CODE, ruleLegend } from './rule-legend.ts';
import type { SweepDefinition, SweepGrid } from './types.ts';
import { prepareVariant } from './variant.ts';

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
  // Without its expressions a derived parameter would silently have its default.
  if (hasExpressions(definition) !== (grid.formulas !== null))
    throw new Error('The grid was laid out without the expressions of the definition');
  const legend = ruleLegend(kind, definition.rules);
  const chunk = emptyChunk(grid, firstOrdinal, variantCount, legend.length);
  const sweeper = new VariantSweeper(kind, grid, definition.increment, chunk, legend);
  for (let index = 0; index < variantCount; index++) {
    const given = variantValues(grid, firstOrdinal + index);
    const variant = prepareVariant(definition, kind, grid.formulas, catalogue, given);
    if (variant.ok) sweeper.sweep(index, variant.detail);
    else sweeper.reject(index, variant.rule);
  }
  return chunk;
}

function emptyChunk(
  grid: SweepGrid,
  firstOrdinal: number,
  variantCount: number,
  ruleCount: number,
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
    rejected: new Uint32Array(ruleCount),
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
    legend: readonly { readonly id: string }[],
  ) {
    this.out = new Float64Array(kind.limitStates.length);
    this.angles = Float64Array.from(grid.angles, toRadians);
    this.rules = new Map(legend.map(({ id }, index) => [id, index]));
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

  reject(index: number, rule: string): void {
    const perVariant = this.grid.senses.length * this.angles.length;
    for (let cell = index * perVariant; cell < (index + 1) * perVariant; cell++) this.mark(cell, rule);
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
