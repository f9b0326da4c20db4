import type { z } from 'zod';
import type { LookupAnswer, lookupRequest } from '@shared/contracts/lookup.ts';
import { toRadians } from '@shared/engine/index.ts';
import type { App } from '../../context.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { isCurrent } from '../revisions/service.ts';
import {
  cautionsOf,
  limitStatesOf,
  notesOf,
  placeOfSense,
  prepareVariant,
  storedCurve,
  type SweptRevision,
  sweptRevision,
} from '../results/service.ts';
import { computedAnswer, faultyAnswer, placeOfAngle, storedAnswer } from './answers.ts';
import type { Answer, Question } from './answers.ts';
import { ordinalOfChoices } from './choices.ts';

const STORED_NOTE =
  'The value is the stored, published one; the value before rounding is not stored, so the rounded value stands for it.';

/**
 * The capacity of one detail of a revision in force, at any load angle of its kind.
 * @throws {ProblemError} not-found, state-conflict, validation
 */
export async function lookUp(
  app: App,
  person: SignedInPerson,
  { revisionId, choices, angle, sense, load }: z.output<typeof lookupRequest>,
): Promise<LookupAnswer> {
  const swept = await sweptRevision(app, person, revisionId);
  const { row, family, basis } = swept;
  if (!isCurrent(row.state)) {
    problem('state-conflict', { detail: `Only a revision in force is looked up; this one is ${row.state}.` });
  }
  placeOfSense(swept, sense);
  const ordinal = ordinalOfChoices(swept, choices);
  const question: Question = { angle, sense, load };
  const answer = await answerTo(app, swept, ordinal, question);
  return {
    family: { id: family.id, code: family.code, title: family.title },
    revision: presentRevision(swept),
    basis: { id: basis.id, title: basis.title, resultLabel: basis.resultLabel },
    ordinal,
    angle,
    sense,
    ...answer,
    legend: limitStatesOf(swept).map(({ id, code, title, part }) => ({ id, code, title, part })),
    cautions: cautionsOf(swept),
  };
}

type Noted = Answer & { notes: string[] };

/**
 * Worked out anew where this engine reproduces what was published; else what is stored. At a load angle that was
 * swept the two are compared, and the published value stands.
 */
async function answerTo(app: App, swept: SweptRevision, ordinal: number, question: Question): Promise<Noted> {
  const stored = await storedCurve(app, swept, ordinal, question.sense);
  const asStored = () => ({
    ...storedAnswer(swept, stored, question),
    notes: [...notesOf(swept), STORED_NOTE],
  });
  if (!swept.current) return asStored();
  const prepared = prepareVariant(swept, ordinal);
  if (!prepared.ok) return { ...faultyAnswer(swept, prepared), notes: notesOf(swept) };
  const computed = computedAnswer(swept, prepared.detail, question);
  const place = placeOfAngle(swept, question.angle);
  const { outcome } = computed;
  const capacity = outcome.status === 'capacity' ? outcome.capacity : null;
  if (place >= 0 && stored.capacity[place] !== capacity) {
    const published = stored.capacity[place];
    app.log.error(
      { revision: swept.row.id, ordinal, ...question, capacity, published },
      'a published cell is not reproduced',
    );
    return asStored();
  }
  const recorded = prepared.detail.record(toRadians(question.angle), question.sense);
  return { ...computed, notes: notesOf(swept, recorded) };
}

function presentRevision({ row, engineVersion }: SweptRevision): LookupAnswer['revision'] {
  const { id, letter, state, contentHash, publishedAt } = row;
  if (letter === null || contentHash === null || publishedAt === null) {
    throw new Error(`Revision ${id} is published without its stamps`);
  }
  return {
    id,
    letter,
    state,
    contentHash,
    shortHash: contentHash.slice(0, 12),
    publishedAt: publishedAt.toISOString(),
    engineVersion,
  };
}
