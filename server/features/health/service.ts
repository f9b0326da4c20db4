import type { App } from '../../context.ts';
import { migrationState } from '../../database/migrator.ts';

const patience = 3_000;

/** Rejects when the work takes too long, as it does on a connection that nobody answers. */
async function within<T>(work: Promise<T>): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => reject(new Error('no answer in time')), patience);
  });
  try {
    return await Promise.race([work, late]);
  } finally {
    clearTimeout(timer);
  }
}

/** What the database lacks, in words; empty when its tables fit this program. */
export async function databaseLacks(app: App): Promise<string[]> {
  try {
    const { missing, unknown } = await within(migrationState(app.db.sequelize));
    if (unknown.length > 0) return ['a newer Backmark, which made this database'];
    return missing.length > 0 ? ['the tables to be brought up to date'] : [];
  } catch (error) {
    const { original } = error as { original?: { errno?: number } };
    // No such table: nothing was migrated yet.
    return original?.errno === 1146 ? ['the tables to be made'] : ['the database'];
  }
}

/** Everything that still keeps the program from serving. */
export async function whatIsMissing(app: App): Promise<string[]> {
  const known = app.readiness.waitingFor();
  return known.length > 0 ? [...known] : databaseLacks(app);
}
