import { setTimeout as delay } from 'node:timers/promises';
import type { Response } from 'express';
import type { App } from '../../context.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { viewSweep } from './service.ts';

/** Milliseconds between looks: the row is the truth, whichever process works it. */
const LOOK = 400;
const HEARTBEAT = 15_000;
const ENDED = new Set(['done', 'failed', 'cancelled']);

/** Streams a sweep's progress as server-sent events until it ends, the listener leaves or the program stops. */
export async function streamSweep(
  app: App,
  person: SignedInPerson,
  id: number,
  res: Response,
): Promise<void> {
  const first = await viewSweep(app, person, id);
  const gone = new AbortController();
  res.on('close', () => gone.abort());
  const signal = AbortSignal.any([gone.signal, app.stopping]);
  res.writeHead(200, {
    'Content-Type': 'text/event-stream',
    'Cache-Control': 'no-store',
    'X-Accel-Buffering': 'no',
    Connection: 'keep-alive',
  });
  res.write('retry: 2000\n\n');
  let said = '';
  let quietSince = Date.now();
  for (let sweep = first, event = 1; !signal.aborted; sweep = await viewSweep(app, person, id)) {
    const key = `${sweep.state} ${sweep.fraction}`;
    if (key !== said) {
      res.write(`id: ${event++}\nevent: sweep\ndata: ${JSON.stringify(sweep)}\n\n`);
      said = key;
      quietSince = Date.now();
    } else if (Date.now() - quietSince > HEARTBEAT) {
      res.write(': still there\n\n');
      quietSince = Date.now();
    }
    if (ENDED.has(sweep.state)) break;
    await delay(LOOK, undefined, { signal }).catch(() => undefined);
  }
  res.end();
}
