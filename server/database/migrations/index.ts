import { people, sessions, signInFailures } from './001-people.ts';
import { definitionSaves, families, revisions } from './004-families.ts';
import { exports, signatures, variants } from './007-variants.ts';
import { jobChunks, jobs } from './010-jobs.ts';
import { audit, auditHead, settings } from './012-audit.ts';
import { revisionTriggers } from './015-revision-triggers.ts';
import { variantTriggers } from './016-variant-triggers.ts';
import { appendOnly } from './017-append-only.ts';
import { drawingSymbols } from './018-drawing-symbols.ts';
import { submissions } from './019-submissions.ts';
import type { Migration } from './migration.ts';

/** In the order in which they are applied. */
export const migrations: readonly Migration[] = [
  people,
  sessions,
  signInFailures,
  families,
  revisions,
  definitionSaves,
  variants,
  signatures,
  exports,
  jobs,
  jobChunks,
  audit,
  auditHead,
  settings,
  revisionTriggers,
  variantTriggers,
  appendOnly,
  drawingSymbols,
  submissions,
];
