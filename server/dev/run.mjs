import { spawn } from 'node:child_process';
import { PlainError } from './output.mjs';
import { root } from './paths.mjs';

const running = new Set();

/** Sends a signal to every step that is running now; used when the person stops us during a step. */
export function stopSteps(signal = 'SIGTERM') {
  for (const child of running) child.kill(signal);
}

/**
 * Runs one command to its end. Its output goes to standard error unless `stdio` says otherwise.
 * @returns {Promise<number>} exit code; 128 when a signal ended it
 */
export function run(command, args, { env, stdio = ['ignore', 2, 2], cwd = root } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, stdio, env: { ...process.env, ...env } });
    running.add(child);
    child.once('error', (error) => {
      running.delete(child);
      reject(new PlainError(`${command} could not be started: ${error.message}`));
    });
    child.once('close', (code) => {
      running.delete(child);
      resolve(code ?? 128);
    });
  });
}

/** As {@link run}, but a code other than 0 is a failure with the given sentence. */
export async function mustRun(what, command, args, options) {
  const code = await run(command, args, options);
  if (code !== 0) throw new PlainError(`${what} failed (exit code ${code}).`);
}

/** Passes Ctrl-C and a stop request on to the running step, then ends with its code. */
export function passSignalsOn() {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => stopSteps('SIGTERM'));
}
