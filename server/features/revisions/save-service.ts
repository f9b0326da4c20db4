import type { Definition } from '@shared/contracts/definition.ts';
import type { App } from '../../context.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { checkDefinition } from '../families/definition-service.ts';
import { changeRevision, type Held, type RevisionView } from './change-service.ts';
import { throwSweepAway } from './life-service.ts';

/**
 * Saves the definition; a sweep of an older one is thrown away. Every save is kept.
 * @throws {ProblemError} validation with every fault, stale-version, state-conflict
 */
export async function saveDefinition(
  app: App,
  person: SignedInPerson,
  id: number,
  version: number,
  definition: Definition,
): Promise<RevisionView> {
  const checked = checkDefinition(definition);
  return changeRevision(app, person, id, version, 'edit', async (held) => {
    const { row, related, transaction } = held;
    if (checked.kind.id !== related.family.kind) {
      const message = `The family is of the kind "${related.family.kind}"; that stays.`;
      problem('validation', { errors: [{ field: 'definition.kind', message, value: definition.kind }] });
    }
    if (row.definitionHash !== checked.hash && row.state === 'swept') await throwSweepAway(held);
    await row.update({ definition: checked.text, definitionHash: checked.hash }, { transaction });
    await keepSave(held);
    return { action: 'revision.defined', detail: { definitionHash: checked.hash } };
  });
}

/** Keeps the definition as it now stands, under the next number. */
export async function keepSave({
  app,
  row,
  person,
  transaction,
}: Omit<Held, 'related' | 'now'>): Promise<void> {
  const { DefinitionSave } = app.db.models;
  const where = { revisionId: row.id };
  const last = await DefinitionSave.findOne({ where, order: [['number', 'DESC']], transaction });
  const { id: revisionId, definition, definitionHash } = row;
  const save = {
    revisionId,
    number: (last?.number ?? 0) + 1,
    definition,
    definitionHash,
    personId: person.id,
  };
  await DefinitionSave.create(save, { transaction });
}
