import { sweepListResponse, sweepResponse, type Sweep } from '@shared/contracts/revisions.ts';
import { get, post } from './http.ts';
import { isAbort } from './problem.ts';

export const fetchSweeps = (signal?: AbortSignal) =>
  get(sweepListResponse, '/api/sweeps', signal ? { signal } : {});
export const fetchSweep = (id: number, signal?: AbortSignal) =>
  get(sweepResponse, `/api/sweeps/${id}`, signal ? { signal } : {});
export const cancelSweep = (id: number) => post(sweepResponse, `/api/sweeps/${id}/cancel`);

const POLL_EVERY = 2_000;
const ended = ({ state }: Sweep) => state === 'done' || state === 'failed' || state === 'cancelled';

/** Asks again and again: for where the stream of events does not get through. */
async function poll(id: number, onUpdate: (sweep: Sweep) => void, signal: AbortSignal): Promise<void> {
  while (!signal.aborted) {
    try {
      const sweep = await fetchSweep(id, signal);
      onUpdate(sweep);
      if (ended(sweep)) return;
    } catch (error) {
      if (isAbort(error)) return;
    }
    await new Promise((resolve) => setTimeout(resolve, POLL_EVERY));
  }
}

/** Follows a sweep until it ends; returns how to stop following. */
export function watchSweep(id: number, onUpdate: (sweep: Sweep) => void): () => void {
  const stop = new AbortController();
  const source = new EventSource(`/api/sweeps/${id}/events`);
  stop.signal.addEventListener('abort', () => source.close());
  const read = (event: MessageEvent<string>) => {
    const parsed = sweepResponse.safeParse(JSON.parse(event.data));
    if (!parsed.success) return;
    onUpdate(parsed.data);
    if (ended(parsed.data)) stop.abort();
  };
  source.addEventListener('message', read);
  source.addEventListener('sweep', read);
  source.addEventListener('error', () => {
    if (source.readyState !== EventSource.CLOSED || stop.signal.aborted) return;
    void poll(id, onUpdate, stop.signal);
  });
  return () => stop.abort();
}
