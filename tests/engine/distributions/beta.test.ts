/** Against tests/golden/tails.json (R's pbeta and qbeta). */
import { describe, expect, it } from 'vitest';
import { beta } from '../../../shared/engine/distributions/beta.ts';
import golden from '../../golden/tails.json' with { type: 'json' };
import { expectRelative } from '../close.ts';

describe.each(golden.beta)('alpha $alpha, beta $beta', ({ x, cdf, sf, ...shapes }) => {
  const law = beta(shapes);

  it('quantile within 1e-12', () => {
    golden.p.forEach((p, i) => {
      expectRelative(law.quantile(p), x[i] ?? 0, 1e-12, `p ${p}`);
    });
  });

  it('both tails within 1e-11', () => {
    x.forEach((value, i) => {
      expectRelative(law.cdf(value), cdf[i] ?? 0, 1e-11, `cdf at ${value}`);
      expectRelative(law.sf(value), sf[i] ?? 0, 1e-11, `sf at ${value}`);
    });
  });

  it('stays in [0, 1] and keeps its order at the ends', () => {
    const ends = [0, 2 ** -53, 0.5, 1 - 2 ** -53, 1].map(law.quantile);
    expect(ends).toEqual([...ends].sort((a, b) => a - b));
    expect([ends[0], ends[4]]).toEqual([0, 1]);
  });
});
