/**
 * `npm run validate`: every check, then every test. A step that fails counts as one
 * failure and the others still run, so that one run tells all there is to mend.
 */
import { build } from './lib/build.mjs';
import { lastLine } from './lib/count.mjs';
import { install } from './lib/install.mjs';
import { runPackage } from './lib/run.mjs';
import { runTests } from './lib/tests.mjs';

const TSC = 'typescript/bin/tsc';
const TSX = 'tsx/dist/cli.mjs';

const STEPS = [
  ['packages', install],
  ['types', () => runPackage(TSC, ['--noEmit'])],
  ['types of shared/ without browser or Node', () => runPackage(TSC, ['-p', 'shared'])],
  ['lint and format', () => runPackage('@biomejs/biome/bin/biome', ['ci', '--error-on-warnings'])],
  ['boundaries', () => runPackage(TSX, ['scripts/check-boundaries.ts'])],
  ['dead code', () => runPackage('knip/bin/knip.js', [])],
  ['build', build],
  ['size budget', () => runPackage(TSX, ['scripts/check-size.ts'])],
];

const broken = STEPS.filter(([name, work]) => !step(name, work)).map(([name]) => name);
console.log('\n== tests');
const { passed, failed } = runTests([]);
if (broken.length > 0) console.error(`\nFailed before the tests: ${broken.join(', ')}`);
const result = { passed, failed: failed + broken.length };
console.log(lastLine(result));
process.exitCode = result.failed === 0 ? 0 : 1;

function step(name, work) {
  console.log(`\n== ${name}`);
  try {
    return work() !== false;
  } catch (error) {
    console.error(error.message);
    return false;
  }
}
