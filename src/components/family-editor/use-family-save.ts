import type { Fault } from '@shared/contracts/common.ts';
import type { Family } from '@shared/contracts/families.ts';
import type { Revision } from '@shared/contracts/revisions.ts';
import { ref, shallowRef, toRaw } from 'vue';
import { createFamily, updateFamily } from '../../api/families.ts';
import { isConflict, ProblemError } from '../../api/problem.ts';
import { fetchRevision, saveDefinition } from '../../api/revisions.ts';
import { useTask } from '../../composables/use-task.ts';
import { differencesOf, merged, type Difference } from './differences.ts';
import { draftOf, type FamilyDraft } from './draft.ts';
import type { FieldFault } from './read-draft.ts';
import type { FamilyForm } from './use-family-form.ts';

interface Stored {
  readonly family: Family | null;
  readonly revision: Revision | null;
}
interface Conflict {
  readonly theirs: FamilyDraft;
  readonly revision: Revision;
  readonly differences: readonly Difference[];
}

/** Saving a family: new or changed, with the answer to somebody who was quicker. */
export function useFamilySave(form: FamilyForm, start: Stored) {
  const family = shallowRef(start.family);
  const revision = shallowRef(start.revision);
  const conflict = shallowRef<Conflict | null>(null);
  const conflictOpen = ref(false);
  const written = () => JSON.stringify(form.read.value.definition);
  /** The definition as it is stored; a change of code or title alone must not throw a sweep away. */
  let stored = start.revision ? written() : '';

  async function saveNames(): Promise<void> {
    const { code, title } = form.draft;
    const own = family.value;
    if (!own || (own.code === code && own.title === title)) return;
    family.value = await updateFamily(own.id, own.lockVersion, { code, title });
  }

  async function showConflict(id: number): Promise<void> {
    const newer = await fetchRevision(id);
    const { code, title } = form.draft;
    const theirs = draftOf(newer.definition, form.kind.value, { code, title });
    const differences = differencesOf(form.draft, theirs, form.kind.value);
    conflict.value = { theirs, revision: newer, differences };
    conflictOpen.value = true;
  }

  async function store(): Promise<Family | null> {
    const { definition } = form.read.value;
    if (!definition || form.tooLarge.value) return null;
    const { code, title } = form.draft;
    if (!revision.value) {
      family.value = await createFamily({ code, title, definition });
    } else {
      await saveNames();
      if (written() !== stored)
        revision.value = await saveDefinition(revision.value.id, revision.value.lockVersion, definition);
      stored = written();
    }
    form.settle();
    return family.value;
  }

  const task = useTask(async (): Promise<Family | null> => {
    form.serverFaults.value = [];
    try {
      return await store();
    } catch (fault) {
      if (isConflict(fault) && revision.value) {
        await showConflict(revision.value.id);
        return null;
      }
      if (fault instanceof ProblemError) form.serverFaults.value = fault.faults.map(toField);
      throw fault;
    }
  });

  /** Takes the chosen fields from the other version, and saves the whole over it. */
  async function resolve(fromTheirs: ReadonlySet<string>): Promise<void> {
    if (!conflict.value) return;
    form.take(merged(structuredClone(toRaw(form.draft)), conflict.value.theirs, fromTheirs));
    revision.value = conflict.value.revision;
    stored = '';
    conflictOpen.value = false;
    await task.run();
  }

  return { family, revision, conflict, conflictOpen, task, resolve };
}

/** `definition.parameters.pitch.to` is the form's `pitch.to`. */
function toField({ field, message, place }: Fault): FieldFault {
  const own = field.replace(/^(definition\.)?(parameters\.)?/, '');
  return { field: own, message, ...(place ? { place } : {}) };
}
