import type { z } from 'zod';
import type { savedVersionsResponse } from '@shared/contracts/revisions.ts';
import type { App } from '../../context.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { peopleOf } from './presenter.ts';
import { definitionOf, visibleRevision } from './read-service.ts';

/** Saves that are listed: the newest, each with its whole definition. */
const MOST = 100;

/**
 * The saved versions of a revision's definition, newest first.
 * @throws {ProblemError} not-found
 */
export async function listSaves(
  app: App,
  person: SignedInPerson,
  id: number,
): Promise<z.input<typeof savedVersionsResponse>> {
  const row = await visibleRevision(app, person, id);
  const { DefinitionSave } = app.db.models;
  const where = { revisionId: row.id };
  const saves = await DefinitionSave.findAll({ where, order: [['number', 'DESC']], limit: MOST });
  const total = await DefinitionSave.count({ where });
  const people = await peopleOf(
    app,
    saves.map(({ personId }) => personId),
  );
  return {
    total,
    saves: saves.map((save) => ({
      number: save.number,
      at: save.createdAt.toISOString(),
      person: people.get(save.personId) ?? { id: save.personId, name: 'unknown' },
      definition: definitionOf(save),
    })),
  };
}
