import { createHash } from 'node:crypto';
import { existsSync, lstatSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir, userInfo } from 'node:os';
import { join } from 'node:path';
import { PlainError, say } from './output.mjs';
import { argumentsOf, endLeftOver } from './processes.mjs';
import { run } from './run.mjs';
import { findProgram } from './system-packages.mjs';

const longestSocketPath = 100;

/** A folder with a short name, the same at every start for the same data folder, that only we may enter. */
function shortFolder(folder) {
  const name = createHash('sha256').update(folder).digest('hex').slice(0, 16);
  const short = join(tmpdir(), `backmark-${process.getuid?.() ?? ''}-${name}`);
  mkdirSync(short, { recursive: true, mode: 0o700 });
  const { uid, mode } = lstatSync(short);
  if (uid !== userInfo().uid || (mode & 0o777) !== 0o700) {
    throw new PlainError(`${short} is in the way: it belongs to somebody else or is open to others.`);
  }
  return short;
}

/** Every path one database server uses, all below `folder` but for a socket whose path would be too long. */
export function serverFiles(folder) {
  const datadir = join(folder, 'mariadb');
  const socket = join(folder, 'mariadb.sock');
  return {
    folder,
    datadir,
    socket: Buffer.byteLength(socket) <= longestSocketPath ? socket : join(shortFolder(folder), 's'),
    pidFile: join(datadir, 'mariadbd.pid'),
    log: join(folder, 'mariadb.log'),
    initFile: join(folder, 'mariadb-init.sql'),
    accounts: join(folder, 'mariadb-accounts.json'),
  };
}

/** As root the server must be told that it may run as root; another user is simply kept. */
export const userFlag = () => (process.getuid?.() === 0 ? ['--user=root'] : []);

/** Makes an empty data folder, whole or not at all: it gets its name when it is complete. */
export async function installDatadir(files) {
  if (existsSync(files.datadir)) return;
  mkdirSync(files.folder, { recursive: true, mode: 0o700 });
  const unfinished = `${files.datadir}.new`;
  rmSync(unfinished, { recursive: true, force: true });
  const log = `${files.log}.install`;
  const args = [
    '--no-defaults',
    ...userFlag(),
    `--datadir=${unfinished}`,
    '--auth-root-authentication-method=socket',
    `--auth-root-socket-user=${userInfo().username}`,
    '--skip-test-db',
    '--skip-name-resolve',
  ];
  writeFileSync(log, '');
  const code = await run('sh', [
    '-c',
    'exec "$@" >"$0" 2>&1',
    log,
    findProgram('mariadb-install-db'),
    ...args,
  ]);
  if (code !== 0) throw new PlainError(`The database's folder could not be made; ${log} says why.`);
  rmSync(log);
  renameSync(unfinished, files.datadir);
}

/** Stops a server that an earlier, killed run left on this very data folder. */
export async function endLeftOverServer(files) {
  if (!existsSync(files.pidFile)) return;
  const pid = Number(readFileSync(files.pidFile, 'utf8').trim());
  if (!(pid > 1) || !argumentsOf(pid).includes(`--datadir=${files.datadir}`)) return;
  say('A database server of an earlier run is still there; stopping it ...');
  await endLeftOver(pid, 20_000);
}
