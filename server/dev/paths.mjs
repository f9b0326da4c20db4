import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of this checkout, without a slash at its end. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** A path inside the checkout. */
export const inRoot = (...parts) => resolve(root, ...parts);

/** Where the database, the secrets and the lock of a running copy are kept. */
export const dataFolder = () => resolve(root, process.env.BACKMARK_DATA || '.data');
