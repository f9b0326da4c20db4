import { existsSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router } from 'express';
import { ProblemError } from './problems.ts';

const year = 31_536_000;

/**
 * The built client: hashed assets may be kept for ever, and every other address is one of its screens.
 * @param folder dist/client; when it is missing only the API is served
 */
export function staticFiles(folder: string): Router {
  const router = Router();
  const index = join(folder, 'index.html');
  const assets = express.static(join(folder, 'assets'), {
    immutable: true,
    maxAge: year * 1000,
    index: false,
    redirect: false,
  });
  router.use('/assets', assets, () => {
    throw new ProblemError('not-found');
  });
  router.use(express.static(folder, { index: false, redirect: false, maxAge: 0, dotfiles: 'ignore' }));
  router.use((req, res) => {
    if (req.method !== 'GET' && req.method !== 'HEAD') {
      throw new ProblemError('method-not-allowed', { headers: { Allow: 'GET, HEAD' } });
    }
    if (!existsSync(index)) throw new ProblemError('not-found');
    res.setHeader('Cache-Control', 'no-cache');
    res.sendFile(index, { cacheControl: false });
  });
  return router;
}
