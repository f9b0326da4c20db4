import type { z } from 'zod';
import type { exportRecord } from '@shared/contracts/exports.ts';
import type { App } from '../../context.ts';

interface Entry {
  id: number;
  code: string;
  letter: string;
  content_hash: string;
  format: string;
  drawing_number: string;
  person_id: number;
  person_name: string;
  created_at: Date;
  file_hash: string;
}

/** Entries in one answer. */
const MOST = 1000;

/** What left for the drawing office, newest first. */
export async function listExports(app: App): Promise<z.input<typeof exportRecord>[]> {
  const entries = await app.db.select<Entry>(
    `SELECT e.id, f.code, r.letter, r.content_hash, e.format, e.drawing_number, e.person_id, p.name AS person_name,
       e.created_at, e.file_hash
     FROM exports e JOIN revisions r ON r.id = e.revision_id JOIN families f ON f.id = r.family_id
       JOIN people p ON p.id = e.person_id
     ORDER BY e.id DESC LIMIT ${MOST}`,
  );
  return entries.map((entry) => ({
    id: entry.id,
    familyCode: entry.code,
    letter: entry.letter,
    shortHash: entry.content_hash.slice(0, 12),
    format: entry.format,
    drawingNumber: entry.drawing_number,
    person: { id: entry.person_id, name: entry.person_name },
    createdAt: entry.created_at.toISOString(),
    fileHash: entry.file_hash,
  }));
}
