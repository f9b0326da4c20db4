import { expect } from 'vitest';
import type { Definition } from '@shared/contracts/definition.ts';
import type { Revision, Sweep } from '@shared/contracts/revisions.ts';
import type { Agent } from '../harness.ts';

/** Does one step of a revision's life as this person, and hands back how it then stands. */
export async function step(agent: Agent, revision: Revision, name: string, body?: object): Promise<Revision> {
  const request = agent
    .post(`/api/revisions/${revision.id}/${name}`)
    .set('If-Match', `"${revision.lockVersion}"`);
  const answer = await (body ? request.send(body) : request);
  expect(answer.status, JSON.stringify(answer.body)).toBe(200);
  return answer.body as Revision;
}

export async function read(agent: Agent, id: number): Promise<Revision> {
  return (await agent.get(`/api/revisions/${id}`).expect(200)).body as Revision;
}

/** Defines a family; its first draft. */
export async function defineFamily(manager: Agent, code: string, definition: Definition): Promise<Revision> {
  const answer = await manager.post('/api/families').send({ code, title: 'Gusset for tests', definition });
  expect(answer.status, JSON.stringify(answer.body)).toBe(201);
  const { working } = answer.body as { working: { id: number } };
  return read(manager, working.id);
}

/** Asks for a sweep and follows its events to the end. */
export async function sweep(manager: Agent, revision: Revision): Promise<Revision> {
  const asked = await manager
    .post(`/api/revisions/${revision.id}/sweep`)
    .set('If-Match', `"${revision.lockVersion}"`);
  expect(asked.status, JSON.stringify(asked.body)).toBe(202);
  const last = await follow(manager, (asked.body as Sweep).id);
  expect(last).toMatchObject({ state: 'done', fraction: 1, error: null });
  return read(manager, revision.id);
}

/** The last event of a sweep's stream. */
export async function follow(manager: Agent, id: number): Promise<Sweep> {
  const { text } = await manager.get(`/api/sweeps/${id}/events`).buffer(true).expect(200);
  const events = text.split('\n').filter((line) => line.startsWith('data: '));
  return JSON.parse(events.at(-1)!.slice('data: '.length)) as Sweep;
}
