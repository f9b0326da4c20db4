import { createHash } from 'node:crypto';
import type { ExportRequest } from '@shared/contracts/exports.ts';
import type { App } from '../../context.ts';
import { fileName } from '../../documents/xlsx/text.ts';
import { writeWorkbook } from '../../documents/xlsx/workbook.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { appendAudit } from '../audit/service.ts';
import { placeOfSense, type SweptRevision, sweptRevision } from '../results/service.ts';
import { isCurrent, isIssued, visibleRevision } from '../revisions/service.ts';
import { documentOf } from './document-service.ts';

/** A finished file, entered in the register. */
export interface ExportedFile {
  readonly name: string;
  readonly file: Buffer;
  /** SHA-256 of the file. */
  readonly hash: string;
}

/**
 * Makes a file of capacity tables of a revision that was published, and enters it in the register.
 * @throws {ProblemError} not-found, state-conflict, validation with every fault of the layout
 */
export async function exportTables(
  app: App,
  person: SignedInPerson,
  request: ExportRequest,
): Promise<ExportedFile> {
  const row = await visibleRevision(app, person, request.revisionId);
  if (!isIssued(row.state)) {
    problem('state-conflict', {
      detail: `Only what was published is exported; this revision is ${row.state}.`,
    });
  }
  const swept = await sweptRevision(app, person, request.revisionId);
  placeOfSense(swept, request.sense);
  const file = await writeWorkbook(await documentOf(app, person, swept, request));
  const hash = createHash('sha256').update(file).digest('hex');
  await register(app, person, swept, request, hash);
  return { name: nameOf(swept, request), file, hash };
}

const nameOf = ({ row, family }: SweptRevision, { sense }: ExportRequest): string =>
  fileName(family.code, row.letter ?? '', sense, ...(isCurrent(row.state) ? [] : [row.state.toUpperCase()]));

/** The file says in which state the revision was; should that have changed meanwhile, it is not handed out. */
async function register(
  app: App,
  person: SignedInPerson,
  { row, family }: SweptRevision,
  request: ExportRequest,
  fileHash: string,
): Promise<void> {
  const { format, drawingNumber, revisionId, ...layout } = request;
  const now = app.clock.now();
  await app.db.transaction(async (transaction) => {
    const held = await visibleRevision(app, person, revisionId, transaction);
    if (held.state !== row.state) {
      problem('state-conflict', { detail: `It became ${held.state} while the file was made. Ask again.` });
    }
    const entry = {
      revisionId,
      personId: person.id,
      format,
      drawingNumber,
      layout,
      fileHash,
      createdAt: now,
    };
    const { id } = await app.db.models.Export.create(entry, { transaction });
    await appendAudit(
      transaction,
      {
        actorId: person.id,
        action: 'table.exported',
        subjectType: 'export',
        subjectId: id,
        detail: { family: family.code, letter: row.letter, revision: revisionId, drawingNumber, fileHash },
      },
      now,
    );
  });
}
