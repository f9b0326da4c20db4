import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { PlainError, say } from './output.mjs';
import { mustRun } from './run.mjs';

const folders = () => [
  ...(process.env.PATH ?? '').split(delimiter),
  '/usr/sbin',
  '/usr/bin',
  '/usr/local/bin',
];

/** The path of a program on this machine, or undefined. */
export function findProgram(name) {
  return folders()
    .map((folder) => join(folder, name))
    .find((path) => existsSync(path));
}

const mariadb = {
  programs: ['mariadbd', 'mariadb-install-db'],
  packages: ['mariadb-server-core', 'mariadb-client-core'],
};
const chromium = { programs: ['chromium'], packages: ['chromium'] };

/**
 * Installs what is missing from Debian. The -core packages of MariaDB hold the server program only: no system
 * service is set up and nothing of ours runs outside this folder.
 */
export async function ensureSystemPackages({ database, browser }) {
  const wanted = [...(database ? [mariadb] : []), ...(browser ? [chromium] : [])];
  const missing = wanted
    .filter(({ programs }) => !programs.every(findProgram))
    .flatMap(({ packages }) => packages);
  if (missing.length === 0) return;
  const command = `apt-get update && apt-get install -y --no-install-recommends ${missing.join(' ')}`;
  if (process.getuid?.() !== 0 || !findProgram('apt-get')) {
    throw new PlainError(
      `Missing on this machine: ${missing.join(', ')}. Run this once, then try again:\n  sudo sh -c '${command}'`,
    );
  }
  say(`Installing from Debian: ${missing.join(', ')} ...`);
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  await mustRun('apt-get update', 'apt-get', ['-q', 'update'], { env });
  const install = ['-q', 'install', '-y', '--no-install-recommends', ...missing];
  await mustRun('apt-get install', 'apt-get', install, { env });
}
