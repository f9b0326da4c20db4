import { spawn } from 'node:child_process';
import { inRoot, root } from './paths.mjs';
import { mustRun } from './run.mjs';

const args = (name) => ['--enable-source-maps', inRoot('dist/server', name)];

/** A copy of our environment with the settings laid over it; undefined takes a variable away. */
function environment(settings) {
  const merged = { ...process.env, DATABASE_MIGRATION_URL: undefined, ...settings };
  return Object.fromEntries(Object.entries(merged).filter(([, value]) => value !== undefined));
}

/** The program itself. It listens at once and is ready when it gets the message 'prepared'. */
export function startProgram(settings) {
  return spawn(process.execPath, args('main.js'), {
    cwd: root,
    env: environment(settings),
    stdio: ['inherit', 'inherit', 'inherit', 'ipc'],
  });
}

/** Brings the tables up to date, with the account that may, and fills an empty catalogue in demo mode. */
export async function prepareData(settings, ownerUrl) {
  const output = { stdio: ['ignore', 1, 2] };
  const migration = { ...output, env: { ...settings, DATABASE_MIGRATION_URL: ownerUrl } };
  await mustRun('Bringing the database up to date', process.execPath, args('migrate.js'), migration);
  if (['true', '1', 'on', 'yes'].includes(settings.BACKMARK_DEMO.toLowerCase())) {
    const demo = { ...output, env: { ...settings, DATABASE_MIGRATION_URL: '' } };
    await mustRun('Loading the demo data', process.execPath, args('demo.js'), demo);
  }
}
