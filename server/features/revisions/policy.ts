import type { RevisionState, Role } from '@shared/contracts/common.ts';

/** What can be done to a revision. */
export type RevisionAction =
  'edit' | 'sweep' | 'submit' | 'sign' | 'return' | 'publish' | 'lock' | 'withdraw' | 'export';

export interface Standing {
  readonly role: Role;
  readonly state: RevisionState;
  /** The person made the revision or saved its definition. */
  readonly wrote: boolean;
  /** A sweep of it is queued or running. */
  readonly sweeping: boolean;
}

const ISSUED: readonly RevisionState[] = ['published', 'locked', 'superseded', 'withdrawn'];

/** Published, whatever became of it since. */
export const isIssued = (state: RevisionState): boolean => ISSUED.includes(state);

/** In force. */
export const isCurrent = (state: RevisionState): boolean => state === 'published' || state === 'locked';

/** Drafters see what was published; engineers also what is in check; standards managers and admins everything. */
export function maySee(role: Role, state: RevisionState): boolean {
  if (role === 'standards-manager' || role === 'admin' || isIssued(state)) return true;
  return role === 'engineer' && (state === 'in-check' || state === 'checked');
}

type Rule = (standing: Standing) => boolean;
const manager: Rule = ({ role }) => role === 'standards-manager';
const checker: Rule = ({ role, wrote }) => (role === 'engineer' || role === 'standards-manager') && !wrote;
const within =
  (...states: RevisionState[]): Rule =>
  ({ state }) =>
    states.includes(state);
const still: Rule = ({ sweeping }) => !sweeping;

const rules: Readonly<Record<RevisionAction, readonly Rule[]>> = {
  edit: [manager, within('draft', 'swept'), still],
  sweep: [manager, within('draft'), still],
  submit: [manager, within('swept')],
  sign: [checker, within('in-check')],
  return: [checker, within('in-check')],
  publish: [manager, within('checked')],
  lock: [({ role }) => role === 'admin', within('published')],
  withdraw: [manager, within('published', 'locked')],
  export: [({ role }) => role !== 'admin', within(...ISSUED)],
};

/** Whether this person may do this to a revision that stands so. */
export const may = (action: RevisionAction, standing: Standing): boolean =>
  rules[action].every((rule) => rule(standing));

/** Every action with its answer: what a screen binds its buttons to. */
export function abilities(standing: Standing): Record<RevisionAction, boolean> {
  const names = Object.keys(rules) as RevisionAction[];
  return Object.fromEntries(names.map((action) => [action, may(action, standing)])) as Record<
    RevisionAction,
    boolean
  >;
}

const REFUSALS: Readonly<Record<RevisionAction, string>> = {
  edit: 'A definition is edited by a standards manager, in a draft, while no sweep of it runs.',
  sweep: 'A sweep is started by a standards manager on a draft, one at a time.',
  submit: 'A revision is submitted by a standards manager once it is swept.',
  sign: 'A revision in check is signed by an engineer or standards manager who did not write it.',
  return: 'A revision in check is returned by an engineer or standards manager who did not write it.',
  publish: 'A revision is published by a standards manager once a second person has signed it.',
  lock: 'A published revision is locked by an admin.',
  withdraw: 'A revision in force is withdrawn by a standards manager.',
  export: 'Published revisions are exported.',
};

/** The sentence that refuses an action. */
export const refusalOf = (action: RevisionAction): string => REFUSALS[action];

/** Revision letters in order: A to Z without I and O, then AA, AB, … */
const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** The letter after so many published revisions of a family. */
export function letterAfter(published: number): string {
  const last = LETTERS[published % LETTERS.length]!;
  const before = Math.floor(published / LETTERS.length);
  return before === 0 ? last : letterAfter(before - 1) + last;
}
