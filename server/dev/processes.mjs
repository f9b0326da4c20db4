import { readFileSync } from 'node:fs';
import { until } from './waiting.mjs';

const proc = (pid, name) => {
  try {
    return readFileSync(`/proc/${pid}/${name}`, 'utf8');
  } catch {
    return '';
  }
};

/** A process's arguments; empty when it has ended. */
export const argumentsOf = (pid) => proc(pid, 'cmdline').split('\0').filter(Boolean);

/** When a process began, in clock ticks since boot: with the pid it names one process for good. '' when ended. */
export function beginningOf(pid) {
  const stat = proc(pid, 'stat');
  const [state, ...rest] = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  return state === '' || state === 'Z' ? '' : (rest[18] ?? '');
}

/** Ends a process that an earlier run left behind; it is no child of ours, so /proc tells when it is gone. */
export async function endLeftOver(pid, milliseconds) {
  const beginning = beginningOf(pid);
  const gone = () => beginningOf(pid) !== beginning;
  for (const [signal, wait] of [
    ['SIGTERM', milliseconds],
    ['SIGKILL', 5000],
  ]) {
    if (beginning === '' || gone()) return;
    try {
      process.kill(pid, signal);
    } catch {
      return;
    }
    await until(gone, wait);
  }
}
