import { expect, it } from 'vitest';
import { inferred } from '../../shared/formula/kind-algebra.ts';
import { mismatchIssue, severityOf } from '../../shared/formula/mismatch.ts';
import { KINDS, type Kind } from '../../shared/model/kinds.ts';

// Common practice in the field, no source.
it.each<[Kind, Kind, 'error' | 'warning' | undefined]>([
  ['probability', 'rate', 'error'],
  ['probability', 'perCycle', 'warning'],
  ['probability', 'ratio', undefined],
  ['rate', 'probability', 'error'],
  ['rate', 'count', undefined],
  ['logOdds', 'probability', 'error'],
  ['logOdds', 'ratio', 'warning'],
  ['logOdds', 'time', undefined],
  ['utility', 'disabilityWeight', 'error'],
  ['costPerCycle', 'costPerYear', 'warning'],
  ['costPerYear', 'costPerCycle', 'warning'],
  ['costOnce', 'costPerYear', 'warning'],
  ['costPerYear', 'money', undefined],
  ['costPerYear', 'utility', 'error'],
  ['ratio', 'probability', undefined],
])('%s wanted, %s found: %s', (wanted, got, severity) => {
  expect(severityOf(wanted, inferred(got))).toBe(severity);
});

it('never minds the kind that is wanted, nor a number, nor anything where a number is wanted', () => {
  for (const kind of KINDS) {
    expect(severityOf(kind, inferred(kind))).toBeUndefined();
    expect(severityOf(kind, inferred('number'))).toBeUndefined();
    expect(severityOf('number', inferred(kind))).toBeUndefined();
  }
});

it('is mild with what a bare number has scaled, but for rates and probabilities', () => {
  expect(severityOf('costPerCycle', inferred('costPerYear', true))).toBeUndefined();
  expect(severityOf('utility', inferred('disabilityWeight', true))).toBeUndefined();
  expect(severityOf('probability', inferred('rate', true))).toBe('warning');
  expect(severityOf('rate', inferred('probability', true))).toBe('warning');
});

it('has codes of their own for common mistakes, and says both sides', () => {
  const at = { start: 1, end: 2 };
  expect(mismatchIssue('error', 'probability', 'rate', at, { function: 'hazard' })).toEqual({
    code: 'formula.rateAsProbability',
    severity: 'error',
    path: [],
    params: { wanted: 'probability', got: 'rate', function: 'hazard' },
    at,
  });
  expect(mismatchIssue('error', 'time', 'rate', at).code).toBe('formula.kindMismatch');
});
