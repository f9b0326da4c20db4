import type { AddressInfo } from 'node:net';
import { createApp } from './app.ts';
import { background } from './background.ts';
import { ConfigError, loadConfig, type Config } from './config/config.ts';
import { createContext } from './context.ts';
import { createServer, listen } from './listening.ts';
import { bringUp } from './start-up.ts';
import { shutDown } from './shut-down.ts';

/* Listens at once, is ready when all is up, and ends cleanly when asked to. */

function settings(): Config {
  try {
    return loadConfig(process.env);
  } catch (error) {
    if (!(error instanceof ConfigError)) throw error;
    console.error(error.message);
    process.exit(1);
  }
}

const config = settings();
const stopping = new AbortController();
const app = createContext(config, { stopping: stopping.signal });
const server = createServer(createApp(app));
const jobs = bringUp(app, background);

for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.on(signal, () => void shutDown({ app, server, jobs, stopping }));
}
// The start command is gone, and with it the database: nothing is left to serve.
process.on('disconnect', () => void shutDown({ app, server, jobs, stopping }));
// A reader of our output that has gone is no reason to stop.
for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);
process.on('unhandledRejection', (error) => app.log.error({ err: error }, 'unhandled rejection'));

try {
  await listen(server, config);
} catch (error) {
  const { code } = error as NodeJS.ErrnoException;
  const taken = code === 'EADDRINUSE' ? 'is taken' : `cannot be listened on (${code ?? 'unknown reason'})`;
  console.error(`Port ${config.port} of ${config.host} ${taken}; choose another PORT or leave it out.`);
  process.exit(1);
}
if (await jobs) {
  const { port } = server.address() as AddressInfo;
  console.log(`Backmark is ready at http://127.0.0.1:${port}`);
}
