import express, { type Request, type RequestHandler, type Response } from 'express';
import { z } from 'zod';
import type { App } from '../context.ts';
import { sessionPerson } from '../features/auth/session-service.ts';
import { readCookie } from './cookies.ts';
import { refuseCrossSite } from './cross-site.ts';
import { problem } from './problems.ts';
import type { RouteContext, RouteDeclaration, SignedInPerson } from './route.ts';
import { checkAll } from './validation.ts';

const nothing = z.strictObject({});
const poisoned = new Set(['__proto__', 'constructor', 'prototype']);

const parseJson = express.json({
  limit: '1mb',
  reviver(key, value: unknown) {
    if (poisoned.has(key)) throw new SyntaxError('A name that cannot be given.');
    return value;
  },
});

/** Reads the body; one that is not JSON is refused before it is read. */
async function readBody(declared: RouteDeclaration, req: Request, res: Response): Promise<void> {
  const length = req.get('Content-Length');
  const hasBody = (length !== undefined && length !== '0') || req.get('Transfer-Encoding') !== undefined;
  if (hasBody && !req.is('application/json')) problem('unsupported-media');
  if (!declared.body || !hasBody) return;
  await new Promise<void>((resolve, reject) =>
    parseJson(req, res, (error?: unknown) => (error ? reject(error as Error) : resolve())),
  );
}

/** The lock version in If-Match, written as `"7"`. */
function lockVersion(declared: RouteDeclaration, req: Request): number {
  if (!declared.ifMatch) return 0;
  const given = /^(?:W\/)?"?(\d{1,9})"?$/.exec(req.get('If-Match') ?? '')?.[1];
  if (given === undefined) problem('precondition-required');
  return Number(given);
}

async function identify(app: App, declared: RouteDeclaration, req: Request): Promise<SignedInPerson | null> {
  const token = readCookie(req, app.config, 'access');
  const person = token === undefined ? null : await sessionPerson(app, token);
  const { who } = declared;
  if (who === 'public') return person;
  if (!person) return problem('unauthenticated');
  // What is not plainly allowed is refused, also for a declaration that escaped the compiler.
  if (who !== 'signed-in' && !(Array.isArray(who) && who.includes(person.role))) {
    app.log.warn({ personId: person.id, role: person.role, route: declared.path }, 'refused by role');
    problem('forbidden');
  }
  return person;
}

const caching = {
  revalidate: 'private, no-cache',
  immutable: 'private, max-age=31536000, immutable',
} as const;

async function answer(declared: RouteDeclaration, res: Response, result: unknown): Promise<void> {
  const { response, status } = declared;
  if (response === 'stream') return;
  if (response === 'empty') return void res.status(status).end();
  res.status(status).json(await response.parseAsync(result));
}

/** Everything a request goes through, in the same order for each route. */
export function pipeline(app: App, declared: RouteDeclaration): RequestHandler {
  return async (req, res) => {
    const { requestId } = res.locals as { requestId: string };
    res.locals.route = declared.path;
    res.setHeader('Cache-Control', declared.cache ? caching[declared.cache] : 'no-store');
    refuseCrossSite(req, app.config);
    const person = await identify(app, declared, req);
    res.locals.personId = person?.id;
    await readBody(declared, req, res);
    const parts = checkAll({
      params: [declared.params ?? nothing, req.params],
      query: [declared.query ?? nothing, { ...req.query }],
      body: [declared.body ?? z.undefined(), declared.body ? (req.body as unknown) : undefined],
    });
    const ctx = {
      app,
      person,
      ...parts,
      ifMatch: lockVersion(declared, req),
      req,
      res,
      log: app.log.child({ requestId, personId: person?.id }),
      requestId,
      etag: (version: number | string) => void res.setHeader('ETag', `"${version}"`),
    };
    await answer(declared, res, await declared.handler(ctx as unknown as RouteContext));
  };
}
