import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { beginningOf } from './processes.mjs';

function read(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}

const alive = (holder) => holder !== undefined && beginningOf(holder.pid) === holder.beginning;

function write(file, holder) {
  const unfinished = `${file}.${process.pid}`;
  writeFileSync(unfinished, `${JSON.stringify(holder)}\n`, { mode: 0o600 });
  return unfinished;
}

/** Gives the name to our file only if nobody has it: link(2) decides between two at once. */
function claim(file, holder) {
  const unfinished = write(file, holder);
  try {
    linkSync(unfinished, file);
    return true;
  } catch {
    return false;
  } finally {
    rmSync(unfinished, { force: true });
  }
}

/**
 * Takes the lock of a running copy. A lock whose process is gone (killed, or the machine was restarted) is taken over.
 * @returns {{held: true, note, release, previous?} | {held: false, holder}} `note` adds facts to the lock, such as
 *   the address; `previous` is what a dead holder had noted
 */
export function takeLock(file) {
  mkdirSync(dirname(file), { recursive: true, mode: 0o700 });
  let holder = { pid: process.pid, beginning: beginningOf(process.pid) };
  let previous;
  while (!claim(file, holder)) {
    const other = read(file);
    if (alive(other)) return { held: false, holder: other };
    previous = other ?? previous;
    const aside = `${file}.stale.${process.pid}`;
    try {
      renameSync(file, aside);
    } catch {
      continue;
    }
    const moved = read(aside);
    if (alive(moved)) renameSync(aside, file);
    else rmSync(aside, { force: true });
  }
  return {
    held: true,
    previous,
    note(facts) {
      holder = { ...holder, ...facts };
      renameSync(write(file, holder), file);
    },
    release: () => rmSync(file, { force: true }),
  };
}
