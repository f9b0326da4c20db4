import argon2 from 'argon2';
import { problem } from '../../http/problems.ts';

/** argon2id with 19 MiB, two passes, one lane: about 20 ms of one core. */
const strength = { type: argon2.argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
const atOnce = 4;
const longestQueue = 100;

let running = 0;
const queue: (() => void)[] = [];

/** A flood of sign-ins waits here instead of taking the machine from everybody else. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= atOnce) {
    if (queue.length >= longestQueue) {
      problem('unavailable', { detail: 'Too many people are signing in at once.', retryAfter: 5 });
    }
    await new Promise<void>((resolve) => queue.push(resolve));
  } else {
    running += 1;
  }
  try {
    return await work();
  } finally {
    const next = queue.shift();
    if (next) next();
    else running -= 1;
  }
}

/** The hash to store; Unicode is normalised so that the same password typed elsewhere is the same. */
export function hashPassword(password: string): Promise<string> {
  return inTurn(() => argon2.hash(password.normalize('NFC'), strength));
}

let decoy: Promise<string> | undefined;

/**
 * Whether the password belongs to the hash. Without a hash the same work is done against a decoy, so that the time
 * taken does not tell whether there is such an account.
 */
export async function passwordMatches(hash: string | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password');
  const against = hash ?? (await decoy);
  const matches = await inTurn(() => argon2.verify(against, password.normalize('NFC')));
  return matches && hash !== undefined;
}

/** True when a stored hash is weaker than what is made today. */
export function isWeak(hash: string): boolean {
  return !hash.startsWith('$argon2id$') || argon2.needsRehash(hash, strength);
}
