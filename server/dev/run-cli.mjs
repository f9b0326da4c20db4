import { spawn } from 'node:child_process';
import { pathToFileURL } from 'node:url';
import { ensureNodePackages } from './node-packages.mjs';
import { sayFailure } from './output.mjs';
import { inRoot, root } from './paths.mjs';

/*
 * Runs a TypeScript command of ours: `node server/dev/run-cli.mjs server/cli/evaluate.ts cases.json`.
 * Only the command itself writes to standard output; installing missing packages is told on standard error.
 */
const [script, ...args] = process.argv.slice(2);
try {
  await ensureNodePackages();
  const tsx = pathToFileURL(inRoot('node_modules/tsx/dist/loader.mjs')).href;
  const child = spawn(process.execPath, ['--import', tsx, inRoot(script), ...args], {
    cwd: root,
    stdio: 'inherit',
  });
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal));
  child.once('exit', (code) => process.exit(code ?? 1));
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
