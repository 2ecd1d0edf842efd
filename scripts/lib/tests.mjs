import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname } from 'node:path';
import { build } from './build.mjs';
import { countResults } from './count.mjs';
import { installPrograms } from './debian.mjs';
import { inRepository } from './paths.mjs';
import { runPackage } from './run.mjs';

const REPORT = inRepository('.cache', 'test-results.json');

/**
 * Runs every test, the browser's too, or those in the files named; returns how many
 * passed and failed. What goes wrong around the tests is a failure of its own.
 */
export function runTests(files) {
  const around = [attempt(installPrograms), attempt(build)].filter((good) => !good).length;
  mkdirSync(dirname(REPORT), { recursive: true });
  rmSync(REPORT, { force: true });
  const reports = ['--reporter=default', '--reporter=json', `--outputFile.json=${REPORT}`];
  const good = runPackage('vitest/vitest.mjs', ['run', ...reports, ...files]);
  const report = existsSync(REPORT) ? JSON.parse(readFileSync(REPORT, 'utf8')) : undefined;
  const { passed, failed, skipped } = countResults(report);
  if (skipped > 0) console.error(`${skipped} skipped tests count as failed.`);
  // An error outside any test, or no test at all, ends vitest badly with none failed.
  const unexplained = !good && failed === 0 ? 1 : 0;
  return { passed, failed: failed + around + unexplained };
}

function attempt(work) {
  try {
    work();
    return true;
  } catch (error) {
    console.error(error.message);
    return false;
  }
}
