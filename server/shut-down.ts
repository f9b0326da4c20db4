import type { Server } from 'node:http';
import type { App, Jobs } from './context.ts';

const patience = 4_000;
const hardLimit = 7_500;

export interface Running {
  readonly app: App;
  readonly server: Server;
  readonly jobs: Promise<Jobs | null>;
  readonly stopping: AbortController;
}

/** Lets requests end, then ends those that do not. */
function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const force = setTimeout(() => server.closeAllConnections(), patience);
    server.close(() => {
      clearTimeout(force);
      resolve();
    });
    server.closeIdleConnections();
  });
}

async function stopJobs(app: App, jobs: Promise<Jobs | null>): Promise<void> {
  try {
    await (await jobs)?.stop();
  } catch (error) {
    app.log.error({ err: error }, 'the workers did not stop cleanly');
  }
}

/** Not ready, no new work, streams and requests ended, connections closed: exit 0, or 1 when that takes too long. */
export async function shutDown({ app, server, jobs, stopping }: Running): Promise<void> {
  if (stopping.signal.aborted) return;
  app.readiness.wait('the next start');
  stopping.abort();
  setTimeout(() => process.exit(1), hardLimit).unref();
  await Promise.all([close(server), stopJobs(app, jobs)]);
  await app.db.close();
  process.exit(0);
}
