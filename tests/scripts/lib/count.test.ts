import { expect, it } from 'vitest';
import { countResults, lastLine } from '../../../scripts/lib/count.mjs';

function file(...statuses: string[]) {
  const failed = statuses.includes('failed');
  return {
    status: failed ? 'failed' : 'passed',
    assertionResults: statuses.map((status) => ({ status })),
  };
}

it('counts what passed and what failed, over all files', () => {
  const report = { testResults: [file('passed', 'failed'), file('passed', 'passed')] };
  expect(countResults(report)).toEqual({ passed: 3, failed: 1, skipped: 0 });
});

it.each(['skipped', 'pending', 'todo'])('counts a test left aside (%s) as failed', (status) => {
  const report = { testResults: [file('passed', status)] };
  expect(countResults(report)).toEqual({ passed: 1, failed: 1, skipped: 1 });
});

it('counts a file that could not be loaded as one failure', () => {
  const report = { testResults: [{ status: 'failed', assertionResults: [] }, file('passed')] };
  expect(countResults(report)).toEqual({ passed: 1, failed: 1, skipped: 0 });
});

it('has nothing to count without a report', () => {
  expect(countResults(undefined)).toEqual({ passed: 0, failed: 0, skipped: 0 });
});

it('ends every run with the same words', () => {
  expect(lastLine({ passed: 12, failed: 0 })).toBe('12 passed, 0 failed');
});
