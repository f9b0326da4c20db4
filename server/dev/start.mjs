import { join } from 'node:path';
import { prepareData, startProgram } from './application.mjs';
import { loadEnvironmentFile } from './environment.mjs';
import { waitForDatabase } from './external-database.mjs';
import { takeLock } from './lock.mjs';
import { say, sayFailure } from './output.mjs';
import { dataFolder } from './paths.mjs';
import { prepare } from './prepare.mjs';
import { beginningOf, endLeftOver } from './processes.mjs';
import { stopSteps } from './run.mjs';
import { addressOf, chooseSettings } from './settings.mjs';
import { superviseDatabase } from './supervised-database.mjs';
import { endChild } from './waiting.mjs';

/* Starts everything and stays until it is asked to stop; then everything it started ends, within ten seconds. */
const programStopsWithin = 5_000;
const undo = [];
let stopping = false;

async function stop(code) {
  if (stopping) return;
  stopping = true;
  await stopSteps();
  for (const step of undo.reverse()) await Promise.resolve(step()).catch(sayFailure);
  process.exit(code);
}

function fail(error) {
  if (stopping) return undefined;
  sayFailure(error);
  return stop(1);
}

/** A killed start may have left its program running; the new one must have the place to itself. */
async function endPreviousProgram({ program, programBeginning } = {}) {
  if (!program || beginningOf(program) !== programBeginning) return;
  say('The program of an earlier run is still there; stopping it ...');
  await endLeftOver(program, programStopsWithin);
}

async function startDatabase(folder) {
  const given = process.env.DATABASE_URL;
  if (given) return { application: given, owner: process.env.DATABASE_MIGRATION_URL || given };
  const database = superviseDatabase(folder, fail);
  undo.push(() => database.stop());
  return database.start();
}

async function start(folder, lock) {
  await endPreviousProgram(lock.previous);
  await prepare({ database: !process.env.DATABASE_URL, built: true });
  const urls = await startDatabase(folder);
  const settings = { ...(await chooseSettings(folder)), DATABASE_URL: urls.application };
  if (stopping) return;
  const program = startProgram(settings);
  undo.push(() => endChild(program, programStopsWithin));
  program.once('exit', (code, signal) => {
    if (stopping) return;
    say(`The program ended by itself (${signal ?? `exit code ${code}`}).`);
    stop(code || 1);
  });
  const address = addressOf(settings);
  lock.note({ address, program: program.pid, programBeginning: beginningOf(program.pid) });
  if (process.env.DATABASE_URL) await waitForDatabase(urls.owner, () => stopping);
  if (stopping) return;
  await prepareData(settings, urls.owner);
  if (program.connected) program.send('prepared');
}

// Whoever read our output may go; the database and the program are still to be stopped in order.
for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);
loadEnvironmentFile();
const folder = dataFolder();
const lock = takeLock(join(folder, 'running.json'));
if (lock.held) {
  undo.push(() => lock.release());
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => stop(0));
  start(folder, lock).catch(fail);
} else {
  const { address, pid } = lock.holder;
  say(
    address
      ? `Backmark is already running at ${address} (process ${pid}).`
      : `Backmark is already being started (process ${pid}).`,
  );
  say('It was left alone. Stop it there with Ctrl-C before starting it anew.');
}
