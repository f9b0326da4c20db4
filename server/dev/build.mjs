import { existsSync, rmSync } from 'node:fs';
import { say } from './output.mjs';
import { inRoot } from './paths.mjs';
import { mustRun } from './run.mjs';
import { hashOf, readStamp, writeStamp } from './stamps.mjs';

const stampFile = inRoot('dist/.backmark-build');
const sources = [
  'catalog',
  'index.html',
  'package-lock.json',
  'package.json',
  'server',
  'shared',
  'src',
  'tsconfig.json',
  'vite.config.ts',
];

/** Builds client and server, whatever is there already. */
export async function build() {
  rmSync(stampFile, { force: true });
  const hash = hashOf(sources);
  const production = { env: { NODE_ENV: 'production' } };
  const vite = [inRoot('node_modules/vite/bin/vite.js'), 'build', '--logLevel', 'warn'];
  await mustRun('Building the client', process.execPath, vite, production);
  await mustRun('Building the server', process.execPath, [inRoot('server/dev/build-server.mjs')], production);
  writeStamp(stampFile, hash);
}

/** Builds unless the last build was made from the sources as they are now. */
export async function ensureBuilt() {
  const built = existsSync(inRoot('dist/server/main.js')) && existsSync(inRoot('dist/client/index.html'));
  if (built && readStamp(stampFile) === hashOf(sources)) return;
  say('Building ...');
  await build();
}
