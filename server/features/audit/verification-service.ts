import type { Transaction } from 'sequelize';
import type { Database } from '../../database/database.ts';
import { BEGINNING, entryHash, type ChainedEntry } from './chain.ts';

export interface ChainFault {
  readonly seq: number;
  readonly message: string;
}
export interface ChainVerification {
  readonly valid: boolean;
  readonly entries: number;
  readonly headHash: string;
  readonly faults: readonly ChainFault[];
}
type StoredEntry = ChainedEntry & { readonly previousHash: string; readonly hash: string };

const pageSize = 2_000;
const mostFaults = 100;

const page = `
  SELECT seq, CAST(at AS CHAR) AS at, actor_id AS actorId, action, subject_type AS subjectType,
    subject_id AS subjectId, detail, previous_hash AS previousHash, hash
  FROM audit WHERE seq > :after ORDER BY seq LIMIT ${pageSize}`;

/** What is wrong with an entry that follows another. */
function faultsOf(entry: StoredEntry, previous: { seq: number; hash: string }): ChainFault[] {
  const { seq } = entry;
  const said: string[] = [];
  if (seq !== previous.seq + 1) said.push(`entries ${previous.seq + 1} to ${seq - 1} are missing`);
  if (entry.previousHash !== previous.hash) said.push('it does not follow the entry before it');
  if (entryHash(entry.previousHash, entry) !== entry.hash)
    said.push('its content was altered after it was written');
  return said.map((message) => ({ seq, message: `Entry ${seq}: ${message}.` }));
}

/**
 * Works every hash of the trail out anew, and compares its end with the head row.
 * A tail cut off together with a head set back is seen only by a head hash kept elsewhere; hand it in as `anchor`.
 */
export async function verifyAudit(
  db: Database,
  anchor?: { seq: number; hash: string },
): Promise<ChainVerification> {
  return db.transaction(async (transaction) => {
    const [head] = await db.select<{ seq: number; hash: string }>(
      'SELECT seq, hash FROM audit_head WHERE id = 1 LOCK IN SHARE MODE',
      undefined,
      transaction,
    );
    const { last, entries, faults } = await walk(db, transaction, anchor);
    if (!head) faults.push({ seq: last.seq, message: 'The head of the trail is missing.' });
    else if (head.seq !== last.seq || head.hash !== last.hash) {
      faults.push({
        seq: head.seq,
        message: `The trail ends with entry ${last.seq}, but its head names ${head.seq}.`,
      });
    }
    return {
      valid: faults.length === 0,
      entries,
      headHash: head?.hash ?? '',
      faults: faults.slice(0, mostFaults),
    };
  });
}

async function walk(db: Database, transaction: Transaction, anchor?: { seq: number; hash: string }) {
  const faults: ChainFault[] = [];
  let last = { seq: 0, hash: BEGINNING };
  let entries = 0;
  let anchored = anchor === undefined;
  for (;;) {
    const rows = await db.select<StoredEntry>(page, { after: last.seq }, transaction);
    for (const entry of rows) {
      faults.push(...faultsOf(entry, last));
      if (entry.seq === anchor?.seq && entry.hash === anchor.hash) anchored = true;
      last = { seq: entry.seq, hash: entry.hash };
    }
    entries += rows.length;
    if (rows.length < pageSize) break;
  }
  if (!anchored && anchor) {
    faults.push({ seq: anchor.seq, message: `Entry ${anchor.seq} is not the one whose hash was kept.` });
  }
  return { last, entries, faults };
}
