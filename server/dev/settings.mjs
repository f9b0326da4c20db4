import { join } from 'node:path';
import { PlainError, say } from './output.mjs';
import { freePort, freePortNear } from './ports.mjs';
import { keptPrivate, randomSecret } from './secrets.mjs';

const usualPort = 8080;

/** The port to serve on: the one asked for, or the usual one, or when that is taken another. */
async function choosePort(host) {
  const asked = process.env.PORT;
  if (!asked || asked === '0') return freePortNear(asked === '0' ? 0 : usualPort, host);
  const port = Number(asked);
  if (!Number.isInteger(port) || port < 0 || port > 65535) {
    throw new PlainError(`PORT must be a whole number from 0 to 65535; it is "${asked}".`);
  }
  const found = await freePort(port, host);
  if (!found)
    throw new PlainError(
      `Port ${port} of ${host} is taken or not allowed; choose another PORT or leave it out.`,
    );
  return found;
}

/** Settings the program needs and the person need not give: the rest of the environment goes through as it is. */
export async function chooseSettings(folder) {
  const host = process.env.HOST || '127.0.0.1';
  const port = await choosePort(host);
  if (!process.env.PORT && port !== usualPort) say(`Port ${usualPort} is taken; using ${port}.`);
  const secrets = keptPrivate(join(folder, 'secrets.json'), () => ({ auth: randomSecret() }));
  return {
    HOST: host,
    PORT: String(port),
    AUTH_SECRET: process.env.AUTH_SECRET || secrets.auth,
    BACKMARK_DEMO: process.env.BACKMARK_DEMO || 'true',
    NODE_ENV: 'production',
  };
}

/** Where a browser on this machine finds the program. */
export const addressOf = ({ PORT }) => `http://127.0.0.1:${PORT}`;
