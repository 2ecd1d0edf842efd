import { expect, test } from 'vitest';
import { digestOf } from '../../shared/model/digest.ts';
import { digestOfResults } from '../../shared/model/results-digest.ts';

test('numbers take part to 10 significant digits', () => {
  const results = { strategies: [{ id: 'a', cost: 44_663.453_217_891_2, icer: null }] };
  const elsewhere = { strategies: [{ id: 'a', cost: 44_663.453_217_891_3, icer: null }] };
  const other = { strategies: [{ id: 'a', cost: 44_663.453_3, icer: null }] };
  expect(digestOfResults(elsewhere)).toBe(digestOfResults(results));
  expect(digestOfResults(other)).not.toBe(digestOfResults(results));
});

test('is the digest of the rounded canonical form', () => {
  expect(digestOfResults({ x: 1 / 3 })).toBe(digestOf({ x: 0.3333333333 }));
});

test('what a subtraction left over counts as 0', () => {
  expect(digestOfResults([2.8e-14, -0])).toBe(digestOf([0, 0]));
});

test('typed arrays count as lists, infinite numbers by name', () => {
  expect(digestOfResults(Float64Array.of(1, Number.POSITIVE_INFINITY, Number.NaN))).toBe(
    digestOf([1, 'Infinity', 'NaN']),
  );
});

test('words, gaps and truth take part as they are', () => {
  expect(digestOfResults({ a: ['x', null, true], b: undefined })).toBe(
    digestOf({ a: ['x', null, true] }),
  );
});
