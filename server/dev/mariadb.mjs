import { spawn } from 'node:child_process';
import { realpathSync, rmSync } from 'node:fs';
import { databaseUrl } from './mariadb-accounts.mjs';
import { endLeftOverServer, installDatadir, serverFiles, userFlag } from './mariadb-files.mjs';
import { PlainError } from './output.mjs';
import { freePortNear } from './ports.mjs';
import { writePrivate } from './secrets.mjs';
import { findProgram } from './system-packages.mjs';
import { endChild, until } from './waiting.mjs';

const readyWithin = 60_000;
const stopWithin = 4_000;
const attempts = 5;

const flags = (files, port) => [
  '--no-defaults',
  ...userFlag(),
  `--datadir=${files.datadir}`,
  `--port=${port}`,
  '--bind-address=127.0.0.1',
  `--socket=${files.socket}`,
  `--pid-file=${files.pidFile}`,
  `--log-error=${files.log}`,
  `--init-file=${files.initFile}`,
  '--skip-name-resolve',
  '--local-infile=OFF',
  '--character-set-server=utf8mb4',
  '--collation-server=utf8mb4_unicode_ci',
  '--default-time-zone=+00:00',
  '--max-allowed-packet=64M',
  '--innodb-buffer-pool-size=256M',
  '--innodb-log-file-size=64M',
  // A commit that was answered is on the disk, and a lost race is an error rather than a lost change.
  '--innodb-flush-log-at-trx-commit=1',
  '--innodb-snapshot-isolation=ON',
  '--transaction-isolation=READ-COMMITTED',
  '--sql-mode=STRICT_TRANS_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION',
];

/** True when the server on the port takes our account and keeps our folder: another one may hold the port. */
async function isOurs(files, port, account) {
  const { createConnection } = await import('mariadb');
  try {
    const address = { host: '127.0.0.1', port, user: account.user, password: account.password };
    const connection = await createConnection({ ...address, connectTimeout: 1000 });
    const [row] = await connection.query('SELECT @@datadir AS datadir');
    await connection.end();
    return realpathSync(row.datadir) === realpathSync(files.datadir);
  } catch {
    return false;
  }
}

/** One try: the running child, or undefined when it ended before it was ready (its port may be taken). */
async function launch(files, port, account) {
  const child = spawn(findProgram('mariadbd'), flags(files, port), { stdio: 'ignore', cwd: files.folder });
  let ended = false;
  child.once('error', () => (ended = true));
  child.once('exit', () => (ended = true));
  const ready = await until(async () => ended || (await isOurs(files, port, account)), readyWithin);
  if (ready && !ended) return child;
  await endChild(child, stopWithin);
  return undefined;
}

/**
 * Starts a MariaDB server of our own on loopback and waits until it answers.
 * @param folder holds its data, its socket and its log
 * @param port wished for; another free one is taken when it is not free, unless `keepPort`
 * @param statements SQL run at every start, e.g. from databaseStatements()
 * @param account {user, password} from those statements, to see that the server which answers is ours
 */
export async function startMariaDB({ folder, port: wished, keepPort = false, statements, account }) {
  const files = serverFiles(folder);
  await installDatadir(files);
  await endLeftOverServer(files);
  writePrivate(files.initFile, statements.map((statement) => `${statement};\n`).join(''));
  try {
    for (let attempt = 0; attempt < attempts; attempt += 1) {
      const port = keepPort ? wished : await freePortNear(attempt === 0 ? wished : 0);
      const child = await launch(files, port, account);
      if (child) return runningServer(child, files, port);
    }
  } finally {
    rmSync(files.initFile, { force: true });
  }
  throw new PlainError(`MariaDB did not start; ${files.log} says why.`);
}

function runningServer(child, files, port) {
  const exited = new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null)
      resolve({ code: child.exitCode, signal: child.signalCode });
    child.once('exit', (code, signal) => resolve({ code, signal }));
  });
  return {
    port,
    files,
    pid: child.pid,
    /** Settles when the server has ended, for whatever reason. */
    exited,
    url: (account, database) => databaseUrl(account, port, database),
    /** Lets it flush and end; by force after four seconds. */
    stop: () => endChild(child, stopWithin),
    /** Ends it at once, as a crash would; its data must survive that. */
    kill: () => child.kill('SIGKILL') && exited,
  };
}
