import { spawn, type ChildProcess } from 'node:child_process';
import { setTimeout as delay } from 'node:timers/promises';

const root = new URL('../../..', import.meta.url).pathname;
const readyLine = /Backmark is ready at (http:\/\/127\.0\.0\.1:\d+)/;
const running = new Set<ChildProcess>();

/** The program by itself, on a database that is there already. */
export interface Program {
  readonly url: string;
  readonly pid: number;
  signal(signal: NodeJS.Signals): void;
  /** Settles with the exit code, or null after a signal that cannot be caught. */
  readonly exited: Promise<number | null>;
  output(): string;
}

/** Starts it and waits until it is ready. */
export async function startProgram(databaseUrl: string): Promise<Program> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    cwd: root,
    env: {
      PATH: process.env.PATH ?? '',
      NODE_ENV: 'production',
      AUTH_SECRET: 'only for tests, and at least so long',
      DATABASE_URL: databaseUrl,
      PORT: '0',
      SWEEP_WORKERS: '1',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  running.add(child);
  let printed = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (text) => (printed += String(text)));
  const exited = new Promise<number | null>((resolve) =>
    child.once('exit', (code) => {
      running.delete(child);
      resolve(code);
    }),
  );
  for (const end = Date.now() + 60_000; Date.now() < end; await delay(20)) {
    const url = readyLine.exec(printed)?.[1];
    const signal = (name: NodeJS.Signals) => void child.kill(name);
    if (url) return { url, pid: child.pid!, signal, exited, output: () => printed };
    if (child.exitCode !== null) break;
  }
  child.kill('SIGKILL');
  throw new Error(`The program did not become ready. It printed:\n${printed}`);
}

/** Ends every program that a test left running, frozen ones too. */
export async function endPrograms(): Promise<void> {
  const left = [...running];
  for (const child of left) child.kill('SIGKILL');
  await Promise.all(left.map((child) => new Promise((resolve) => child.once('exit', resolve))));
}
