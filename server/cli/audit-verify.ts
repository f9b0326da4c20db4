import { createDatabase } from '../database/sequelize.ts';
import { verifyAudit } from '../features/audit/verification-service.ts';

/*
 * npm run --silent audit:verify -- [NUMBER:HASH]
 * Works the audit trail out anew. A number and hash noted earlier also show a tail that was cut off.
 * Exit status: 0 sound, 1 faults, 2 not possible.
 */
function anchorOf(text: string | undefined): { seq: number; hash: string } | undefined {
  if (text === undefined) return undefined;
  const match = /^(\d{1,15}):([0-9a-f]{64})$/.exec(text);
  if (!match) throw new Error(`"${text}" is not an entry's number and hash, written 12:9f86d0….`);
  return { seq: Number(match[1]), hash: String(match[2]) };
}

async function main(): Promise<number> {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error('DATABASE_URL must name the database.');
  const anchor = anchorOf(process.argv[2]);
  const db = createDatabase(url, { connections: 1 });
  try {
    const { valid, entries, headHash, faults } = await verifyAudit(db, anchor);
    for (const { message } of faults) console.log(message);
    console.log(valid ? `Sound: ${entries} entries.` : `Not sound: ${entries} entries.`);
    console.log(`Head ${entries}:${headHash}`);
    return valid ? 0 : 1;
  } finally {
    await db.close();
  }
}

try {
  process.exitCode = await main();
} catch (error) {
  const { original, message } = error as Error & { original?: Error };
  console.error(`The trail could not be read: ${original?.message ?? message}`);
  process.exitCode = 2;
}
