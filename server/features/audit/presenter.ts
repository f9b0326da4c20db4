import type { AuditEntry } from '@shared/contracts/audit.ts';

export interface AuditRow {
  seq: number;
  at: string;
  actorId: number | null;
  actorName: string | null;
  action: string;
  subjectType: string;
  subjectId: string;
  detail: string;
  hash: string;
}

export const presentEntry = (row: AuditRow): AuditEntry => ({
  seq: row.seq,
  at: `${row.at.replace(' ', 'T')}Z`,
  actor: row.actorId === null ? null : { id: row.actorId, name: row.actorName ?? '' },
  action: row.action,
  subjectType: row.subjectType,
  subjectId: row.subjectId,
  detail: JSON.parse(row.detail) as Record<string, unknown>,
  hash: row.hash,
});
