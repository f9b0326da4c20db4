import { createHash } from 'node:crypto';
import { canonicalJson } from '../../canonical-json.ts';

/** What an entry says, apart from the hashes that tie it to the one before. */
export interface ChainedEntry {
  readonly seq: number;
  /** As the database shows it: `2026-01-31 12:34:56.789000`, UTC. */
  readonly at: string;
  readonly actorId: number | null;
  readonly action: string;
  readonly subjectType: string;
  readonly subjectId: string;
  /** Canonical JSON. */
  readonly detail: string;
}

/** What the first entry follows. */
export const BEGINNING = '0'.repeat(64);

/** SHA-256 over the previous entry's hash and this entry in canonical form. */
export function entryHash(previousHash: string, entry: ChainedEntry): string {
  const { seq, at, actorId, action, subjectType, subjectId, detail } = entry;
  const canonical = canonicalJson({ seq, at, actorId, action, subjectType, subjectId, detail });
  return createHash('sha256').update(`${previousHash}\n${canonical}`).digest('hex');
}
