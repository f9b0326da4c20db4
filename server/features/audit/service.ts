import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { canonicalJson } from '../../canonical-json.ts';
import { entryHash, type ChainedEntry } from './chain.ts';

export interface AuditEvent {
  /** Null for what the program does by itself. */
  readonly actorId: number | null;
  /** `family.created`, `revision.published`: subject and past tense. */
  readonly action: string;
  readonly subjectType: string;
  readonly subjectId: string | number;
  readonly detail?: Record<string, unknown>;
}

/** A moment as DATETIME(6) text in UTC, the very text the hash is taken over. */
const stamp = (moment: Date): string => `${moment.toISOString().slice(0, -1).replace('T', ' ')}000`;

/**
 * Adds an entry to the audit trail, in the transaction of the change itself: both happen or neither.
 * The head row is held until that transaction ends, so call it last.
 */
export async function appendAudit(
  transaction: Transaction,
  event: AuditEvent,
  now: Date = new Date(),
): Promise<void> {
  const { sequelize } = transaction as Transaction & { sequelize: Sequelize };
  const [head] = await sequelize.query<{ seq: number; hash: string }>(
    'SELECT seq, hash FROM audit_head WHERE id = 1 FOR UPDATE',
    { transaction, type: QueryTypes.SELECT },
  );
  if (!head) throw new Error('The audit trail has no head row.');
  const entry = entryAfter(head.seq, event, now);
  const hash = entryHash(head.hash, entry);
  await sequelize.query(
    `INSERT INTO audit (seq, at, actor_id, action, subject_type, subject_id, detail, previous_hash, hash)
     VALUES (:seq, :at, :actorId, :action, :subjectType, :subjectId, :detail, :previousHash, :hash)`,
    { transaction, replacements: { ...entry, previousHash: head.hash, hash } },
  );
  await sequelize.query('UPDATE audit_head SET seq = :seq, hash = :hash WHERE id = 1', {
    transaction,
    replacements: { seq: entry.seq, hash },
  });
}

function entryAfter(seq: number, event: AuditEvent, now: Date): ChainedEntry {
  return {
    seq: seq + 1,
    at: stamp(now),
    actorId: event.actorId,
    action: event.action,
    subjectType: event.subjectType,
    subjectId: String(event.subjectId),
    detail: canonicalJson(event.detail ?? {}),
  };
}
