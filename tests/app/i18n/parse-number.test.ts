import { expect, it } from 'vitest';
import { fromPercent, numberText, parseNumber, toPercent } from '../../../src/i18n/parse-number.ts';

it.each([
  ['1234.5', 1234.5],
  ['1,234.5', 1234.5],
  [' \u22120.5 ', -0.5],
  ['1e-3', 0.001],
  ['.5', 0.5],
  ['0,5', null],
  ['1,23', null],
  ['', null],
  ['half', null],
  ['1e999', null],
])('English reads %s as %s', (text, value) => {
  expect(parseNumber(text, 'en')).toBe(value);
});

it.each([
  ['1\u202F234,5', 1234.5],
  ['1 234,5', 1234.5],
  ['0.5', 0.5],
  ['0,5', 0.5],
  ['1,234,5', null],
])('French reads %s as %s', (text, value) => {
  expect(parseNumber(text, 'fr')).toBe(value);
});

it.each([0.035, 0.07, 1 / 3, 0.0123456789, 1, 0])(
  'a share of %s survives as a percentage',
  (share) => {
    expect(fromPercent(toPercent(share))).toBeCloseTo(share, 15);
  },
);

it('writes what it reads', () => {
  expect(numberText(toPercent(0.035), 'en')).toBe('3.5');
  expect(parseNumber(numberText(1234.25, 'fr'), 'fr')).toBe(1234.25);
});
