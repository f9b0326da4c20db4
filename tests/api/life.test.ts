import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Revision } from '@shared/contracts/revisions.ts';
import { startJobs } from '@server/jobs/jobs.ts';
import type { Jobs } from '@server/context.ts';
import { createHarness, type Agent, type Harness } from './harness.ts';
import { smallDefinition } from './support/definition.ts';
import { defineFamily, read, step, sweep } from './support/life.ts';

let harness: Harness;
let jobs: Jobs;
let manager: Agent;
let engineer: Agent;
let drafter: Agent;
let admin: Agent;

beforeAll(async () => {
  harness = await createHarness();
  jobs = await startJobs(harness.app);
  manager = await harness.signedIn('standards-manager');
  engineer = await harness.signedIn('engineer');
  drafter = await harness.signedIn('drafter');
  admin = await harness.signedIn('admin');
});
afterAll(async () => {
  await jobs.stop();
  await harness.close();
});

const inCheck = async (code: string) => {
  const swept = await sweep(manager, await defineFamily(manager, code, smallDefinition));
  return step(manager, swept, 'submit', { comment: '' });
};
const checked = async (code: string) =>
  step(engineer, await inCheck(code), 'sign', { comment: 'Checked by hand.' });
const published = async (code: string) => step(manager, await checked(code), 'publish', { confirm: code });

test('a family goes from definition to a locked revision A', async () => {
  const draft = await defineFamily(manager, 'GP-01', smallDefinition);
  expect(draft).toMatchObject({ state: 'draft', letter: null, can: { sweep: true, submit: false } });
  const swept = await sweep(manager, draft);
  expect(swept).toMatchObject({ state: 'swept', variants: 4, cells: 4 * 9 * 2, engineVersion: '1.0.0' });
  const submitted = await step(manager, swept, 'submit', { comment: 'Please check.' });
  expect(submitted).toMatchObject({ state: 'in-check', can: { sign: false, edit: false } });
  const signed = await step(engineer, submitted, 'sign', { comment: 'Two cells by hand, both agree.' });
  expect(signed).toMatchObject({ state: 'checked', checker: { name: 'The engineer' } });
  const issued = await step(manager, signed, 'publish', { confirm: 'GP-01' });
  expect(issued).toMatchObject({ state: 'published', letter: 'A' });
  expect(issued.contentHash).toMatch(/^[0-9a-f]{64}$/);
  expect(issued.shortHash).toBe(issued.contentHash!.slice(0, 12));
  const locked = await step(admin, await read(admin, issued.id), 'lock', { confirm: 'GP-01' });
  expect(locked).toMatchObject({ state: 'locked', contentHash: issued.contentHash });
  const actions = await harness.db.select<{ action: string }>(
    "SELECT action FROM audit WHERE subject_type <> 'person' ORDER BY seq",
  );
  expect(actions.map(({ action }) => action)).toEqual([
    'family.created',
    'revision.sweep-asked',
    'revision.swept',
    'revision.submitted',
    'revision.signed',
    'revision.published',
    'revision.locked',
  ]);
});

test('the next revision supersedes the one in force and takes the next letter', async () => {
  const first = await published('GP-02');
  const { body } = await manager.post(`/api/families/${first.family.id}/revisions`).expect(201);
  const draft = await read(manager, (body as { working: { id: number } }).working.id);
  await manager.post(`/api/families/${first.family.id}/revisions`).expect(409);
  const swept = await sweep(manager, draft);
  const signed = await step(engineer, await step(manager, swept, 'submit', {}), 'sign', {
    comment: 'Agrees.',
  });
  const second = await step(manager, signed, 'publish', { confirm: 'GP-02' });
  expect(second).toMatchObject({ letter: 'B', state: 'published' });
  expect(await read(drafter, first.id)).toMatchObject({ letter: 'A', state: 'superseded' });
});

test('the same definition gives the same hash', async () => {
  const hashes = [(await published('GP-03')).contentHash, (await published('GP-04')).contentHash];
  expect(hashes[0]).toBe(hashes[1]);
});

test('a returned revision is a draft without its sweep', async () => {
  const returned = await step(engineer, await inCheck('GP-05'), 'return', { comment: 'The pitch is wrong.' });
  expect(returned).toMatchObject({ state: 'draft', variants: null });
  expect(returned.signatures).toMatchObject([
    { verdict: 'submitted' },
    { verdict: 'returned', comment: 'The pitch is wrong.' },
  ]);
  expect(await harness.db.select('SELECT 1 FROM variants WHERE revision_id = ?', [returned.id])).toEqual([]);
});

test('whoever saved the definition does not sign, whatever the role', async () => {
  const submitted = await inCheck('GP-06');
  const { body } = await manager
    .post(`/api/revisions/${submitted.id}/sign`)
    .set('If-Match', `"${submitted.lockVersion}"`)
    .send({ comment: 'I trust myself.' })
    .expect(409);
  expect(body).toMatchObject({ code: 'state-conflict' });
});

test('of many who publish at once one does', async () => {
  const ready = await checked('GP-07');
  const answers = await Promise.all(
    Array.from({ length: 20 }, () =>
      manager
        .post(`/api/revisions/${ready.id}/publish`)
        .set('If-Match', `"${ready.lockVersion}"`)
        .send({ confirm: 'GP-07' }),
    ),
  );
  const statuses = answers.map(({ status }) => status).sort();
  expect(statuses).toEqual([200, ...Array<number>(19).fill(412)]);
  expect(await read(manager, ready.id)).toMatchObject({ letter: 'A', state: 'published' });
});

test('publishing wants the code typed, and the version that was read', async () => {
  const ready = await checked('GP-08');
  const publish = (version: number, confirm: string) =>
    manager.post(`/api/revisions/${ready.id}/publish`).set('If-Match', `"${version}"`).send({ confirm });
  expect((await publish(ready.lockVersion, 'GP-80').expect(422)).body).toMatchObject({
    errors: [{ field: 'confirm', value: 'GP-80' }],
  });
  expect((await publish(ready.lockVersion - 1, 'GP-08').expect(412)).body).toMatchObject({
    current: { lockVersion: ready.lockVersion },
  });
});

test('a withdrawn revision keeps its reason and letter', async () => {
  const issued = await published('GP-09');
  const withdrawn = await step(manager, issued, 'withdraw', { reason: 'The shop cannot punch it.' });
  expect(withdrawn).toMatchObject({
    state: 'withdrawn',
    withdrawnReason: 'The shop cannot punch it.',
    letter: 'A',
  });
});

describe('who sees what', () => {
  const statusFor = async (agent: Agent, { id }: Revision) =>
    (await agent.get(`/api/revisions/${id}`)).status;

  test('a draft is there for standards managers and admins alone', async () => {
    const draft = await defineFamily(manager, 'GP-20', smallDefinition);
    expect(await statusFor(admin, draft)).toBe(200);
    expect(await statusFor(engineer, draft)).toBe(404);
    expect(await statusFor(drafter, draft)).toBe(404);
    const { body } = await drafter.get('/api/families').expect(200);
    expect(JSON.stringify(body)).not.toContain('GP-20');
  });

  test('a revision in check also for engineers', async () => {
    const submitted = await inCheck('GP-21');
    expect(await statusFor(engineer, submitted)).toBe(200);
    expect(await statusFor(drafter, submitted)).toBe(404);
  });
});

describe('definitions', () => {
  const create = (definition: object) =>
    manager.post('/api/families').send({ code: 'GP-30', title: 'Faulty', definition });

  test('every fault is named with its field, value and limit', async () => {
    const { body } = await create({
      ...smallDefinition,
      parameters: {
        plate_thickness: { mode: 'list', values: [10, 1000] },
        weld_leg: { mode: 'fixed', value: -6 },
        plate_steel: { mode: 'fixed', value: 'S999' },
        colour: { mode: 'fixed', value: 'red' },
      },
    }).expect(422);
    const { errors } = body as { errors: { field: string; message: string }[] };
    expect(errors.map(({ field }) => field)).toEqual(['definition.parameters.colour']);
  });

  test('values are tried by the engine', async () => {
    const { body } = await create({
      ...smallDefinition,
      parameters: {
        plate_thickness: { mode: 'list', values: [10, 1000] },
        weld_leg: { mode: 'fixed', value: -6 },
        plate_steel: { mode: 'fixed', value: 'S999' },
      },
    }).expect(422);
    const { errors } = body as { errors: { field: string; message: string }[] };
    expect(errors.map(({ field }) => field)).toEqual([
      'definition.parameters.plate_thickness.values.1',
      'definition.parameters.weld_leg',
      'definition.parameters.plate_steel',
    ]);
    expect(errors[0]!.message).toMatch(/3 to 100 mm; 1000 was given/);
  });

  test('a million million cells are refused in the time of one request', async () => {
    const range = { mode: 'range', from: 10, to: 500, step: 0.01 };
    const started = Date.now();
    await create({ ...smallDefinition, parameters: { pitch: range, gauge: range, first_row: range } }).expect(
      422,
    );
    expect(Date.now() - started).toBeLessThan(2000);
  });

  test('saving throws an older sweep away; saving the same keeps it', async () => {
    const swept = await sweep(manager, await defineFamily(manager, 'GP-31', smallDefinition));
    const save = (revision: Revision, definition: object) =>
      manager
        .put(`/api/revisions/${revision.id}/definition`)
        .set('If-Match', `"${revision.lockVersion}"`)
        .send({ definition });
    const same = (await save(swept, smallDefinition).expect(200)).body as Revision;
    expect(same.state).toBe('swept');
    const other = (await save(same, { ...smallDefinition, increment: 5 }).expect(200)).body as Revision;
    expect(other).toMatchObject({ state: 'draft', variants: null });
    expect((await save(same, smallDefinition).expect(412)).body).toMatchObject({
      current: { definition: { increment: 5 } },
    });
  });

  test('a family whose every cell is rejected sweeps and says why', async () => {
    const tight = { ...smallDefinition, parameters: { pitch: { mode: 'fixed', value: 20 } } } as const;
    const swept = await sweep(manager, await defineFamily(manager, 'GP-32', tight));
    expect(swept).toMatchObject({ state: 'swept', cells: 18, rejectedCells: 18 });
  });

  test('a code is taken once', async () => {
    await defineFamily(manager, 'GP-33', smallDefinition);
    const again = { code: 'GP-33', title: 'Another', definition: smallDefinition };
    const { body } = await manager.post('/api/families').send(again).expect(409);
    expect(body).toMatchObject({ errors: [{ field: 'code', value: 'GP-33' }] });
  });
});
