import { expect, it } from 'vitest';
import { evpi } from '../../../shared/analysis/psa/evpi.ts';
import { sweep } from '../../../shared/analysis/psa/sweep.ts';

// By hand: net benefits of b are -10 and 30, of a 0; b is best on average (10), and
// knowing would save its loss of 10 in one draw of two: mean 5, sd 10 / sqrt(2).
it('is the mean loss of the strategy best on average, with its standard error', () => {
  const cost = [new Float64Array(2), new Float64Array(2)];
  const health = [new Float64Array(2), Float64Array.of(-1, 3)];
  const [value] = evpi(sweep({ strategies: ['a', 'b'], cost, health }, [10]));
  expect(value).toEqual({ threshold: 10, perPerson: 5, standardError: 5 });
});
