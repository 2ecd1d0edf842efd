import { expect, it } from 'vitest';
import { choose, clamp, operators, product, round, sum } from '../../shared/formula/arithmetic.ts';

it('computes with the operators', () => {
  expect(operators.subtract(7, 2)).toBe(5);
  expect(operators.divide(1, 4)).toBe(0.25);
  expect(operators.power(2, 10)).toBe(1_024);
  expect(operators.negate(3)).toBe(-3);
});

it('answers comparisons and logic with 1 and 0, and takes anything but 0 as true', () => {
  expect([operators.less(1, 2), operators.less(2, 2), operators.less_equal(2, 2)]).toEqual([
    1, 0, 1,
  ]);
  expect([operators.greater(3, 2), operators.greater_equal(1, 2)]).toEqual([1, 0]);
  expect([operators.equal(2, 2), operators.not_equal(2, 2)]).toEqual([1, 0]);
  expect([
    operators.and(0.5, -1),
    operators.and(1, 0),
    operators.or(0, 2),
    operators.or(0, 0),
  ]).toEqual([1, 0, 1, 0]);
  expect([operators.not(0), operators.not(0.1)]).toEqual([1, 0]);
});

it('chooses by a condition', () => {
  expect(choose(1, 10, 20)).toBe(10);
  expect(choose(0, 10, 20)).toBe(20);
});

it('adds and multiplies lists, of one too', () => {
  expect([sum(4), sum(1, 2, 3), product(4), product(2, 3, 4)]).toEqual([4, 6, 4, 24]);
});

it('rounds a half up', () => {
  expect([round(2.4), round(2.5), round(-2.5), round(-2.6)]).toEqual([2, 3, -2, -3]);
});

it('clamps to a range', () => {
  expect([clamp(-1, 0, 1), clamp(0.4, 0, 1), clamp(9, 0, 1)]).toEqual([0, 0.4, 1]);
});
