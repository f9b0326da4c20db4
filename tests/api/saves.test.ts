import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Revision, SavedVersion } from '@shared/contracts/revisions.ts';
import { createHarness, type Agent, type Harness } from './harness.ts';
import { smallDefinition } from './support/definition.ts';

let harness: Harness;
let manager: Agent;

beforeAll(async () => {
  harness = await createHarness();
  manager = await harness.signedIn('standards-manager');
});
afterAll(() => harness.close());

const save = (revision: Revision, increment: number) =>
  manager
    .put(`/api/revisions/${revision.id}/definition`)
    .set('If-Match', `"${revision.lockVersion}"`)
    .send({ definition: { ...smallDefinition, increment } })
    .expect(200);

test('every saved version of a definition is kept, newest first, with who saved it', async () => {
  const body = { code: 'GP-71', title: 'Saved again and again', definition: smallDefinition };
  const family = (await manager.post('/api/families').send(body).expect(201)).body as {
    working: { id: number };
  };
  let revision = (await manager.get(`/api/revisions/${family.working.id}`).expect(200)).body as Revision;
  for (const increment of [2, 5]) revision = (await save(revision, increment)).body as Revision;
  const { saves, total } = (await manager.get(`/api/revisions/${revision.id}/saves`).expect(200)).body as {
    saves: SavedVersion[];
    total: number;
  };
  expect(total).toBe(3);
  expect(saves.map(({ number, definition }) => [number, definition.increment])).toEqual([
    [3, 5],
    [2, 2],
    [1, smallDefinition.increment],
  ]);
  expect(saves[0]?.person.name).toBe(revision.author.name);
  const engineer = await harness.signedIn('engineer');
  await engineer.get(`/api/revisions/${revision.id}/saves`).expect(403);
  await manager.get('/api/revisions/999999/saves').expect(404);
});
