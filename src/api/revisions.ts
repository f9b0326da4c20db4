import type { Definition } from '@shared/contracts/definition.ts';
import {
  revisionResponse,
  savedVersionsResponse,
  sweepResponse,
  type Revision,
} from '@shared/contracts/revisions.ts';
import { get, post, request } from './http.ts';

export const fetchRevision = (id: number, signal?: AbortSignal) =>
  get(revisionResponse, `/api/revisions/${id}`, signal ? { signal } : {});

export const fetchSaves = (id: number) => get(savedVersionsResponse, `/api/revisions/${id}/saves`);

/** Saves a definition over the version that was read; a ProblemError of status 412 says that it has moved on. */
export const saveDefinition = (id: number, lockVersion: number, definition: Definition) =>
  request(revisionResponse, 'PUT', `/api/revisions/${id}/definition`, { body: { definition }, lockVersion });

type Step = 'submit' | 'sign' | 'return' | 'publish' | 'lock' | 'withdraw';

const take = (step: Step, { id, lockVersion }: Pick<Revision, 'id' | 'lockVersion'>, body: unknown) =>
  post(revisionResponse, `/api/revisions/${id}/${step}`, { body, lockVersion });

type Versioned = Pick<Revision, 'id' | 'lockVersion'>;

export const startSweep = ({ id, lockVersion }: Versioned) =>
  post(sweepResponse, `/api/revisions/${id}/sweep`, { lockVersion });
export const submitRevision = (revision: Versioned, comment: string) => take('submit', revision, { comment });
export const signRevision = (revision: Versioned, comment: string) => take('sign', revision, { comment });
export const returnRevision = (revision: Versioned, comment: string) => take('return', revision, { comment });
export const withdrawRevision = (revision: Versioned, reason: string) =>
  take('withdraw', revision, { reason });
/** `confirm` is the family's code, typed by hand. */
export const publishRevision = (revision: Versioned, confirm: string) =>
  take('publish', revision, { confirm });
export const lockRevision = (revision: Versioned, confirm: string) => take('lock', revision, { confirm });
