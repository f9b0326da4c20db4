import { ensureBuilt } from './build.mjs';
import { ensureNodePackages } from './node-packages.mjs';
import { PlainError } from './output.mjs';
import { ensureSystemPackages } from './system-packages.mjs';

const oldestNode = 20;

/** Makes this machine ready; what is there already is left alone. A later step waits for an earlier one. */
export async function prepare({ database = false, browser = false, built = false }) {
  if (Number.parseInt(process.versions.node, 10) < oldestNode) {
    throw new PlainError(`Backmark needs Node.js ${oldestNode} or newer; this is ${process.versions.node}.`);
  }
  await ensureSystemPackages({ database, browser });
  await ensureNodePackages();
  if (built) await ensureBuilt();
}
