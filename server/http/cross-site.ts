import type { Request } from 'express';
import type { Config } from '../config/config.ts';
import { problem } from './problems.ts';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);

function ownOrigins(req: Request, config: Config): string[] {
  const own = `${req.protocol}://${req.get('Host') ?? ''}`;
  return config.publicUrl ? [own, new URL(config.publicUrl).origin] : [own];
}

/**
 * Lets a change through only when it comes from our own pages: the browser says so (Sec-Fetch-Site, else Origin),
 * or, for a script without either, a header that no other site can set without being asked first.
 * @throws {ProblemError} cross-site
 */
export function refuseCrossSite(req: Request, config: Config): void {
  if (safe.has(req.method)) return;
  const site = req.get('Sec-Fetch-Site');
  const origin = req.get('Origin');
  if (site !== undefined && site !== 'same-origin') problem('cross-site');
  if (site === undefined && origin !== undefined && !ownOrigins(req, config).includes(origin)) {
    problem('cross-site');
  }
  if (site === undefined && origin === undefined && req.get('X-Requested-By') !== 'backmark') {
    problem('cross-site', {
      detail: 'A script must send the header X-Requested-By: backmark with a change.',
    });
  }
}
