// English and French as the Unicode CLDR writes them: groups by comma, or by a narrow
// no-break space; decimals by point, or by comma.
import { describe, expect, it } from 'vitest';
import {
  formatAmount,
  formatLargeMoney,
  formatMoney,
  formatNumber,
  formatOutcome,
  formatPercent,
  formatProbability,
  formatValue,
} from '../../../src/i18n/format.ts';

const GAP = '\u00A0';
const GROUP = '\u202F';

describe('money', () => {
  it('stands after its symbol in English, before it in French', () => {
    expect(formatMoney(1_500, 'KM', 'en')).toBe(`KM${GAP}1,500`);
    expect(formatMoney(1_500, 'KM', 'fr')).toBe(`1${GROUP}500${GAP}KM`);
  });

  it('follows a sign such as £ without a gap', () => {
    expect(formatMoney(6_276, '£', 'en')).toBe('£6,276');
  });

  it('bears a sign where asked, and a true minus', () => {
    expect(formatMoney(86.2, 'KM', 'en', { signed: true })).toBe(`KM${GAP}+86.2`);
    expect(formatMoney(-1_234, 'KM', 'en')).toBe(`KM${GAP}\u22121,234`);
    expect(formatMoney(0, 'KM', 'en', { signed: true })).toBe(`KM${GAP}0`);
  });

  it('keeps three figures of small amounts', () => {
    expect([0.4567, 4.567, 45.67, 456.7, 40].map((value) => formatAmount(value, 'en'))).toEqual([
      '0.46',
      '4.57',
      '45.7',
      '457',
      '40',
    ]);
  });

  it('is said in words where it is large', () => {
    expect(formatLargeMoney(3_123_456, 'KM', 'en')).toBe(`KM${GAP}3.1 million`);
    expect(formatLargeMoney(3_123_456, 'KM', 'fr')).toBe(`3,1 millions de${GAP}KM`);
    expect(formatLargeMoney(529_731, 'KM', 'en')).toBe(`KM${GAP}530,000`);
    expect(formatLargeMoney(0, 'KM', 'en')).toBe(`KM${GAP}0`);
  });
});

describe('a probability', () => {
  it('has two decimals', () => {
    expect(formatProbability(0.714, 'en')).toBe('0.71');
    expect(formatProbability(0.714, 'fr')).toBe('0,71');
  });

  it('is certain only where it is', () => {
    expect(formatProbability(0.001, 'en')).toBe(`<${GAP}0.01`);
    expect(formatProbability(0.999, 'en')).toBe(`>${GAP}0.99`);
    expect(formatProbability(0, 'en')).toBe('0.00');
    expect(formatProbability(1, 'en')).toBe('1.00');
  });
});

it('gives outcomes three decimals', () => {
  expect(formatOutcome(18.2136, 'en')).toBe('18.214');
  expect(formatOutcome(0.108, 'en', true)).toBe('+0.108');
  expect(formatOutcome(12_345.6, 'en')).toBe('12,346');
});

it('gives parameters the figures they need', () => {
  expect(formatValue(0.2, 'en')).toBe('0.2');
  expect(formatValue(-3.25, 'fr')).toBe('\u22123,25');
});

it('writes shares and plain numbers', () => {
  expect(formatPercent(0.035, 'en')).toBe('3.5%');
  expect(formatNumber(1_000, 'fr')).toBe(`1${GROUP}000`);
});
