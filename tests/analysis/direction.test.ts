import { describe, expect, it } from 'vitest';
import { toHealth, toHealthColumn } from '../../shared/analysis/direction.ts';

describe('toHealth', () => {
  it('turns what fewer is better of, and nothing else', () => {
    expect(toHealth(12.5, 'fewerIsBetter')).toBe(-12.5);
    expect(toHealth(12.5, 'moreIsBetter')).toBe(12.5);
    expect(toHealth(toHealth(3, 'fewerIsBetter'), 'fewerIsBetter')).toBe(3);
    expect(Object.is(toHealth(0, 'fewerIsBetter'), 0)).toBe(true);
  });
});

describe('toHealthColumn', () => {
  it('leaves the column given as it was', () => {
    const dalys = new Float64Array([1, 0, 2]);
    expect([...toHealthColumn(dalys, 'fewerIsBetter')]).toEqual([-1, 0, -2]);
    expect([...dalys]).toEqual([1, 0, 2]);
    expect(toHealthColumn(dalys, 'moreIsBetter')).toBe(dalys);
  });
});
