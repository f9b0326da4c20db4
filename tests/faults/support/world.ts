import { setTimeout as delay } from 'node:timers/promises';
import { pino } from 'pino';
import type { Definition } from '@shared/contracts/definition.ts';
import { loadConfig } from '@server/config/config.ts';
import { createContext, type App } from '@server/context.ts';
import { migrateDatabase } from '@server/database/migrate.ts';
import { createDatabase } from '@server/database/sequelize.ts';
import { createFamily } from '@server/features/families/service.ts';
import { contentHashOf } from '@server/features/revisions/content-service.ts';
import { startSweep } from '@server/features/sweeps/service.ts';
import type { SignedInPerson } from '@server/http/route.ts';

/** About 630 000 cells in sixteen pieces: long enough to be disturbed half-way. */
export const sweptFor: Definition = {
  schema: 1,
  kind: 'gusset-plate',
  basis: 'sans-10162-1-2011',
  parameters: {
    plate_thickness: { mode: 'range', from: 8, to: 20, step: 1 },
    weld_leg: { mode: 'list', values: [6, 8, 10] },
    rows: { mode: 'range', from: 2, to: 6, step: 1 },
    pitch: { mode: 'range', from: 60, to: 80, step: 5 },
    first_row: { mode: 'list', values: [160, 190] },
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
  },
  angles: { mode: 'range', from: -80, to: 80, step: 1 },
  senses: ['tension'],
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
};
export const cellsOfIt = 13 * 3 * 5 * 5 * 2 * 2 * 161;

export interface JobFacts {
  state: string;
  chunkCount: number;
  chunksDone: number;
  /** Raised each time a process takes the job up. */
  fence: number;
  owner: string | null;
  error: string | null;
}

/** A catalogue on a database, without anybody who works its queue: programs are started beside it. */
export interface World {
  readonly app: App;
  readonly manager: SignedInPerson;
  /** Defines a family and asks for its sweep. */
  ask(code: string): Promise<{ revisionId: number; jobId: number }>;
  job(id: number): Promise<JobFacts>;
  /** Waits until the job is as wanted, whatever the database does meanwhile. */
  until(jobId: number, wanted: (job: JobFacts) => boolean, seconds: number): Promise<JobFacts>;
  /** What a sweep amounts to: the hash over all cells, the hash of each piece, the rows. */
  outcome(revisionId: number, jobId: number): Promise<Outcome>;
  close(): Promise<void>;
}

export interface Outcome {
  readonly hash: string;
  readonly pieces: readonly { number: number; state: string; resultHash: string | null }[];
  readonly variants: number;
  readonly distinct: number;
  readonly rejectedCells: number | null;
  readonly state: string;
}

const selectJob = `SELECT state, chunk_count AS chunkCount, chunks_done AS chunksDone, fence, lease_owner AS owner, error
  FROM jobs WHERE id = :id`;

async function outcomeOf(app: App, revisionId: number, jobId: number): Promise<Outcome> {
  const row = await app.db.models.Revision.findByPk(revisionId, { rejectOnEmpty: true });
  const [counted] = await app.db.select<{ variants: number; distinct: number }>(
    'SELECT COUNT(*) AS variants, COUNT(DISTINCT params_hash) AS `distinct` FROM variants WHERE revision_id = :revisionId',
    { revisionId },
  );
  return {
    hash: await contentHashOf(app, row),
    pieces: await app.db.select(
      'SELECT number, state, result_hash AS resultHash FROM job_chunks WHERE job_id = :jobId ORDER BY number',
      { jobId },
    ),
    variants: Number(counted?.variants),
    distinct: Number(counted?.distinct),
    rejectedCells: row.rejectedCells,
    state: row.state,
  };
}

/** Migrates an empty database and puts one standards manager into it. */
export async function createWorld({
  ownerUrl,
  appUrl,
}: {
  ownerUrl: string;
  appUrl: string;
}): Promise<World> {
  await migrateDatabase(ownerUrl);
  const environment = { NODE_ENV: 'test', DATABASE_URL: appUrl, AUTH_SECRET: 'x'.repeat(40) };
  const db = createDatabase(appUrl, { connections: 4 });
  const app = createContext(loadConfig(environment), { db, log: pino({ level: 'silent' }) });
  const person = {
    name: 'The manager',
    email: 'standards@harrowquay.example',
    role: 'standards-manager',
  } as const;
  const { id } = await db.models.Person.create({ ...person, passwordHash: 'none' });
  const manager: SignedInPerson = { ...person, id, sessionId: 'faults' };
  const job = async (jobId: number): Promise<JobFacts> => {
    const [facts] = await db.select<JobFacts>(selectJob, { id: jobId });
    if (!facts) throw new Error(`There is no job ${jobId}`);
    return facts;
  };
  return {
    app,
    manager,
    job,
    async ask(code) {
      const family = await createFamily(app, manager, {
        code,
        title: 'To be disturbed',
        definition: sweptFor,
      });
      const revisionId = Number(family.working?.id);
      const row = await db.models.Revision.findByPk(revisionId, { rejectOnEmpty: true });
      const { id: jobId } = await startSweep(app, manager, revisionId, row.lockVersion);
      return { revisionId, jobId: Number(jobId) };
    },
    async until(jobId, wanted, seconds) {
      let last: JobFacts | undefined;
      for (const end = Date.now() + seconds * 1000; Date.now() < end; await delay(20)) {
        last = await job(jobId).catch(() => last);
        if (last && wanted(last)) return last;
      }
      throw new Error(`The job did not get there in ${seconds} s: ${JSON.stringify(last)}`);
    },
    outcome: (revisionId, jobId) => outcomeOf(app, revisionId, jobId),
    close: () => db.close(),
  };
}
