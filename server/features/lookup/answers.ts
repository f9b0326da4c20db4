import type { LookupAnswer } from '@shared/contracts/lookup.ts';
import { kilonewtons, toRadians, type PreparedDetail, type Sense } from '@shared/engine/index.ts';
import { capacityCurve, roundDown, ruleLegend, type VariantResult } from '@shared/engine/sweep/index.ts';
import { problem } from '../../http/problems.ts';
import {
  anglesOfKind,
  type Envelope,
  limitStatesOf,
  outcomeWithout,
  type SweptRevision,
} from '../results/service.ts';
import { readLoad } from './load.ts';

/** What is looked up of one variant. */
export interface Question {
  /** Degrees. */
  readonly angle: number;
  readonly sense: Sense;
  /** kN. */
  readonly load?: number | undefined;
}
type Outcome = LookupAnswer['outcome'];
export interface Answer {
  readonly outcome: Outcome;
  readonly curve: Envelope;
}

const SAME_ANGLE = 1e-9;

/** The place of an angle among those swept, or -1. */
export const placeOfAngle = ({ angles }: SweptRevision, angle: number): number =>
  angles.findIndex((one) => Math.abs(one - angle) < SAME_ANGLE);

/** Worked out at the very angle, with the engine that the revision was swept with. */
export function computedAnswer(swept: SweptRevision, detail: PreparedDetail, question: Question): Answer {
  const { increment } = swept.summary;
  const { angle, sense, load } = question;
  const { angles, capacity, governing } = capacityCurve(detail, sense, anglesOfKind(swept, 1), increment);
  const curve = { angles: [...angles], capacity, governing };
  const outcome = detail.outcome(toRadians(angle), sense);
  if (outcome.status === 'not-covered') return { outcome, curve };
  if (outcome.status === 'not-permitted') {
    return { outcome: { ...outcome, rejections: [...outcome.rejections] }, curve };
  }
  const rounded = roundDown(outcome.capacity, increment);
  const state = detail.limitStates[outcome.governing]!;
  const unrounded = kilonewtons(outcome.capacity);
  return { outcome: capacityOutcome(state, rounded, unrounded, load), curve };
}

function capacityOutcome(
  { id, code, title, part, clause }: ReturnType<typeof limitStatesOf>[number],
  capacity: number,
  unrounded: number,
  load: number | undefined,
): Outcome {
  const governing = { id, code, title, part, clause };
  return { status: 'capacity', capacity, unrounded, governing, ...readLoad(load, capacity) };
}

/** A variant that cannot be prepared: its fields contradict each other, or a derived one has no value. */
export function faultyAnswer(swept: SweptRevision, variant: Extract<VariantResult, { ok: false }>): Answer {
  const angles = anglesOfKind(swept, 1);
  const curve = { angles, capacity: angles.map(() => null), governing: angles.map(() => -1) };
  return { outcome: outcomeWithout(variant), curve };
}

/**
 * As it was published, at the angles that were swept. What was not rounded is not stored, so the rounded value
 * stands for it; nor are the numbers of a rejection, so only its rule is named.
 * @throws {ProblemError} validation at any other angle
 */
export function storedAnswer(swept: SweptRevision, curve: Envelope, { angle, load }: Question): Answer {
  const place = placeOfAngle(swept, angle);
  if (place < 0) {
    const message = `Revision ${swept.row.letter ?? ''} was swept with engine ${swept.engineVersion}; it is answered at its own load angles only: ${swept.angles.join(', ')}°.`;
    return problem('validation', { errors: [{ field: 'angle', message, value: angle }] });
  }
  const capacity = curve.capacity[place] ?? null;
  const code = curve.governing[place] ?? -1;
  const shown = { ...curve, governing: curve.governing.map((one) => Math.max(one, -1)) };
  if (capacity === null) {
    const rule = ruleLegend(swept.kind, swept.definition.rules)[-1 - code];
    const reason = `Not permitted when it was published: ${rule?.title ?? 'a rule unknown to this version'}.`;
    return { outcome: { status: 'not-covered', reason }, curve: shown };
  }
  const state = limitStatesOf(swept)[code];
  if (!state) throw new Error(`Revision ${swept.row.id} has an unknown limit state ${code}`);
  return { outcome: capacityOutcome(state, capacity, capacity, load), curve: shown };
}
