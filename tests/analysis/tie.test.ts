import { describe, expect, it } from 'vitest';
import { difference, snap, tied } from '../../shared/analysis/tie.ts';

describe('tied', () => {
  it('is relative to size', () => {
    expect(tied(0.1 + 0.2, 0.3)).toBe(true);
    expect(tied(1e9, 1e9 + 1e-4)).toBe(true);
    expect(tied(1, 1 + 1e-11)).toBe(false);
    expect(tied(0, 1e-15)).toBe(false);
    expect(tied(0, 0)).toBe(true);
  });
});

describe('difference', () => {
  it('is exactly 0 for a tie', () => {
    expect(difference(0.1 + 0.2, 0.3)).toBe(0);
    expect(difference(3, 1)).toBe(2);
  });
});

describe('snap', () => {
  it('makes the tied equal and leaves the others and the order alone', () => {
    expect(snap([3, 0.1 + 0.2, -1, 0.3, 3])).toEqual([3, 0.3, -1, 0.3, 3]);
    expect(snap([])).toEqual([]);
  });
});
