import type { Revision } from '@shared/contracts/revisions.ts';
import {
  lockRevision,
  publishRevision,
  returnRevision,
  signRevision,
  submitRevision,
  withdrawRevision,
} from '../../api/revisions.ts';

export type Step = 'submit' | 'sign' | 'return' | 'publish' | 'lock' | 'withdraw';

/** One step in the life of a revision: its button, what is asked before it is taken, and what is said after. */
export interface Action {
  readonly step: Step;
  readonly label: string;
  readonly title: string;
  readonly explanation: string;
  /** What is written with it; nothing when it is left out. */
  readonly remark?: { readonly label: string; readonly required: boolean };
  /** The family's code has to be typed. */
  readonly typed: boolean;
  readonly tone: 'primary' | 'error';
  readonly said: string;
}

const ACTIONS: readonly Action[] = [
  {
    step: 'submit',
    label: 'Submit for check',
    title: 'Submit for check',
    explanation:
      'An engineer or another standards manager then checks it and signs. Until then the definition can only change by being returned.',
    remark: { label: 'To the checker', required: false },
    typed: false,
    tone: 'primary',
    said: 'The revision is in check.',
  },
  {
    step: 'sign',
    label: 'Sign',
    title: 'Sign as the checker',
    explanation:
      'By signing you say that you have checked the definition and the capacities by your own means. Your name stands on every sheet and export.',
    remark: { label: 'What was checked, and how', required: true },
    typed: false,
    tone: 'primary',
    said: 'The revision is checked and signed.',
  },
  {
    step: 'return',
    label: 'Return to the author',
    title: 'Return to the author',
    explanation: 'The revision becomes a draft again, and its sweep is thrown away.',
    remark: { label: 'What has to change', required: true },
    typed: false,
    tone: 'error',
    said: 'The revision is returned to its author as a draft.',
  },
  {
    step: 'publish',
    label: 'Publish',
    title: 'Publish this revision',
    explanation:
      'It gets the next letter and is frozen for good: definition, engine version and every cell. The revision now in force is superseded at the same moment.',
    typed: true,
    tone: 'primary',
    said: 'The revision is published.',
  },
  {
    step: 'lock',
    label: 'Lock',
    title: 'Lock this revision',
    explanation: 'A locked revision is final: the database itself refuses to change its rows.',
    typed: true,
    tone: 'primary',
    said: 'The revision is locked.',
  },
  {
    step: 'withdraw',
    label: 'Withdraw',
    title: 'Withdraw this revision',
    explanation:
      'It goes out of force at once and can no longer be looked up. It stays in the record with your reason.',
    remark: { label: 'Reason', required: true },
    typed: false,
    tone: 'error',
    said: 'The revision is withdrawn.',
  },
];

/** The steps that the person may take now, as the server says. */
export const actionsOf = (can: Revision['can']): readonly Action[] => ACTIONS.filter(({ step }) => can[step]);

const TAKE: Readonly<Record<Step, (revision: Revision, text: string) => Promise<Revision>>> = {
  submit: submitRevision,
  sign: signRevision,
  return: returnRevision,
  publish: publishRevision,
  lock: lockRevision,
  withdraw: withdrawRevision,
};

/** Takes a step; `text` is the remark, or the family's code where that is typed. */
export const take = (step: Step, revision: Revision, text: string): Promise<Revision> =>
  TAKE[step](revision, text);
