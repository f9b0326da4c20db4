import type { Request, Response } from 'express';
import type { Logger } from 'pino';
import type { z } from 'zod';
import type { Role } from '@shared/contracts/common.ts';
import type { App } from '../context.ts';

/** The signed-in person, read from the database for this very request. */
export interface SignedInPerson {
  readonly id: number;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly sessionId: string;
}

/** Who may call a route. There is no default: "public" is written out. */
export type Who = 'public' | 'signed-in' | readonly Role[];

type Parsed<S> = S extends z.ZodType ? z.output<S> : Record<string, never>;

/** What a handler is given; everything in it has been checked. */
export interface RouteContext<W extends Who = Who, P = unknown, Q = unknown, B = unknown> {
  readonly app: App;
  readonly person: W extends 'public' ? SignedInPerson | null : SignedInPerson;
  readonly params: Parsed<P>;
  readonly query: Parsed<Q>;
  readonly body: B extends z.ZodType ? z.output<B> : undefined;
  /** The lock version from If-Match; 0 on a route that does not ask for one. */
  readonly ifMatch: number;
  readonly req: Request;
  readonly res: Response;
  readonly log: Logger;
  readonly requestId: string;
  /** Names the version of the answer: a lock version, or a hash for what never changes. */
  etag(version: number | string): void;
}

/** A schema; 'stream': the handler writes `res` itself; 'empty': 204 without a body. */
export type ResponseKind = z.ZodType | 'stream' | 'empty';
type Answer<R> = R extends z.ZodType ? z.input<R> : void;

export interface RouteOptions<
  W extends Who,
  P extends z.ZodType | undefined,
  Q extends z.ZodType | undefined,
  B extends z.ZodType | undefined,
  R extends ResponseKind,
> {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Express path, e.g. `/api/revisions/:id`. */
  path: string;
  summary: string;
  who: W;
  params?: P;
  query?: Q;
  body?: B;
  response: R;
  /** Of a good answer; 200, or 204 when the response is empty. */
  status?: number;
  /** 428 without If-Match. */
  ifMatch?: boolean;
  /** May be kept by the browser: what is named by its hash. Otherwise `no-store`. */
  cache?: 'revalidate' | 'immutable';
  handler: (ctx: RouteContext<W, P, Q, B>) => Promise<Answer<R>> | Answer<R>;
}

/** A route as it is mounted, listed and described. */
export interface RouteDeclaration {
  readonly feature: string;
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  readonly path: string;
  readonly summary: string;
  readonly who: Who;
  readonly params?: z.ZodType | undefined;
  readonly query?: z.ZodType | undefined;
  readonly body?: z.ZodType | undefined;
  readonly response: ResponseKind;
  readonly status: number;
  readonly ifMatch: boolean;
  readonly cache?: 'revalidate' | 'immutable' | undefined;
  readonly handler: (ctx: RouteContext) => unknown;
}
type UnnamedRoute = Omit<RouteDeclaration, 'feature'>;

/** Declares one route; the handler's types follow from the schemas. */
export function route<
  const W extends Who,
  R extends ResponseKind,
  P extends z.ZodType | undefined = undefined,
  Q extends z.ZodType | undefined = undefined,
  B extends z.ZodType | undefined = undefined,
>(options: RouteOptions<W, P, Q, B, R>): UnnamedRoute {
  const { handler, status, ifMatch = false, ...rest } = options;
  return {
    ...rest,
    status: status ?? (options.response === 'empty' ? 204 : 200),
    ifMatch,
    // The pipeline hands over only what the schemas of this declaration have parsed.
    handler: handler as unknown as RouteDeclaration['handler'],
  };
}

/** The routes of one feature; listed in routes.ts, there is no other way to mount one. */
export function defineRoutes(feature: string, routes: readonly UnnamedRoute[]): readonly RouteDeclaration[] {
  return routes.map((declared) => ({ feature, ...declared }));
}
