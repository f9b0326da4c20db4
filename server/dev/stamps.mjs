import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { inRoot, root } from './paths.mjs';

function filesBelow(path) {
  if (!existsSync(path)) return [];
  if (statSync(path).isFile()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesBelow(join(path, name)));
}

/** SHA-256 over the names and contents of files and folders of the checkout; missing ones are left out. */
export function hashOf(names) {
  const hash = createHash('sha256');
  for (const file of names.flatMap((name) => filesBelow(inRoot(name)))) {
    hash.update(relative(root, file)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/** What the stamp file says, or '' when there is none. */
export function readStamp(file) {
  return existsSync(file) ? readFileSync(file, 'utf8').trim() : '';
}

/** Notes that the work was done for this hash. */
export function writeStamp(file, hash) {
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, `${hash}\n`);
}
