import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

/** A random word of 43 letters and digits (256 bits), safe in a URL and in SQL quotes. */
export const randomSecret = () => randomBytes(32).toString('base64url');

/** Writes a file that only its owner may read, whole or not at all. */
export function writePrivate(file, text) {
  const unfinished = `${file}.${process.pid}.new`;
  writeFileSync(unfinished, text, { mode: 0o600 });
  renameSync(unfinished, file);
}

/** The JSON kept in a private file; made on first use. */
export function keptPrivate(file, make) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const made = make();
  writePrivate(file, `${JSON.stringify(made, null, 2)}\n`);
  return made;
}
