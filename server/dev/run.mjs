import { spawn } from 'node:child_process';
import { PlainError } from './output.mjs';
import { root } from './paths.mjs';
import { until } from './waiting.mjs';

const running = new Set();
let stopped = false;

/** Signals a step and all it started; false when none of them is left. */
function signalGroup({ pid }, signal) {
  try {
    return process.kill(-pid, signal);
  } catch {
    return false;
  }
}

/** Ends every step that is running, with all it started, and lets no other begin: the person has stopped us. */
export async function stopSteps() {
  stopped = true;
  const steps = [...running];
  for (const step of steps) signalGroup(step, 'SIGTERM');
  await until(() => steps.every((step) => !signalGroup(step, 0)), 2500);
  for (const step of steps) signalGroup(step, 'SIGKILL');
}

/**
 * Runs one command to its end, in a process group of its own so that nothing it starts is left behind.
 * Its output goes to standard error unless `stdio` says otherwise.
 * @returns {Promise<number>} exit code; 128 when a signal ended it
 */
export function run(command, args, { env, stdio = ['ignore', 2, 2], cwd = root } = {}) {
  if (stopped) return Promise.reject(new PlainError('Stopped.'));
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, stdio, env: { ...process.env, ...env }, detached: true });
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

/** Ends this process with the conventional code when it is asked to stop, its steps first. */
export function stopStepsOnSignals() {
  for (const [signal, code] of [
    ['SIGINT', 130],
    ['SIGTERM', 143],
    ['SIGHUP', 129],
  ]) {
    process.on(signal, () => stopSteps().then(() => process.exit(code)));
  }
}
