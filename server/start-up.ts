import { setTimeout as delay } from 'node:timers/promises';
import type { App, Jobs } from './context.ts';
import { auditHead } from './features/audit/list-service.ts';
import { databaseLacks } from './features/health/service.ts';

const longestWait = 5_000;
const reasons = { preparation: 'the data to be prepared', jobs: 'the workers' } as const;

/** Started by our own start command: it says when the tables and the demo data are there. */
function prepared(stopping: AbortSignal): Promise<void> {
  if (!process.send) return Promise.resolve();
  return new Promise((resolve) => {
    process.on('message', (message) => {
      if (message === 'prepared') resolve();
    });
    stopping.addEventListener('abort', () => resolve());
  });
}

/** Asks the database again and again, waiting longer each time, until its tables fit this program. */
async function databaseUp(app: App): Promise<void> {
  let said = '';
  for (let wait = 100; !app.stopping.aborted; wait = Math.min(wait * 2, longestWait)) {
    const missing = (await databaseLacks(app)).join(', ');
    if (missing === '') return;
    if (missing !== said) app.log.info(`waiting for ${missing}`);
    said = missing;
    await delay(wait, undefined, { signal: app.stopping }).catch(() => undefined);
  }
}

async function startAll(app: App, services: readonly ((app: App) => Promise<Jobs>)[]): Promise<Jobs> {
  const started: Jobs[] = [];
  for (const start of services) started.push(await start(app));
  return { stop: async () => void (await Promise.all(started.map((service) => service.stop()))) };
}

/**
 * Waits for the database, its tables and the word of the start command, then starts what runs beside the requests.
 * @returns the way to stop it, or null when the program was stopped before
 */
export async function bringUp(
  app: App,
  services: readonly ((app: App) => Promise<Jobs>)[],
): Promise<Jobs | null> {
  for (const reason of Object.values(reasons)) app.readiness.wait(reason);
  await prepared(app.stopping);
  app.readiness.done(reasons.preparation);
  await databaseUp(app);
  if (app.stopping.aborted) return null;
  app.log.info({ head: await auditHead(app.db) }, 'audit trail');
  const jobs = await startAll(app, services);
  app.readiness.done(reasons.jobs);
  return jobs;
}
