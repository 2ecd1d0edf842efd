/**
 * `npm test`, on a fresh clone too: installs what the tests need, builds the app,
 * runs every test. The last line is always "N passed, N failed".
 */
import { lastLine } from './lib/count.mjs';
import { install } from './lib/install.mjs';
import { runTests } from './lib/tests.mjs';

const result = outcome();
console.log(lastLine(result));
process.exitCode = result.failed === 0 ? 0 : 1;

function outcome() {
  try {
    install();
  } catch (error) {
    console.error(error.message);
    return { passed: 0, failed: 1 };
  }
  return runTests(process.argv.slice(2));
}
