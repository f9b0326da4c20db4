import { randomUUID } from 'node:crypto';
import { hostname } from 'node:os';
import { setTimeout as delay } from 'node:timers/promises';
import type { App, Jobs } from '../context.ts';
import { createPool, type SweepPool } from './pool.ts';
import { claimJob } from './queue.ts';
import { runSweep } from './run-sweep.ts';

/** Milliseconds between looks at the queue; news inside the process wakes it sooner. */
const POLL = 500;
const LONGEST_WAIT = 5000;

/** Starts the one runner of this process: it takes sweeps from the queue, one after the other. */
export async function startJobs(app: App): Promise<Jobs> {
  const stopping = new AbortController();
  const pool = createPool(app);
  const running = work(app, pool, stopping.signal);
  return {
    async stop() {
      stopping.abort();
      await running;
      await pool.destroy();
    },
  };
}

async function work(app: App, pool: SweepPool, stopping: AbortSignal): Promise<void> {
  const owner = `${hostname()}:${process.pid}:${randomUUID().slice(0, 8)}`;
  const news = createNews(app);
  let wait = POLL;
  while (!stopping.aborted) {
    try {
      const lease = await claimJob(app.db, owner);
      if (lease) await runSweep(app, pool, lease, stopping);
      else await news.orAfter(POLL, stopping);
      wait = POLL;
    } catch (error) {
      app.log.error({ err: error }, 'the queue could not be worked; trying again');
      await pause(wait, stopping);
      wait = Math.min(wait * 2, LONGEST_WAIT);
    }
  }
  news.end();
}

const pause = (milliseconds: number, signal: AbortSignal): Promise<void> =>
  delay(milliseconds, undefined, { signal }).catch(() => undefined);

/** Wakes when a sweep was asked for in this process, or after a while. */
function createNews(app: App) {
  let wake = new AbortController();
  const end = app.hub.subscribe('sweep-queued', () => wake.abort());
  return {
    end,
    async orAfter(milliseconds: number, stopping: AbortSignal): Promise<void> {
      await pause(milliseconds, AbortSignal.any([wake.signal, stopping]));
      wake = new AbortController();
    },
  };
}
