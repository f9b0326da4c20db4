import { existsSync, rmSync } from 'node:fs';
import { basename } from 'node:path';
import { build } from 'esbuild';
import { inRoot } from './paths.mjs';

const entries = [
  'server/main.ts',
  'server/migrate.ts',
  'server/demo.ts',
  'server/jobs/sweep-worker.ts',
  'server/cli/evaluate.ts',
  'server/cli/kinds.ts',
  'server/cli/verification.ts',
  'server/cli/audit-verify.ts',
];

/*
 * Every output lies flat in dist/server, shared chunks included, so that `new URL('./sweep-worker.js', import.meta.url)`
 * finds the worker from whatever chunk the pool ends up in.
 */
rmSync(inRoot('dist/server'), { recursive: true, force: true });
await build({
  entryPoints: Object.fromEntries(
    entries
      .filter((entry) => existsSync(inRoot(entry)))
      .map((entry) => [basename(entry, '.ts'), inRoot(entry)]),
  ),
  outdir: inRoot('dist/server'),
  absWorkingDir: inRoot(),
  bundle: true,
  splitting: true,
  format: 'esm',
  platform: 'node',
  target: 'node20',
  packages: 'external',
  alias: { '@shared': inRoot('shared'), '@catalog': inRoot('catalog'), '@server': inRoot('server') },
  sourcemap: true,
  logLevel: 'warning',
});
