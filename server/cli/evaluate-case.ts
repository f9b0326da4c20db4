import {
  type EngineCatalogue,
  type FieldFault,
  kilonewtons,
  type LimitStateInfo,
  type PreparedDetail,
  type Rejection,
  type Sense,
  toRadians,
} from '@shared/engine/index.ts';
import { bandCapacity } from '@shared/engine/sweep/index.ts';
import { checkCase } from './check-case.ts';

/** Stands beside every capacity that the command line prints. */
export const CAUTION =
  'Unrounded; for competent engineers; covers the listed limit states alone, not the support or the member. Local codes, the project specification and a licensed engineer come first.';

interface LimitStateResult {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly clause: string;
  /** Unrounded; null where the limit state does not apply. */
  readonly capacity_kN: number | null;
  readonly applies: boolean;
}

export type Evaluation =
  | {
      readonly status: 'capacity';
      readonly capacity_kN: number;
      readonly governing: Pick<LimitStateInfo, 'id' | 'code' | 'title'>;
      readonly limitStates: readonly LimitStateResult[];
      readonly caution: string;
    }
  | {
      readonly status: 'capacity';
      /** The lowest capacity anywhere in the band. */
      readonly capacity_kN: number;
      readonly governing: Pick<LimitStateInfo, 'id' | 'code' | 'title'>;
      /** Where in the band it is that low, degrees. */
      readonly lowestAt: number;
      readonly caution: string;
    }
  | {
      readonly status: 'not-permitted';
      readonly rejections: readonly Rejection[];
      /** Of a band: an angle at which the rules are broken, degrees. */
      readonly angle?: number;
    }
  | { readonly status: 'not-covered'; readonly reason: string }
  | { readonly status: 'invalid'; readonly faults: readonly FieldFault[] };

/** Evaluates one case as it was read. Never throws for what a case holds. */
export function evaluateCase(given: unknown, catalogue: EngineCatalogue): Evaluation {
  const { faults, named } = checkCase(given);
  if (named === undefined) return { status: 'invalid', faults };
  const { kind, basis, values, angles, sense, factors } = named;
  const prepared = kind.prepare(values, basis.id, catalogue, factors);
  if (!prepared.ok) return { status: 'invalid', faults: [...faults, ...prepared.faults] };
  if (faults.length > 0) return { status: 'invalid', faults };
  const { from, to } = angles;
  return from === to
    ? evaluate(prepared.detail, from, sense)
    : evaluateBand(prepared.detail, from, to, sense);
}

/** @param angle degrees */
function evaluate(detail: PreparedDetail, angle: number, sense: Sense): Evaluation {
  const theta = toRadians(angle);
  const outcome = detail.outcome(theta, sense);
  if (outcome.status !== 'capacity') return outcome;
  const out = new Float64Array(detail.limitStates.length);
  detail.at(theta, sense, out);
  const { id, code, title } = detail.limitStates[outcome.governing]!;
  return {
    status: 'capacity',
    capacity_kN: kilonewtons(outcome.capacity),
    governing: { id, code, title },
    limitStates: detail.limitStates.map((state, index) => limitStateResult(state, out[index]!)),
    caution: CAUTION,
  };
}

/** @param from, to degrees */
function evaluateBand(detail: PreparedDetail, from: number, to: number, sense: Sense): Evaluation {
  const outcome = bandCapacity(detail, sense, toRadians(from), toRadians(to));
  if (outcome.status !== 'capacity') return outcome;
  const { id, code, title } = detail.limitStates[outcome.governing]!;
  return {
    status: 'capacity',
    capacity_kN: kilonewtons(outcome.capacity),
    governing: { id, code, title },
    lowestAt: outcome.angle,
    caution: CAUTION,
  };
}

function limitStateResult({ id, code, title, clause }: LimitStateInfo, capacity: number): LimitStateResult {
  const applies = Number.isFinite(capacity);
  return { id, code, title, clause, capacity_kN: applies ? kilonewtons(capacity) : null, applies };
}
