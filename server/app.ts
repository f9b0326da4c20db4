import { fileURLToPath } from 'node:url';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import type { App } from './context.ts';
import { errorHandler } from './http/errors.ts';
import { mountRoutes } from './http/mount.ts';
import { rateLimits } from './http/rate-limits.ts';
import { requestLog } from './http/request-log.ts';
import type { RouteDeclaration } from './http/route.ts';
import { allRoutes } from './http/routes.ts';
import { securityHeaders } from './http/security-headers.ts';
import { staticFiles } from './http/static-files.ts';

/** dist/client, from server/ as from dist/server/. */
const clientFolder = (): string => {
  const built = import.meta.url.includes('/dist/server/');
  return fileURLToPath(new URL(built ? '../client' : '../dist/client', import.meta.url));
};

/**
 * The whole application without listening: tests use it as it is.
 * @param client folder of the built client
 */
export function createApp(
  app: App,
  routes: readonly RouteDeclaration[] = allRoutes,
  client: string = clientFolder(),
): Express {
  const server = express();
  server.disable('x-powered-by');
  server.set('etag', false);
  // No nesting and no arrays made of names: what is repeated stays a list, which the schemas refuse.
  server.set('query parser', 'simple');
  server.set('trust proxy', app.config.trustProxy);
  const limits = rateLimits(app.config);
  server.use(requestLog(app), securityHeaders(app.config));
  server.use('/api', limits.all);
  server.use(['/api/auth/sign-in', '/api/auth/refresh', '/api/auth/password'], limits.signIn);
  server.use(cookieParser());
  server.use(mountRoutes(app, routes));
  server.use(staticFiles(client));
  server.use(errorHandler(app));
  return server;
}
