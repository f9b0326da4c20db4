import type { DetailKind } from '@shared/engine/types.ts';
import type { FamilyDraft, ParameterDraft, RangeText } from './draft.ts';
import { titleOf } from './options.ts';

/** One thing that two drafts say differently. */
export interface Difference {
  /** A parameter's name, or the name of a field of the draft. */
  readonly field: string;
  readonly label: string;
  readonly mine: string;
  readonly theirs: string;
}

const rangeWords = ({ from, to, step }: RangeText) => `${from} to ${to} by ${step}`;

function settingWords(draft: ParameterDraft | undefined): string {
  if (!draft) return '';
  if (draft.mode === 'fixed') return titleOf(draft.fixed);
  if (draft.mode === 'derived') return `= ${draft.expression}`;
  return draft.mode === 'list' ? draft.list.map(titleOf).join(', ') : rangeWords(draft.range);
}

const FIELDS: readonly { field: keyof FamilyDraft; label: string; words: (draft: FamilyDraft) => string }[] =
  [
    { field: 'basis', label: 'Design basis', words: ({ basis }) => basis },
    { field: 'senses', label: 'Senses of the load', words: ({ senses }) => [...senses].sort().join(', ') },
    { field: 'increment', label: 'Rounded down to', words: ({ increment }) => `${increment} kN` },
    {
      field: 'angles',
      label: 'Load angles',
      words: ({ angles }) => (angles.mode === 'list' ? angles.list.join(', ') : rangeWords(angles.range)),
    },
    {
      field: 'rules',
      label: 'Rules of this family',
      words: ({ rules }) => rules.map(({ expression, message }) => `${expression}: ${message}`).join('; '),
    },
    { field: 'factors', label: 'Partial factors', words: ({ factors }) => Object.values(factors).join(', ') },
  ];

/** What two drafts of a family say differently, in the order of the form. */
export function differencesOf(mine: FamilyDraft, theirs: FamilyDraft, kind: DetailKind): Difference[] {
  const rows = [
    ...FIELDS.map(({ field, label, words }) => ({
      field: String(field),
      label,
      mine: words(mine),
      theirs: words(theirs),
    })),
    ...kind.parameters.map(({ name, label }) => ({
      field: name,
      label,
      mine: settingWords(mine.parameters[name]),
      theirs: settingWords(theirs.parameters[name]),
    })),
  ];
  return rows.filter((row) => row.mine !== row.theirs);
}

/** My draft with theirs in the named fields. */
export function merged(mine: FamilyDraft, theirs: FamilyDraft, fromTheirs: ReadonlySet<string>): FamilyDraft {
  const result = structuredClone(mine);
  for (const { field } of FIELDS)
    if (fromTheirs.has(field)) Object.assign(result, { [field]: structuredClone(theirs[field]) });
  for (const [name, draft] of Object.entries(theirs.parameters))
    if (fromTheirs.has(name)) result.parameters[name] = structuredClone(draft);
  return result;
}
