import type { ErrorRequestHandler } from 'express';
import {
  ConnectionAcquireTimeoutError,
  ConnectionError,
  ForeignKeyConstraintError,
  OptimisticLockError,
  TimeoutError,
  UniqueConstraintError,
} from 'sequelize';
import type { Problem } from '@shared/contracts/common.ts';
import type { App } from '../context.ts';
import { errorNumber } from '../database/retry.ts';
import { ProblemError, type ProblemCode, type ProblemExtra } from './problems.ts';

const made = (code: ProblemCode, cause: unknown, extra: ProblemExtra = {}) =>
  new ProblemError(code, extra, { cause });

/** What the JSON parser and the router complain of. */
const byType: Record<string, ProblemCode> = {
  'entity.too.large': 'too-large',
  'entity.parse.failed': 'malformed',
  'request.aborted': 'malformed',
  'request.size.invalid': 'malformed',
  'encoding.unsupported': 'unsupported-media',
  'charset.unsupported': 'unsupported-media',
};

const conflict: ProblemCode = 'conflict';
/** MariaDB's own error numbers. */
const byNumber: Record<number, { code: ProblemCode; retryAfter?: number }> = {
  1020: { code: conflict },
  1205: { code: 'unavailable', retryAfter: 1 },
  1213: { code: 'unavailable', retryAfter: 1 },
  4025: { code: conflict },
  1021: { code: 'storage-full' },
  1114: { code: 'storage-full' },
  1040: { code: 'unavailable', retryAfter: 5 },
  1053: { code: 'unavailable', retryAfter: 5 },
  1927: { code: 'unavailable', retryAfter: 5 },
};
const lostConnection = /^(ER_SOCKET|ER_CMD_CONNECTION_CLOSED|ER_CONNECTION|ECONN|EPIPE|ETIMEDOUT)/;

const isAway = (error: unknown): boolean =>
  error instanceof ConnectionError ||
  error instanceof ConnectionAcquireTimeoutError ||
  error instanceof TimeoutError ||
  lostConnection.test((error as { original?: { code?: string } }).original?.code ?? '');

/** `families_code` is the unique key over `code`. */
function uniqueFault(error: UniqueConstraintError): ProblemExtra {
  const key = Object.keys(error.fields)[0] ?? '';
  const field = key.slice(key.indexOf('_') + 1).replace(/^.*\./, '');
  return {
    detail: `Another record has this ${field} already.`,
    errors: [{ field, message: `Another record has this ${field} already.` }],
  };
}

function fromDatabase(error: unknown): ProblemError | undefined {
  if (error instanceof UniqueConstraintError) return made('conflict', error, uniqueFault(error));
  if (error instanceof ForeignKeyConstraintError) {
    return made('conflict', error, { detail: 'Other records depend on it, or what it names is not there.' });
  }
  if (error instanceof OptimisticLockError) return made('stale-version', error);
  const number = errorNumber(error) ?? 0;
  if (number === 1644) return made('locked-record', error, { detail: lockedDetail(error) });
  const known = byNumber[number];
  if (known) return made(known.code, error, known.retryAfter ? { retryAfter: known.retryAfter } : {});
  return isAway(error) ? made('unavailable', error, { retryAfter: 5 }) : undefined;
}

function lockedDetail(error: unknown): string {
  const text = (error as { original?: { sqlMessage?: string } }).original?.sqlMessage ?? '';
  const reason = /RECORD_LOCKED: ([^\n]*)/.exec(text)?.[1];
  return reason
    ? `${reason.charAt(0).toUpperCase()}${reason.slice(1)}.`
    : 'A published record cannot be changed.';
}

/** The problem that an error amounts to; what nobody foresaw is 'internal' and tells nothing. */
export function toProblem(error: unknown): ProblemError {
  if (error instanceof ProblemError) return error;
  const { type = '', status } = (error ?? {}) as { type?: string; status?: number };
  const parser = byType[type];
  if (parser) return made(parser, error);
  if (error instanceof URIError) return made('not-found', error);
  if (status === 400 && type !== '') return made('malformed', error);
  return fromDatabase(error) ?? made('internal', error);
}

/** The body of a problem (RFC 9457). */
export function problemBody(fault: ProblemError, instance: string, requestId: string): Problem {
  const { detail, errors, current } = fault.extra;
  return {
    type: `urn:backmark:problem:${fault.code}`,
    title: fault.title,
    status: fault.status,
    code: fault.code,
    instance,
    requestId,
    ...(detail ? { detail } : {}),
    ...(errors ? { errors: [...errors] } : {}),
    ...(current === undefined ? {} : { current }),
  };
}

/** The one way out for everything that went wrong. */
export function errorHandler(app: App): ErrorRequestHandler {
  return (error, req, res, _next) => {
    const fault = toProblem(error);
    const { requestId } = res.locals as { requestId: string };
    if (fault.status >= 500) app.log.error({ requestId, err: fault.cause ?? fault }, fault.code);
    if (res.headersSent) return void res.destroy();
    const { retryAfter, headers = {} } = fault.extra;
    if (retryAfter) res.setHeader('Retry-After', String(retryAfter));
    for (const [name, value] of Object.entries(headers)) res.setHeader(name, value);
    res.setHeader('Cache-Control', 'no-store');
    res.removeHeader('ETag');
    res.status(fault.status).type('application/problem+json');
    res.send(JSON.stringify(problemBody(fault, req.path, requestId)));
  };
}
