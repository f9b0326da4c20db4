import {
  type CellOutcome,
  type DetailGeometry,
  NOT_COVERED,
  NOT_PERMITTED,
  type PreparedDetail,
  type Rejection,
  type Sense,
  type SheetSection,
} from '../types.ts';

/** A detail that breaks rules of its family: drawn and recorded as it is, but permitted at no angle. */
export class RuledDetail implements PreparedDetail {
  readonly limitStates;
  readonly quantities;
  readonly rejections: readonly Rejection[];

  constructor(
    private readonly detail: PreparedDetail,
    private readonly broken: readonly Rejection[],
  ) {
    this.limitStates = detail.limitStates;
    this.quantities = detail.quantities;
    this.rejections = [...broken, ...detail.rejections];
  }

  at(theta: number, sense: Sense, out: Float64Array): number {
    return this.detail.at(theta, sense, out) === NOT_COVERED ? NOT_COVERED : NOT_PERMITTED;
  }

  outcome(theta: number, sense: Sense): CellOutcome {
    const outcome = this.detail.outcome(theta, sense);
    if (outcome.status === 'not-covered') return outcome;
    const others = outcome.status === 'not-permitted' ? outcome.rejections : [];
    return { status: 'not-permitted', rejections: [...this.broken, ...others] };
  }

  record(theta: number, sense: Sense): SheetSection[] {
    return this.detail.record(theta, sense);
  }

  geometry(theta: number): DetailGeometry {
    return this.detail.geometry(theta);
  }
}
