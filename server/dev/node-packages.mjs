import { existsSync, readFileSync } from 'node:fs';
import { PlainError, say } from './output.mjs';
import { inRoot } from './paths.mjs';
import { mustRun } from './run.mjs';
import { hashOf, readStamp, writeStamp } from './stamps.mjs';

const stampFile = inRoot('node_modules/.backmark-packages');
const hashNow = () => hashOf(['package-lock.json']);

/** True when every package that package.json names, tools included, lies in node_modules. */
function allPresent() {
  const { dependencies, devDependencies } = JSON.parse(readFileSync(inRoot('package.json'), 'utf8'));
  const names = Object.keys({ ...dependencies, ...devDependencies });
  return names.every((name) => existsSync(inRoot('node_modules', name, 'package.json')));
}

/** Notes that node_modules fits the lock file; npm calls this after an install. */
export function stampNodePackages() {
  if (allPresent()) writeStamp(stampFile, hashNow());
}

/** True when node_modules was installed from the lock file as it is now. */
export function nodePackagesReady() {
  return readStamp(stampFile) === hashNow() && allPresent();
}

/** Installs the locked packages, unless they are there. */
export async function ensureNodePackages() {
  if (nodePackagesReady()) return;
  say('Installing the locked packages ...');
  const npm = process.env.npm_execpath;
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  if (npm?.endsWith('.js')) await mustRun('npm ci', process.execPath, [npm, ...args]);
  else await mustRun('npm ci', 'npm', args);
  if (!allPresent()) throw new PlainError('npm ci ended, yet packages are missing from node_modules.');
  stampNodePackages();
}
