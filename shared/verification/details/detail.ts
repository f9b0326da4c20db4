import {
  type BasisId,
  type EngineCatalogue,
  findKind,
  kilonewtons,
  type KindId,
  type ParameterValues,
  type PreparedDetail,
  type Sense,
  toRadians,
} from '../../engine/index.ts';

/** Everything is given by its numbers, so that no record of the catalogue takes part. */
const nothing: EngineCatalogue = { boltSizes: [], boltGrades: [], steels: [], electrodes: [], sections: [] };

/** One whole detail at one load angle. */
export interface WholeDetail {
  /** A gusset plate where it is left out. */
  readonly kind?: KindId;
  readonly basis: BasisId;
  readonly values: ParameterValues;
  /** Degrees. */
  readonly angle: number;
  readonly sense: Sense;
}

function prepare({ kind = 'gusset-plate', basis, values }: WholeDetail): PreparedDetail {
  const prepared = findKind(kind)?.prepare({ electrode: { xu: 480 }, ...values }, basis, nothing);
  if (prepared === undefined || !prepared.ok) throw new Error(JSON.stringify(prepared?.faults));
  return prepared.detail;
}

/** Capacity of one limit state by its code, or of the whole detail for `R`, kN. */
export function capacityOf(whole: WholeDetail, code: string): number {
  const detail = prepare(whole);
  const out = new Float64Array(detail.limitStates.length);
  const governing = detail.at(toRadians(whole.angle), whole.sense, out);
  if (governing < 0) throw new Error(JSON.stringify(detail.outcome(toRadians(whole.angle), whole.sense)));
  const index = code === 'R' ? governing : detail.limitStates.findIndex((state) => state.code === code);
  return kilonewtons(out[index] ?? NaN);
}

/** Which limit state of which kind a check of a whole detail asks about; `R` asks about whichever governs. */
export interface AskedOf {
  readonly kind: KindId;
  readonly code: string;
}

/** The capacity of a limit state of a whole detail as one side of a check, kN. */
export const asked = (
  whole: WholeDetail,
  code: string,
): { readonly asks: AskedOf; readonly ours: () => number } => ({
  asks: { kind: whole.kind ?? 'gusset-plate', code },
  ours: () => capacityOf(whole, code),
});
