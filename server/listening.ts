import { createServer as createHttpServer, type RequestListener, type Server } from 'node:http';
import type { Config } from './config/config.ts';

const usualPort = 8080;

/** An HTTP server that gives up on those who send their request slowly; answers may take as long as they need. */
export function createServer(handler: RequestListener): Server {
  return createHttpServer(
    {
      headersTimeout: 15_000,
      requestTimeout: 30_000,
      keepAliveTimeout: 5_000,
      connectionsCheckingInterval: 5_000,
    },
    handler,
  );
}

function tryPort(server: Server, port: number, host: string): Promise<void> {
  return new Promise((resolve, reject) => {
    const failed = (error: Error) => reject(error);
    server.once('error', failed);
    server.listen({ port, host }, () => {
      server.off('error', failed);
      resolve();
    });
  });
}

/**
 * Listens on the port asked for; when none was asked for, on the usual one or any free one.
 * @throws what listen(2) says when the port asked for cannot be had
 */
export async function listen(server: Server, { port, host }: Pick<Config, 'port' | 'host'>): Promise<void> {
  if (port !== undefined) return tryPort(server, port, host);
  try {
    await tryPort(server, usualPort, host);
  } catch {
    await tryPort(server, 0, host);
  }
}
