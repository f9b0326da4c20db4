import type { Logger } from 'pino';
import type { Config } from './config/config.ts';
import type { Database } from './database/database.ts';
import type { Hub } from './hub.ts';

/** Tells the time; tests hand in their own. */
export interface Clock {
  now(): Date;
}

/** What services work with; made once at start, handed to every handler as `ctx.app`. */
export interface App {
  readonly db: Database;
  readonly config: Config;
  readonly log: Logger;
  readonly clock: Clock;
  readonly hub: Hub;
  /** Aborted when the program begins to stop: streams end themselves, workers finish. */
  readonly stopping: AbortSignal;
}

/** The running queue and its workers, as `startJobs` hands it back. */
export interface Jobs {
  stop(): Promise<void>;
}

export const systemClock: Clock = { now: () => new Date() };
