import { expect, it } from 'vitest';
import { says } from './answer.ts';

it.each([
  ['KM\u00A0+107', 107.2],
  ['KM\u00A0\u22121,046', -1045.7],
  ['KM\u00A016.7', 16.74],
  ['0.65', 0.654],
  ['<\u00A00.01', 0.002],
  ['>\u00A00.99', 0.999],
])('%s says %d', (text, value) => {
  expect(says(text, value)).toBe(true);
});

it.each([
  ['KM\u00A0+107', 107.6],
  ['KM\u00A0+107', -107],
  ['KM\u00A01,046', 1.046],
  ['0.65', 0.656],
  ['<\u00A00.01', 0.02],
  ['', 0],
])('%s does not say %d', (text, value) => {
  expect(says(text, value)).toBe(false);
});
