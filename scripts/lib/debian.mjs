import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { run } from './run.mjs';

/** Programs that tests drive, where they come from, and which tests fail without them. */
const PROGRAMS = [
  {
    name: 'chromium',
    found: () => existsSync(process.env.CHROMIUM_PATH ?? '/usr/bin/chromium'),
    tests: 'the browser tests (tests/e2e)',
    otherwise: 'or set CHROMIUM_PATH to the program of a Chromium you have',
  },
  {
    name: 'r-base-core',
    found: () => answers('Rscript'),
    tests: 'the tests that run scripts of base R',
    otherwise: 'or put Rscript on the PATH',
  },
];

/**
 * Installs from Debian what tests drive, when it is missing and we may; otherwise
 * says what to install. The tests that need it then fail: none is skipped.
 */
export function installPrograms() {
  const missing = PROGRAMS.filter((program) => !program.found());
  if (missing.length === 0) return;
  if (mayInstall()) aptInstall(missing.map((program) => program.name));
  for (const { name, tests, otherwise } of missing.filter((program) => !program.found())) {
    console.error(`${name} is missing; ${tests} will fail without it.`);
    console.error(`  Install it: sudo apt-get install ${name}, ${otherwise}.`);
  }
}

function mayInstall() {
  return process.getuid?.() === 0 && answers('apt-get');
}

function aptInstall(names) {
  console.log(`Installing from Debian: ${names.join(', ')} …`);
  const quiet = { DEBIAN_FRONTEND: 'noninteractive' };
  run('apt-get', ['update', '-q'], quiet);
  run('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...names], quiet);
}

function answers(program) {
  return spawnSync(program, ['--version'], { stdio: 'ignore' }).status === 0;
}
