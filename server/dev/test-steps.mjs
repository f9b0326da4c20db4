import { existsSync, mkdtempSync, readFileSync, readdirSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { inRoot } from './paths.mjs';
import { run } from './run.mjs';

const visible = { stdio: ['ignore', 1, 2] };

/** Vitest projects and the folders their tests lie in; tests/projects.ts has the same. */
export const testProjects = {
  engine: ['tests/engine', 'tests/verification', 'tests/catalog'],
  api: ['tests/api', 'tests/faults'],
  client: ['tests/client'],
  browser: ['tests/browser'],
};

function testFilesBelow(folder) {
  if (!existsSync(folder)) return [];
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name);
    if (statSync(path).isDirectory()) return testFilesBelow(path);
    return name.endsWith('.test.ts') ? [path] : [];
  });
}

/** A command that counts as one test. */
export async function runCheck(name, command, args) {
  const code = await run(command, args, visible);
  return { name, passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0 };
}

/** Counts a JSON report; a file that could not even be loaded counts as one failure. */
function countReport(report) {
  const broken = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.length === 0,
  );
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + broken.length,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}

/** Runs one Vitest project; none of its tests having run, or a crash of the runner, is a failure too. */
export async function runProject(name) {
  const files = testProjects[name].flatMap((folder) => testFilesBelow(inRoot(folder)));
  if (files.length === 0) return { name, passed: 0, failed: 1, skipped: 0 };
  const folder = mkdtempSync(join(tmpdir(), 'backmark-report-'));
  const output = join(folder, 'report.json');
  const vitest = inRoot('node_modules/vitest/vitest.mjs');
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${output}`];
  try {
    const code = await run(process.execPath, [vitest, 'run', '--project', name, ...reporters], visible);
    const counts = existsSync(output)
      ? countReport(JSON.parse(readFileSync(output, 'utf8')))
      : { passed: 0, failed: 0, skipped: 0 };
    const unexplained = counts.failed === 0 && (code !== 0 || counts.passed === 0);
    return { name, ...counts, failed: counts.failed + (unexplained ? 1 : 0) };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
