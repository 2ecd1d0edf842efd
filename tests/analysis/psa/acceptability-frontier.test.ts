import { expect, it } from 'vitest';
import { acceptabilityFrontier } from '../../../shared/analysis/psa/acceptability-frontier.ts';
import { sweep } from '../../../shared/analysis/psa/sweep.ts';

// Two small losses and one large gain: best on average, best in one draw of three.
it('follows the highest mean, not the highest probability', () => {
  const cost = [new Float64Array(3), new Float64Array(3)];
  const health = [new Float64Array(3), Float64Array.of(-1, -1, 10)];
  const swept = sweep({ strategies: ['a', 'b'], cost, health }, [100]);
  expect(acceptabilityFrontier(swept)).toEqual([
    { threshold: 100, strategy: 'b', probability: 1 / 3 },
  ]);
});
