import type { Database } from '../../database/database.ts';
import type { AuditRow } from './presenter.ts';

const columns = `
  SELECT audit.seq, CAST(audit.at AS CHAR) AS at, audit.actor_id AS actorId, people.name AS actorName, audit.action,
    audit.subject_type AS subjectType, audit.subject_id AS subjectId, audit.detail, audit.hash
  FROM audit LEFT JOIN people ON people.id = audit.actor_id`;

/** Entries before a number (or the newest), newest first. */
export function listAudit(
  db: Database,
  { before, count }: { before?: number | undefined; count: number },
): Promise<AuditRow[]> {
  const from = before ?? Number.MAX_SAFE_INTEGER;
  return db.select<AuditRow>(`${columns} WHERE audit.seq < :from ORDER BY audit.seq DESC LIMIT :count`, {
    from,
    count,
  });
}

/** The last entry's number and hash: kept outside the database they show a tail that was cut off. */
export async function auditHead(db: Database): Promise<{ seq: number; hash: string } | null> {
  const [head] = await db.select<{ seq: number; hash: string }>(
    'SELECT seq, hash FROM audit_head WHERE id = 1',
  );
  return head ?? null;
}
