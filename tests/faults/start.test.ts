import { execFile } from 'node:child_process';
import { mkdtempSync, readFileSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterEach, expect, test } from 'vitest';
import { startApp, type RunningApp } from '../support/app.ts';

/* The start command and the processes that it answers for. */

const minutes = 60_000;
const root = new URL('../..', import.meta.url).pathname;
const folders: string[] = [];
const started: RunningApp[] = [];

function dataFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), 'backmark-start-'));
  folders.push(folder);
  return folder;
}

async function start(folder: string): Promise<RunningApp> {
  const app = await startApp({ BACKMARK_DEMO: 'off' }, folder);
  started.push(app);
  return app;
}

/** The pids of all processes below a process, found in /proc. */
function descendantsOf(pid: number): number[] {
  const parents = readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map((name) => [Number(name), parentOf(Number(name))] as const);
  const below = (of: number): number[] =>
    parents.filter(([, parent]) => parent === of).flatMap(([child]) => [child, ...below(child)]);
  return below(pid);
}

/** Parent of a process; 0 when it has ended, though its exit may not have been read yet. */
function parentOf(pid: number): number {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const [state, parent] = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return state === 'Z' ? 0 : Number(parent);
  } catch {
    return 0;
  }
}

const alive = (pids: readonly number[]) => pids.filter((pid) => parentOf(pid) !== 0);

afterEach(async () => {
  for (const app of started.splice(0)) await app.stop();
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true });
});

test(
  'a second start leaves the first alone, and the end of the first ends all it started',
  { timeout: 2 * minutes },
  async () => {
    const folder = dataFolder();
    const first = await start(folder);
    const family = descendantsOf(first.pid);
    expect(family.length).toBeGreaterThanOrEqual(2);
    const environment = { ...process.env, BACKMARK_DATA: folder, BACKMARK_ENV_FILE: '' };
    const { stdout, stderr } = await promisify(execFile)(process.execPath, ['server/dev/start.mjs'], {
      cwd: root,
      env: environment,
    });
    expect(stdout + stderr).toContain(`already running at ${first.url}`);
    expect((await fetch(`${first.url}/api/ready`)).status).toBe(200);
    const asked = Date.now();
    expect(await first.stop()).toBe(0);
    expect(Date.now() - asked).toBeLessThan(10_000);
    expect(alive(family)).toEqual([]);
  },
);

test(
  'a killed start takes its program along, and the next start takes the data over',
  { timeout: 3 * minutes },
  async () => {
    const folder = dataFolder();
    const first = await start(folder);
    const family = descendantsOf(first.pid);
    process.kill(first.pid, 'SIGKILL');
    await expect.poll(() => fetch(first.url).then(Boolean, () => false), { timeout: 10_000 }).toBe(false);
    const second = await start(folder);
    expect((await fetch(`${second.url}/api/ready`)).status).toBe(200);
    expect(alive(family)).toEqual([]);
  },
);
