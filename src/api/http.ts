import type { z } from 'zod';
import { problemOf, unexpectedAnswer, unreachable, isAbort } from './problem.ts';

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
export type Query = Readonly<Record<string, string | number | boolean | undefined>>;

export interface RequestOptions {
  readonly query?: Query;
  readonly body?: unknown;
  /** The lock version that was read; sent as If-Match. */
  readonly lockVersion?: number;
  readonly signal?: AbortSignal;
}

let refreshing: Promise<boolean> | undefined;
let signedOut: () => void = () => undefined;

/** Told when a session has ended and cannot be renewed. */
export function onSignedOut(listener: () => void): void {
  signedOut = listener;
}

function addressOf(path: string, query: Query = {}): string {
  const given = Object.entries(query).flatMap(([name, value]) =>
    value === undefined ? [] : [[name, String(value)]],
  );
  return given.length ? `${path}?${new URLSearchParams(given).toString()}` : path;
}

async function send(method: Method, path: string, options: RequestOptions): Promise<Response> {
  const headers: Record<string, string> = { accept: 'application/json' };
  if (options.body !== undefined) headers['content-type'] = 'application/json';
  if (options.lockVersion !== undefined) headers['if-match'] = `"${options.lockVersion}"`;
  try {
    return await fetch(addressOf(path, options.query), {
      method,
      headers,
      credentials: 'same-origin',
      ...(options.body === undefined ? {} : { body: JSON.stringify(options.body) }),
      ...(options.signal ? { signal: options.signal } : {}),
    });
  } catch (error) {
    if (isAbort(error)) throw error;
    throw unreachable();
  }
}

/** Renews the session; every request that waits for it shares the one attempt. */
function refresh(): Promise<boolean> {
  refreshing ??= send('POST', '/api/auth/refresh', {})
    .then(async (response) => {
      await response.body?.cancel();
      return response.ok;
    })
    .finally(() => {
      refreshing = undefined;
    });
  return refreshing;
}

const isSignIn = (path: string) => path === '/api/auth/sign-in' || path === '/api/auth/demo-people';

/** Sends, renews the session once if it has run out, and throws a ProblemError for any answer but a good one. */
export async function call(method: Method, path: string, options: RequestOptions = {}): Promise<Response> {
  let response = await send(method, path, options);
  if (response.status === 401 && !isSignIn(path)) {
    if (await refresh()) response = await send(method, path, options);
    if (response.status === 401) signedOut();
  }
  if (!response.ok) throw await problemOf(response);
  return response;
}

/** Sends, and reads the answer by its contract. */
export async function request<Schema extends z.ZodType>(
  schema: Schema,
  method: Method,
  path: string,
  options: RequestOptions = {},
): Promise<z.output<Schema>> {
  const response = await call(method, path, options);
  const body: unknown = await response.json().catch(() => undefined);
  const parsed = schema.safeParse(body);
  if (!parsed.success) throw unexpectedAnswer(`${method} ${path}`);
  return parsed.data;
}

export const get = <Schema extends z.ZodType>(schema: Schema, path: string, options: RequestOptions = {}) =>
  request(schema, 'GET', path, options);

export const post = <Schema extends z.ZodType>(schema: Schema, path: string, options: RequestOptions = {}) =>
  request(schema, 'POST', path, options);
