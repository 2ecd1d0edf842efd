import { expect, test } from 'vitest';
import { jsonFaultAt, placeOf } from '../../shared/model/json-fault.ts';

// Texts and grammar: RFC 8259 (JSON), sections 2 to 7 and the examples of section 13.
test.each([
  'null',
  ' true ',
  '-0.5e+10',
  '"\\u00e9\\n"',
  '[]',
  '{ }',
  '[1, 2, {"a": [false]}]',
  '{"Image":{"Width":800,"Title":"View","Thumbnail":{"Url":"x"},"IDs":[116, 943]}}',
])('%s is JSON', (text) => {
  expect(jsonFaultAt(text)).toBe(-1);
  expect(() => JSON.parse(text)).not.toThrow();
});

test.each([
  ['', 0],
  ['{"a": 1', 7],
  ['{"a": 1,}', 8],
  ['[1 2]', 3],
  ['[1,]', 3],
  ['01', 1],
  ['1.', 1],
  ['+1', 0],
  ['nul', 3],
  ['truth', 3],
  ['"abc', 4],
  ['"a\nb"', 2],
  ['"\\x"', 1],
  ['{a: 1}', 1],
  ["{'a': 1}", 1],
  ['[1] x', 4],
  ['NaN', 0],
  ['[Infinity]', 1],
  ['{"a" 1}', 5],
])('%j stops being JSON at %i', (text, at) => {
  expect(jsonFaultAt(text)).toBe(at);
  expect(() => JSON.parse(text)).toThrow(SyntaxError);
});

test('agrees with JSON.parse on every truncation and every dropped character', () => {
  const text = '{"a": [1.5e3, "x\\u0041", null, {"b": true}], "c": -0}';
  for (let at = 0; at < text.length; at += 1) {
    for (const changed of [text.slice(0, at), text.slice(0, at) + text.slice(at + 1)]) {
      expect([changed, jsonFaultAt(changed) === -1]).toEqual([changed, parses(changed)]);
    }
  }
});

test('lines and columns count from 1', () => {
  expect(placeOf('ab\ncd\nef', 0)).toEqual({ line: 1, column: 1 });
  expect(placeOf('ab\ncd\nef', 4)).toEqual({ line: 2, column: 2 });
  expect(placeOf('ab\ncd\nef', 8)).toEqual({ line: 3, column: 3 });
});

function parses(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}
