import { migrateDatabase } from './database/migrate.ts';

/* Brings the tables up to date, with the account that owns them. */
const url = process.env.DATABASE_MIGRATION_URL || process.env.DATABASE_URL;
if (!url) {
  console.error('DATABASE_MIGRATION_URL (or DATABASE_URL) must name the database.');
  process.exit(1);
}
try {
  const applied = await migrateDatabase(url.replace(/^mysql:/, 'mariadb:'));
  if (applied.length > 0) console.log(`The database is up to date (${applied.length} migrations applied).`);
} catch (error) {
  const { original, message } = error as Error & { original?: Error };
  console.error(`The database could not be brought up to date: ${original?.message ?? message}`);
  process.exit(1);
}
