import { setTimeout as delay } from 'node:timers/promises';

/** Row changed since it was read (1020), lock wait timed out (1205), deadlock (1213). */
const lostRaces = new Set([1020, 1205, 1213]);

/** MariaDB's number of an error, from whatever wrapping it arrives in. */
export function errorNumber(error: unknown): number | undefined {
  const { errno, original, parent } = (error ?? {}) as {
    errno?: unknown;
    original?: { errno?: unknown };
    parent?: { errno?: unknown };
  };
  return [errno, original?.errno, parent?.errno].find((value): value is number => typeof value === 'number');
}

/** True when nothing was done and doing it again may succeed. */
export function isLostRace(error: unknown): boolean {
  return lostRaces.has(errorNumber(error) ?? 0);
}

/** Runs the work, again after a random wait when it lost a race, at most `retries` times more. */
export async function withRetries<T>(work: () => Promise<T>, retries: number): Promise<T> {
  for (let attempt = 0; ; attempt += 1) {
    try {
      return await work();
    } catch (error) {
      if (attempt >= retries || !isLostRace(error)) throw error;
      await delay(Math.random() * 20 * 2 ** attempt);
    }
  }
}
