import { availableParallelism } from 'node:os';
import { Piscina } from 'piscina';
import type { App } from '../context.ts';
import type { ChunkTask, PackedVariant } from './sweep-worker.ts';

/** Threads that compute; they yield to the requests. */
export interface SweepPool {
  readonly threads: number;
  run(task: ChunkTask, signal: AbortSignal): Promise<PackedVariant[]>;
  destroy(): Promise<void>;
}

const isSource = import.meta.url.endsWith('.ts');

/** Starts the pool; the worker is the source under tsx, and the bundle beside this file when built. */
export function createPool({ config }: Pick<App, 'config'>): SweepPool {
  const threads = config.sweepWorkers ?? Math.max(1, availableParallelism() - 1);
  const pool = new Piscina<ChunkTask, PackedVariant[]>({
    filename: new URL(isSource ? './sweep-worker.ts' : './sweep-worker.js', import.meta.url).href,
    minThreads: 0,
    maxThreads: threads,
    idleTimeout: 30_000,
    niceIncrement: 10,
    ...(isSource ? { execArgv: [...process.execArgv, '--import', 'tsx'] } : {}),
  });
  return {
    threads,
    run: (task, signal) => pool.run(task, { signal }),
    destroy: () => pool.destroy(),
  };
}
