/**
 * Counts the outcome of a run from vitest's JSON report. A file that could not be
 * loaded counts as a failure, and so does a skipped test: none may be left aside.
 */
export function countResults(report) {
  const files = report?.testResults ?? [];
  const tests = files.flatMap((file) => file.assertionResults);
  const passed = tests.filter((test) => test.status === 'passed').length;
  const broken = files.filter(
    (file) => file.status === 'failed' && file.assertionResults.every(passes),
  ).length;
  return { passed, failed: tests.length - passed + broken, skipped: tests.filter(skips).length };
}

/** The last line of every run. */
export function lastLine({ passed, failed }) {
  return `${passed} passed, ${failed} failed`;
}

function passes(test) {
  return test.status === 'passed';
}

function skips(test) {
  return test.status !== 'passed' && test.status !== 'failed';
}
