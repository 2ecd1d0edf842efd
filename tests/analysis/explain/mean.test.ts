import { describe, expect, it } from 'vitest';
import { Mean } from '../../../shared/analysis/explain/mean.ts';

describe('Mean', () => {
  it('keeps a value that all share, to the last bit, even where nobody is', () => {
    const mean = new Mean();
    mean.add(0.1, 0.3);
    mean.add(0.2, 0.3);
    expect(mean.value).toBe(0.3);
    const empty = new Mean();
    empty.add(0, 7);
    expect(empty.value).toBe(7);
  });

  it('weighs values that differ', () => {
    const mean = new Mean();
    mean.add(1, 10);
    mean.add(3, 20);
    expect([mean.weight, mean.sum, mean.value]).toEqual([4, 70, 17.5]);
  });

  it('is null where nothing weighs', () => {
    expect(new Mean().value).toBeNull();
    const mean = new Mean();
    mean.addSum(0, 0);
    expect(mean.value).toBeNull();
  });
});
