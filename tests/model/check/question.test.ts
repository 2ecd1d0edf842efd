import { expect, test } from 'vitest';
import { issuesOf, said } from './codes.ts';

test('the comparator is one of the strategies', () => {
  expect(
    said(({ question }) => {
      question.comparator = 'none';
    }),
  ).toEqual(['strategies.unknown question.comparator']);
});

test('the threshold in force is one of those listed', () => {
  expect(
    said(({ question }) => {
      question.thresholdInForce = 'one_gdp';
    }),
  ).toEqual([]);
  expect(
    said(({ question }) => {
      question.thresholdInForce = 'other';
    }),
  ).toEqual(['question.unknownThreshold question.thresholdInForce']);
});

test('10,000 cycles pass, one more does not', () => {
  const years = (cycles: number) =>
    issuesOf(({ question }) => {
      question.horizon = cycles / 365;
      question.cycleLength = 1 / 365;
    });
  expect(years(10_000)).toEqual([]);
  expect(years(10_001)).toMatchObject([
    { code: 'question.tooManyCycles', params: { cycles: 10_001, maximum: 10_000 } },
  ]);
});

test('a horizon of no whole number of cycles is rounded, and said', () => {
  expect(
    issuesOf(({ question }) => {
      question.cycleLength = 7 / 365.25;
    }),
  ).toMatchObject([
    {
      code: 'question.cyclesRounded',
      severity: 'warning',
      params: { cycles: 522, exact: expect.closeTo(521.785_714, 5) },
    },
  ]);
});

// Simpson's 1/3 rule takes intervals in pairs (Elbasha and Chhatwal 2016).
test('Simpson’s rule needs an even number of cycles', () => {
  const simpson = (horizon: number) =>
    said(({ question }) => {
      question.counting = 'simpson';
      question.horizon = horizon;
    });
  expect(simpson(10)).toEqual([]);
  expect(simpson(11)).toEqual(['question.simpsonNeedsEvenCycles question.horizon']);
});
