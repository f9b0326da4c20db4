import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

const root = new URL('../..', import.meta.url).pathname;
const readyLine = /Backmark is ready at (http:\/\/127\.0\.0\.1:\d+)/;
const readyWithin = 120_000;

/** The whole program with a MariaDB of its own, started as `npm start` does. */
export interface RunningApp {
  url: string;
  /** The process of the start command; the program and the database are its children. */
  pid: number;
  /** Everything it has printed so far. */
  output(): string;
  /** Ends all of it; the data folder stays unless the app made it. */
  stop(): Promise<number | null>;
}

/** The environment without what belongs to the test runner or to a person's own settings. */
function cleanEnvironment(): Record<string, string> {
  const foreign = /^(VITEST|NODE_ENV|NODE_OPTIONS|TEST|DATABASE_|BACKMARK_|PORT|HOST|AUTH_|SMTP_)/;
  return Object.fromEntries(
    Object.entries(process.env).filter((entry): entry is [string, string] => !foreign.test(entry[0])),
  );
}

/**
 * Starts the built program on a free port and waits until it says that it is ready.
 * @param env settings over the defaults
 * @param dataFolder kept afterwards; without it a temporary one is made and removed
 */
export async function startApp(env: Record<string, string> = {}, dataFolder?: string): Promise<RunningApp> {
  const folder = dataFolder ?? mkdtempSync(join(tmpdir(), 'backmark-app-'));
  const settings = { PORT: '0', BACKMARK_DATA: folder, BACKMARK_ENV_FILE: '', ...env };
  const child = spawn(process.execPath, ['server/dev/start.mjs'], {
    cwd: root,
    env: { ...cleanEnvironment(), ...settings },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let printed = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (text) => (printed += String(text)));
  const exited = new Promise<number | null>((resolve) => child.once('exit', resolve));
  const stop = async () => {
    child.kill('SIGTERM');
    const code = await exited;
    if (!dataFolder) rmSync(folder, { recursive: true, force: true });
    return code;
  };
  for (const end = Date.now() + readyWithin; ; await sleep(50)) {
    const url = readyLine.exec(printed)?.[1];
    if (url) return { url, pid: child.pid!, output: () => printed, stop };
    if (child.exitCode !== null || Date.now() > end) {
      await stop();
      throw new Error(`Backmark did not become ready. It printed:\n${printed}`);
    }
  }
}
