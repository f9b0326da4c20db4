import { sayFailure } from './output.mjs';
import { prepare } from './prepare.mjs';
import { stopStepsOnSignals } from './run.mjs';
import { runCheck, runProject, testProjects } from './test-steps.mjs';

/* Checks everything. The last line is `N passed, N failed` over all; lint, types and build count as one each. */
const npm = (script) =>
  process.env.npm_execpath
    ? [process.execPath, [process.env.npm_execpath, 'run', '--silent', script]]
    : ['npm', ['run', '--silent', script]];
const heading = (name) => process.stdout.write(`\n== ${name}\n`);

async function check() {
  const results = [];
  for (const script of ['lint', 'types']) {
    heading(script);
    results.push(await runCheck(script, ...npm(script)));
  }
  // A copy that is running from this checkout keeps its files when nothing has changed.
  heading('build');
  results.push(await runCheck('build', process.execPath, ['server/dev/build-all.mjs', '--when-changed']));
  for (const project of Object.keys(testProjects)) {
    heading(project);
    results.push(await runProject(project));
  }
  return results;
}

function report(results) {
  const sum = (key) => results.reduce((total, result) => total + result[key], 0);
  process.stdout.write('\n');
  for (const { name, passed, failed, skipped } of results) {
    const aside = skipped > 0 ? `, ${skipped} skipped` : '';
    process.stdout.write(`${name.padEnd(8)} ${passed} passed, ${failed} failed${aside}\n`);
  }
  process.stdout.write(`${sum('passed')} passed, ${sum('failed')} failed\n`);
  return sum('failed') === 0 && sum('passed') > 0;
}

stopStepsOnSignals();
try {
  await prepare({ database: true, browser: true });
  process.exitCode = report(await check()) ? 0 : 1;
} catch (error) {
  sayFailure(error);
  process.stdout.write('0 passed, 1 failed\n');
  process.exitCode = 1;
}
