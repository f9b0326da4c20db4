import type { Logger } from 'pino';
import type { Config } from './config/config.ts';
import { createLog } from './config/log.ts';
import { createDatabase, type Database } from './database/sequelize.ts';
import { createHub, type Hub } from './hub.ts';
import { createReadiness, type Readiness } from './readiness.ts';

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
  readonly readiness: Readiness;
  /** Aborted when the program begins to stop: streams end themselves, workers finish. */
  readonly stopping: AbortSignal;
}

/** The running queue and its workers, as `startJobs` hands it back. */
export interface Jobs {
  stop(): Promise<void>;
}

export const systemClock: Clock = { now: () => new Date() };

/** Makes the collaborators; nothing is connected or listened to yet. Tests replace what they watch. */
export function createContext(config: Config, replacements: Partial<App> = {}): App {
  return {
    db: replacements.db ?? createDatabase(config.databaseUrl),
    config,
    log: replacements.log ?? createLog(config),
    clock: replacements.clock ?? systemClock,
    hub: replacements.hub ?? createHub(),
    readiness: replacements.readiness ?? createReadiness(),
    stopping: replacements.stopping ?? new AbortController().signal,
  };
}
