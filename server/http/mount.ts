import { Router, type RequestHandler } from 'express';
import type { App } from '../context.ts';
import { pipeline } from './pipeline.ts';
import { ProblemError } from './problems.ts';
import type { RouteDeclaration } from './route.ts';

/** 405 with the methods that the address does take. */
function otherMethods(routes: readonly RouteDeclaration[]): RequestHandler {
  const methods = routes.flatMap(({ method }) =>
    method === 'get' ? ['GET', 'HEAD'] : [method.toUpperCase()],
  );
  const allow = [...new Set(methods)].join(', ');
  return () => {
    throw new ProblemError('method-not-allowed', {
      detail: `It takes ${allow}.`,
      headers: { Allow: allow },
    });
  };
}

/** A router with the listed routes, and an answer for every other address and method under /api. */
export function mountRoutes(app: App, routes: readonly RouteDeclaration[]): Router {
  const router = Router({ caseSensitive: true, strict: true });
  for (const declared of routes) router[declared.method](declared.path, pipeline(app, declared));
  for (const path of new Set(routes.map((declared) => declared.path))) {
    router.all(path, otherMethods(routes.filter((declared) => declared.path === path)));
  }
  router.use('/api', () => {
    throw new ProblemError('not-found');
  });
  return router;
}
