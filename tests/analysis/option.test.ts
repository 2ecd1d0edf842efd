import { describe, expect, it } from 'vitest';
import { requireFinite } from '../../shared/analysis/option.ts';
import type { DocumentError } from '../../shared/model/issue.ts';

describe('requireFinite', () => {
  it('names every strategy and quantity that is not finite', () => {
    requireFinite([{ id: 'fine', cost: -1, health: 0 }]);
    try {
      requireFinite([{ id: 'bad', cost: Number.POSITIVE_INFINITY, health: Number.NaN }]);
      expect.unreachable();
    } catch (thrown) {
      expect((thrown as DocumentError).issues.map(({ params }) => params)).toEqual([
        { strategy: 'bad', quantity: 'cost' },
        { strategy: 'bad', quantity: 'health' },
      ]);
    }
  });
});
