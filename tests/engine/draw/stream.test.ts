import { describe, expect, it } from 'vitest';
import { streamOf, uniformOf, uniforms } from '../../../shared/engine/draw/stream.ts';

describe('uniformOf', () => {
  it('stays strictly inside (0, 1) and is symmetric', () => {
    const smallest = uniformOf(0, 0);
    const largest = uniformOf(0xffffffff, 0xffffffff);
    expect(smallest).toBe(2 ** -53);
    expect(largest).toBe(1 - 2 ** -53);
    expect(largest).toBeLessThan(1);
    expect(uniformOf(0x80000000, 0)).toBe(0.5 + 2 ** -53);
  });
});

describe('uniforms', () => {
  const stream = streamOf(7, 'parameter', 'p1');

  it('are the same whichever block is asked', () => {
    const whole = uniforms(stream, 0, 1000);
    expect(uniforms(stream, 250, 500)).toEqual(whole.slice(250, 500));
    expect(uniforms(stream, 251, 252)).toEqual(whole.slice(251, 252));
    expect(uniforms(stream, 3, 3)).toHaveLength(0);
  });

  it('differ by seed and by name, also where names run together', () => {
    const first = (seed: number, ...name: string[]) => uniforms(streamOf(seed, ...name), 0, 1)[0];
    const all = [first(7, 'a', 'b'), first(8, 'a', 'b'), first(7, 'ab'), first(7, 'a', 'c')];
    expect(new Set(all).size).toBe(4);
  });

  it('fill (0, 1) evenly: chi-squared over 100 cells, and no serial correlation', () => {
    const n = 100_000;
    const values = uniforms(stream, 0, n);
    const cells = new Float64Array(100);
    let products = 0;
    values.forEach((u, i) => {
      cells[Math.floor(u * 100)] = (cells[Math.floor(u * 100)] ?? 0) + 1;
      if (i > 0) products += 12 * (u - 0.5) * ((values[i - 1] ?? 0) - 0.5);
    });
    const chi = cells.reduce((sum, count) => sum + (count - n / 100) ** 2 / (n / 100), 0);
    // 99 degrees of freedom: the 0.0001 and 0.9999 quantiles are 55.0 and 160.1 (R qchisq).
    expect(chi).toBeGreaterThan(55);
    expect(chi).toBeLessThan(160.1);
    expect(Math.abs(products / Math.sqrt(n))).toBeLessThan(4);
  });
});
