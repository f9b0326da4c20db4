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
