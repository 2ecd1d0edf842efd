import { expect, it } from 'vitest';
import { acceptability } from '../../../shared/analysis/psa/acceptability.ts';
import { sweep } from '../../../shared/analysis/psa/sweep.ts';

it('reads a curve a strategy, ties shared', () => {
  const cost = [Float64Array.of(0, 0), Float64Array.of(5, 10)];
  const health = [Float64Array.of(0, 0), Float64Array.of(1, 1)];
  const swept = sweep({ strategies: ['a', 'b'], cost, health }, [0, 5, 10, 20]);
  expect(acceptability(swept)).toEqual([
    { strategy: 'a', probabilities: [1, 0.75, 0.25, 0] },
    { strategy: 'b', probabilities: [0, 0.25, 0.75, 1] },
  ]);
});
