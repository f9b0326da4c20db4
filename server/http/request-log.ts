import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { App } from '../context.ts';

interface Noted {
  requestId: string;
  route?: string;
  personId?: number;
}

/** Names the request, and writes one line when it is over: never its query, body or headers. */
export function requestLog(app: App): RequestHandler {
  return (req, res, next) => {
    const began = performance.now();
    const locals = res.locals as Noted;
    locals.requestId = randomUUID();
    res.setHeader('X-Request-Id', locals.requestId);
    res.once('close', () => {
      const { requestId, personId, route } = locals;
      const ms = Math.round((performance.now() - began) * 10) / 10;
      const line = {
        requestId,
        personId,
        method: req.method,
        route: route ?? 'none',
        status: res.statusCode,
        ms,
      };
      app.log.info(res.writableFinished ? line : { ...line, broken: true }, 'request');
    });
    next();
  };
}
