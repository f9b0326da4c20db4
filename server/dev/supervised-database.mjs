import { join } from 'node:path';
import { databaseStatements } from './mariadb-accounts.mjs';
import { startMariaDB } from './mariadb.mjs';
import { PlainError, say } from './output.mjs';
import { keptPrivate, randomSecret } from './secrets.mjs';

const database = 'backmark';
const wishedPort = 33170;
const restartsPerMinute = 5;

/**
 * The program's own database server. When it dies it is started again on the same port, so that the program's
 * connections heal; when it dies again and again, `onLost` is told.
 */
export function superviseDatabase(folder, onLost) {
  const { owner, application } = keptPrivate(join(folder, 'mariadb-accounts.json'), () => ({
    owner: { user: 'backmark_owner', password: randomSecret() },
    application: { user: 'backmark_app', password: randomSecret() },
  }));
  const common = { folder, statements: databaseStatements(database, owner, application), account: owner };
  const restarts = [];
  let stopping = false;
  let current;

  function watch(server) {
    server.exited.then(({ code, signal }) => {
      if (stopping) return;
      say(`The database server ended by itself (${signal ?? `exit code ${code}`}); starting it again ...`);
      restarts.push(Date.now());
      const recent = restarts.filter((time) => time > Date.now() - 60_000);
      if (recent.length > restartsPerMinute)
        return onLost(new PlainError('The database server keeps ending.'));
      current = startMariaDB({ ...common, port: server.port, keepPort: true });
      current.then(watch, onLost);
    });
    return server;
  }

  return {
    /** Starts it; returns the addresses for the program and for its migrations. */
    async start() {
      current = startMariaDB({ ...common, port: wishedPort });
      const server = watch(await current);
      return { application: server.url(application, database), owner: server.url(owner, database) };
    },
    /** Stops it, also when it is just being started. */
    async stop() {
      stopping = true;
      const server = await current?.catch(() => undefined);
      await server?.stop();
    },
  };
}
