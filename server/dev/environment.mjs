import { existsSync, readFileSync } from 'node:fs';
import { inRoot } from './paths.mjs';

const line = /^\s*(?:export\s+)?([A-Za-z_][A-Za-z0-9_]*)\s*=\s*(.*?)\s*$/;

function valueOf(text) {
  const quoted = /^(["'])(.*?)\1\s*(?:#.*)?$/.exec(text);
  if (quoted) return quoted[1] === '"' ? quoted[2].replaceAll('\\n', '\n') : quoted[2];
  return text.replace(/(^|\s+)#.*$/, '');
}

/** Reads `NAME=value` lines; `#` begins a comment, quotes keep spaces. */
export function parseEnvironment(text) {
  const found = {};
  for (const row of text.split(/\r?\n/)) {
    const match = row.trimStart().startsWith('#') ? null : line.exec(row);
    if (match) found[match[1]] = valueOf(match[2]);
  }
  return found;
}

/** Takes settings from `.env`; what the shell has set already wins, and an empty value counts as not set. */
export function loadEnvironmentFile() {
  const file = process.env.BACKMARK_ENV_FILE ?? inRoot('.env');
  if (file === '' || !existsSync(file)) return;
  for (const [name, value] of Object.entries(parseEnvironment(readFileSync(file, 'utf8')))) {
    if (value !== '') process.env[name] ??= value;
  }
}
