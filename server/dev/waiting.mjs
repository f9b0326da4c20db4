import { setTimeout as sleep } from 'node:timers/promises';

/** Asks `test` again and again until it answers something true or the time is over; returns its last answer. */
export async function until(test, milliseconds, pause = 25) {
  const end = Date.now() + milliseconds;
  for (;;) {
    const answer = await test();
    if (answer || Date.now() > end) return answer;
    await sleep(pause);
  }
}

/** Ends a child process of ours: a request first, force when it has not ended in time. */
export async function endChild(child, milliseconds) {
  const ended = () => child.exitCode !== null || child.signalCode !== null;
  if (ended() || child.pid === undefined) return;
  child.kill('SIGTERM');
  if (await until(ended, milliseconds)) return;
  child.kill('SIGKILL');
  await until(ended, 2000);
}
