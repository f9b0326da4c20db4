import type { Role, RevisionState } from '@shared/contracts/common.ts';

export const ROLE_WORDS: Readonly<Record<Role, string>> = {
  'standards-manager': 'Standards manager',
  engineer: 'Engineer',
  drafter: 'Drafter',
  admin: 'Administrator',
};

export const ROLES = (Object.keys(ROLE_WORDS) as Role[]).map((value) => ({
  value,
  title: ROLE_WORDS[value],
}));

export const STATE_WORDS: Readonly<Record<RevisionState, string>> = {
  draft: 'Draft',
  swept: 'Swept',
  'in-check': 'In check',
  checked: 'Checked',
  published: 'Published',
  locked: 'Locked',
  superseded: 'Superseded',
  withdrawn: 'Withdrawn',
};

/** "Revision B", or "Working revision" before it has a letter. */
export const revisionName = (letter: string | null): string =>
  letter ? `Revision ${letter}` : 'Working revision';
