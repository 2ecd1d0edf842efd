import { expect, test } from 'vitest';
import { MAX_ISSUES, MAX_KEYS } from '../../shared/model/limits.ts';
import { plainIssues } from '../../shared/model/plain.ts';

const codes = (value: unknown) => plainIssues(value).map(({ code }) => code);

test('plain JSON passes, whatever its fields', () => {
  expect(plainIssues({ a: [1, 'two', null, true, { b: [] }], later: undefined })).toEqual([]);
  expect(plainIssues(null)).toEqual([]);
});

test.each(['__proto__', 'constructor', 'prototype'])('the key %s is refused anywhere', (key) => {
  const value = JSON.parse(`{"a": [{"b": 1, "${key}": {"polluted": true}}]}`);
  expect(plainIssues(value)).toMatchObject([
    { code: 'document.hostileKey', path: ['a', 0, key], params: { key } },
  ]);
  expect(({} as Record<string, unknown>).polluted).toBeUndefined();
});

test('64 levels pass, 65 do not', () => {
  const nested = (levels: number) => JSON.parse('['.repeat(levels) + ']'.repeat(levels));
  expect(plainIssues(nested(64))).toEqual([]);
  expect(plainIssues(nested(65))).toMatchObject([
    { code: 'document.tooDeep', path: Array(64).fill(0), params: { maximum: 64 } },
  ]);
});

test('a value that contains itself ends', () => {
  const loop: unknown[] = [];
  loop.push(loop);
  expect(codes(loop)).toEqual(['document.tooDeep']);
});

test('a value that shares its parts without end is cut off', () => {
  let shared: unknown = {};
  for (let level = 0; level < 40; level += 1) shared = [shared, shared];
  expect(codes(shared)).toEqual(['document.tooManyValues']);
});

test('numbers have to be finite', () => {
  expect(plainIssues(JSON.parse('{"x": [1e999, -1e999, 1e308]}'))).toMatchObject([
    { code: 'document.numberNotFinite', path: ['x', 0] },
    { code: 'document.numberNotFinite', path: ['x', 1] },
  ]);
});

test('half a surrogate pair is refused, a whole one is not', () => {
  expect(codes({ a: '\ud83d' })).toEqual(['document.brokenText']);
  expect(codes({ '\ude02': 1 })).toEqual(['document.brokenText']);
  expect(codes({ a: '\ud83d\ude02' })).toEqual([]);
});

test('what JSON does not know is refused', () => {
  expect(codes({ a: () => 1 })).toEqual(['document.notPlain']);
  expect(codes({ a: 1n })).toEqual(['document.notPlain']);
  expect(codes({ a: new Date(0) })).toEqual(['document.notPlain']);
  expect(codes(new Map())).toEqual(['document.notPlain']);
  expect(codes(Object.create(null))).toEqual([]);
});

test('an object with too many keys is refused as one', () => {
  const keys = Array.from({ length: MAX_KEYS + 1 }, (_, index) => [`k${index}`, index]);
  expect(plainIssues({ a: Object.fromEntries(keys) })).toMatchObject([
    { code: 'document.tooManyKeys', path: ['a'], params: { maximum: MAX_KEYS } },
  ]);
});

test('stops soon after the issues that can be shown', () => {
  expect(plainIssues(Array(10_000).fill(Number.NaN)).length).toBe(MAX_ISSUES + 1);
});
