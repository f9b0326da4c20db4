import type { RevisionState } from '@shared/contracts/common.ts';
import type { Revision } from '@shared/contracts/revisions.ts';
import { STATE_WORDS } from '../common/words.ts';

export interface Stage {
  readonly state: RevisionState;
  readonly word: string;
  /** Past, present, still to come, or passed over. */
  readonly place: 'done' | 'here' | 'ahead' | 'skipped';
  /** When it was reached and by whom, as far as the record says. */
  readonly at: string | null;
  readonly who: string | null;
}

type Record = Pick<
  Revision,
  | 'state'
  | 'author'
  | 'checker'
  | 'publisher'
  | 'locker'
  | 'submittedAt'
  | 'checkedAt'
  | 'publishedAt'
  | 'lockedAt'
>;

const WAY: readonly RevisionState[] = ['draft', 'swept', 'in-check', 'checked', 'published', 'locked'];

function stampOf(record: Record, state: RevisionState): Pick<Stage, 'at' | 'who'> {
  if (state === 'draft') return { at: null, who: record.author.name };
  if (state === 'in-check') return { at: record.submittedAt, who: null };
  if (state === 'checked') return { at: record.checkedAt, who: record.checker?.name ?? null };
  if (state === 'published') return { at: record.publishedAt, who: record.publisher?.name ?? null };
  if (state === 'locked') return { at: record.lockedAt, who: record.locker?.name ?? null };
  return { at: null, who: null };
}

/** The life of a revision as a line of stages; one that is out of force ends with how it went out. */
export function lifeOf(record: Record): Stage[] {
  const { state } = record;
  const over = state === 'superseded' || state === 'withdrawn';
  const way = over ? [...WAY, state] : WAY;
  const here = way.indexOf(state);
  return way.map((stage, at) => {
    const skipped = over && stage === 'locked' && record.lockedAt === null;
    const past = at < here ? 'done' : 'ahead';
    const place = at === here ? 'here' : skipped ? 'skipped' : past;
    const stamp = place === 'done' || place === 'here' ? stampOf(record, stage) : { at: null, who: null };
    return { state: stage, word: STATE_WORDS[stage], place, ...stamp };
  });
}
