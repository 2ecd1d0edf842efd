import { expect, test } from 'vitest';
import { tooDeepAt } from '../../shared/model/text-depth.ts';

test('brackets up to the limit pass, the first beyond it is named', () => {
  expect(tooDeepAt('[[[]]]', 3)).toBe(-1);
  expect(tooDeepAt('[[[]]]', 2)).toBe(2);
  expect(tooDeepAt('{"a":[{"b":[]}]}', 3)).toBe(11);
});

test('brackets side by side do not add up', () => {
  expect(tooDeepAt(`[${'[],'.repeat(1_000)}[]]`, 2)).toBe(-1);
});

test('brackets inside strings do not count, escaped quotes do not end a string', () => {
  expect(tooDeepAt('["[[[[[["]', 1)).toBe(-1);
  expect(tooDeepAt(String.raw`["\"[[[["]`, 1)).toBe(-1);
  expect(tooDeepAt(String.raw`["\\",[[]]]`, 2)).toBe(7);
});

test('a string without an end is passed over', () => {
  expect(tooDeepAt('["[[[[', 1)).toBe(-1);
});
