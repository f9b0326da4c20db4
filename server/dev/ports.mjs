import { createServer } from 'node:net';

/** The port itself when it can be listened on now (0: any), otherwise undefined. */
export function freePort(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(undefined));
    server.listen({ port, host, exclusive: true }, () => {
      const found = server.address().port;
      server.close(() => resolve(found));
    });
  });
}

/** The wished-for port, or one of the next few, or any free one. */
export async function freePortNear(wished, host) {
  for (let port = wished; wished > 0 && port < Math.min(wished + 20, 65536); port += 1) {
    if (await freePort(port, host)) return port;
  }
  return freePort(0, host);
}
