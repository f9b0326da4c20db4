import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Definition } from '@shared/contracts/definition.ts';
import type { Sweep } from '@shared/contracts/revisions.ts';
import { startApp, type RunningApp } from '../support/app.ts';
import { Caller, publish } from './client.ts';

/** 4680 variants x 161 angles x 2 senses: 1.5 million cells, long enough to be interrupted. */
const definition: Definition = {
  schema: 1,
  kind: 'gusset-plate',
  basis: 'en-1993-1-8-2005',
  parameters: {
    plate_thickness: { mode: 'range', from: 8, to: 20, step: 1 },
    weld_leg: { mode: 'list', values: [6, 8, 10] },
    rows: { mode: 'range', from: 2, to: 6, step: 1 },
    pitch: { mode: 'range', from: 65, to: 120, step: 5 },
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
  },
  angles: { mode: 'range', from: -80, to: 80, step: 1 },
  senses: ['tension', 'compression'],
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
};

let folder: string;
let app: RunningApp;
let undisturbed: string;

const midway = ({ state, fraction }: Sweep) => state === 'running' && fraction > 0.1 && fraction < 0.9;
const ended = ({ state }: Sweep) => state !== 'queued' && state !== 'running';

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'backmark-faults-'));
  app = await startApp({ BACKMARK_DEMO: 'true' }, folder);
  const manager = await Caller.signIn(app.url, 'standards');
  const sweep = await manager.beginSweep('UF-01', definition);
  expect(await manager.sweepUntil(sweep.id, ended, 120)).toMatchObject({ state: 'done' });
  undisturbed = await publish(app.url, sweep.revision.id, 'UF-01');
}, 240_000);

afterAll(async () => {
  await app?.stop();
  rmSync(folder, { recursive: true, force: true });
}, 60_000);

test('a sweep whose server is killed goes on after the next start, to the same hash', async () => {
  const manager = await Caller.signIn(app.url, 'standards');
  const sweep = await manager.beginSweep('UF-02', definition);
  const before = await manager.sweepUntil(sweep.id, midway, 60);
  process.kill(programOf(folder), 'SIGKILL');
  await app.stop();
  app = await startApp({ BACKMARK_DEMO: 'true' }, folder);
  const again = await Caller.signIn(app.url, 'standards');
  const resumed = await again.sweepUntil(sweep.id, () => true, 20);
  expect(resumed.fraction).toBeGreaterThanOrEqual(before.fraction);
  expect(await again.sweepUntil(sweep.id, ended, 120)).toMatchObject({ state: 'done', fraction: 1 });
  expect(await publish(app.url, sweep.revision.id, 'UF-02')).toBe(undisturbed);
}, 240_000);

test('a sweep whose database is killed goes on when it is back, to the same hash', async () => {
  const manager = await Caller.signIn(app.url, 'standards');
  const sweep = await manager.beginSweep('UF-03', definition);
  await manager.sweepUntil(sweep.id, midway, 60);
  process.kill(databaseOf(folder), 'SIGKILL');
  expect(await manager.sweepUntil(sweep.id, ended, 120)).toMatchObject({ state: 'done', fraction: 1 });
  expect(await publish(app.url, sweep.revision.id, 'UF-03')).toBe(undisturbed);
}, 240_000);

function programOf(data: string): number {
  const { program } = JSON.parse(readFileSync(join(data, 'running.json'), 'utf8')) as { program: number };
  return program;
}

function databaseOf(data: string): number {
  return Number(readFileSync(join(data, 'mariadb', 'mariadbd.pid'), 'utf8'));
}
