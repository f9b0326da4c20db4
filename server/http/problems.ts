import type { Fault } from '@shared/contracts/common.ts';

/** Every way in which a request can fail: status, and the sentence that a person reads. */
const catalogue = {
  malformed: { status: 400, title: 'The request is not readable JSON.' },
  unauthenticated: { status: 401, title: 'Sign in first.' },
  'sign-in-refused': { status: 401, title: 'E-mail address and password do not match an active account.' },
  forbidden: { status: 403, title: 'Your role does not allow this.' },
  'cross-site': { status: 403, title: 'The request came from another site.' },
  'not-found': { status: 404, title: 'There is nothing here that you may see.' },
  'method-not-allowed': { status: 405, title: 'This address does not take that method.' },
  conflict: { status: 409, title: 'It contradicts what is stored already.' },
  'locked-record': { status: 409, title: 'A published record cannot be changed.' },
  'state-conflict': { status: 409, title: 'The record is not in a state that allows this.' },
  'stale-version': { status: 412, title: 'Someone else has changed it since you opened it.' },
  'too-large': { status: 413, title: 'The request is larger than 1 MB.' },
  'unsupported-media': { status: 415, title: 'Send JSON, with Content-Type: application/json.' },
  validation: { status: 422, title: 'Some fields need another value.' },
  'precondition-required': {
    status: 428,
    title: 'Say which version you change, with the header If-Match.',
  },
  'rate-limited': { status: 429, title: 'Too many attempts; wait a little.' },
  internal: { status: 500, title: 'Something went wrong on the server; it has been logged.' },
  unavailable: { status: 503, title: 'The database is not available just now; try again shortly.' },
  'storage-full': { status: 507, title: 'There is no room left to store this.' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof catalogue;

export interface ProblemExtra {
  /** A sentence about this very case. */
  detail?: string;
  errors?: readonly Fault[];
  /** For conflicts: the version that won. */
  current?: unknown;
  /** Seconds for the header Retry-After. */
  retryAfter?: number;
  headers?: Record<string, string>;
}

/** Thrown by whatever finds the fault; written out by the one exit handler. */
export class ProblemError extends Error {
  readonly code: ProblemCode;
  readonly status: number;
  readonly title: string;
  readonly extra: ProblemExtra;

  constructor(code: ProblemCode, extra: ProblemExtra = {}, options?: ErrorOptions) {
    super(extra.detail ?? catalogue[code].title, options);
    this.name = 'ProblemError';
    this.code = code;
    this.status = catalogue[code].status;
    this.title = catalogue[code].title;
    this.extra = extra;
  }
}

/** Ends the request with a problem. */
export function problem(code: ProblemCode, extra: ProblemExtra = {}): never {
  throw new ProblemError(code, extra);
}

/** Status and title of each problem, for the OpenAPI document. */
export const problemCatalogue: Readonly<Record<ProblemCode, { status: number; title: string }>> = catalogue;
