import { createHash } from 'node:crypto';
import type { App } from '../../context.ts';
import { problem } from '../../http/problems.ts';

const windowSeconds = 15 * 60;
const failuresPerAccount = 5;
const failuresPerAddress = 30;
const keptSeconds = 24 * 3600;

/** Addresses that have no account are counted too, and none is stored in words. */
export const accountKey = (email: string): string =>
  createHash('sha256').update(email.toLowerCase()).digest('hex');

interface Count {
  failures: number;
  oldest: Date | null;
}

async function count(app: App, column: 'account_key' | 'ip', value: string, since: Date): Promise<Count> {
  const [row] = await app.db.select<Count>(
    `SELECT COUNT(*) AS failures, MIN(at) AS oldest FROM sign_in_failures WHERE ${column} = :value AND at > :since`,
    { value, since },
  );
  return row ?? { failures: 0, oldest: null };
}

/**
 * Writes the attempt down as a failure before the password is looked at, so that many at once cannot slip through;
 * a good one is struck out by `forgive`.
 * @throws {ProblemError} rate-limited, with the seconds until the oldest failure is forgotten
 */
export async function admitAttempt(app: App, email: string, ip: string): Promise<void> {
  const now = app.clock.now();
  const since = new Date(now.getTime() - windowSeconds * 1000);
  const key = accountKey(email);
  const attempt = await app.db.insert(
    'INSERT INTO sign_in_failures (account_key, ip, at) VALUES (:key, :ip, :now)',
    {
      key,
      ip,
      now,
    },
  );
  const byAccount = await count(app, 'account_key', key, since);
  const byAddress = await count(app, 'ip', ip, since);
  const full = [
    ...(byAccount.failures > failuresPerAccount ? [byAccount] : []),
    ...(byAddress.failures > failuresPerAddress ? [byAddress] : []),
  ];
  if (full.length === 0) return;
  // Only looked-at passwords count: otherwise trying on would keep the owner out for ever.
  await app.db.execute('DELETE FROM sign_in_failures WHERE id = :attempt', { attempt });
  const ends = full.map(({ oldest }) => (oldest ?? now).getTime() + windowSeconds * 1000 - now.getTime());
  problem('rate-limited', {
    detail: 'Too many failed attempts to sign in. Wait, then try again.',
    retryAfter: Math.max(1, Math.ceil(Math.max(...ends) / 1000)),
  });
}

/** After a good sign-in: this account's failures are forgotten, and everybody's old ones. */
export async function forgive(app: App, email: string): Promise<void> {
  const old = new Date(app.clock.now().getTime() - keptSeconds * 1000);
  await app.db.execute('DELETE FROM sign_in_failures WHERE account_key = :key OR at < :old', {
    key: accountKey(email),
    old,
  });
}
