import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { netBenefit } from '../../shared/analysis/net-benefit.ts';
import type { Option } from '../../shared/analysis/option.ts';
import { options, RUNS } from './arbitrary.ts';
import { optionsOf, tables } from './golden.ts';

// Source: tests/golden (base R 4.2.2), to 1e-10 x max(1, |want|) as the README there says.
describe.each(tables)('golden table $id', ({ table }) => {
  it.each(table.nmb)('at $threshold', (want) => {
    const got = netBenefit(optionsOf(table), want.threshold);
    expect(got.best).toBe(want.best);
    expect(got.tied).toEqual(want.tied_best);
    got.rows.forEach((row, i) => {
      const nmb = want.nmb[i] as number;
      expect(Math.abs(row.nmb - nmb)).toBeLessThanOrEqual(1e-10 * Math.max(1, Math.abs(nmb)));
      if (want.nhb === null) expect(row.nhb).toBeNull();
      else expect(row.nhb).toBeCloseTo(want.nhb[i] as number, 9);
    });
  });
});

describe('netBenefit', () => {
  it('lets the frontier decide between strategies that cost the same at a threshold of 0', () => {
    const list = [
      { id: 'less', cost: 10, health: 1 },
      { id: 'more', cost: 10, health: 2 },
    ];
    expect(netBenefit(list, 0)).toMatchObject({ best: 'more', tied: ['less', 'more'] });
  });

  it('finds none best of none', () => {
    expect(netBenefit([], 100)).toMatchObject({ best: null, tied: [] });
  });
});

describe('properties', () => {
  const bestOf = (list: Option[], threshold: number) => {
    const { best } = netBenefit(list, threshold);
    return list.find(({ id }) => id === best) as Option;
  };

  it('T44: at a threshold of 0 the cheapest is best', () => {
    fc.assert(
      fc.property(options, (list) => {
        expect(bestOf(list, 0).cost).toBe(Math.min(...list.map(({ cost }) => cost)));
      }),
      RUNS,
    );
  });

  it('T44: at a huge threshold the most effective is best', () => {
    fc.assert(
      fc.property(options, (list) => {
        // Steps of health are 1e-6 or more and costs span at most 1.01e6.
        expect(bestOf(list, 1e13).health).toBeCloseTo(Math.max(...list.map((o) => o.health)), 5);
      }),
      RUNS,
    );
  });

  it('T43: the order given changes neither who ties nor what is best without a tie', () => {
    fc.assert(
      fc.property(options, fc.integer({ min: 0, max: 100_000 }), (list, threshold) => {
        const got = netBenefit(list, threshold);
        const turned = netBenefit([...list].reverse(), threshold);
        expect(new Set(turned.tied)).toEqual(new Set(got.tied));
        if (got.tied.length === 1) expect(turned.best).toBe(got.best);
      }),
      RUNS,
    );
  });

  it('ranks by net health benefit as by net monetary benefit', () => {
    fc.assert(
      fc.property(options, fc.integer({ min: 1, max: 100_000 }), (list, threshold) => {
        for (const row of netBenefit(list, threshold).rows) {
          expect(row.nhb).toBeCloseTo(row.nmb / threshold, 6);
        }
      }),
      RUNS,
    );
  });
});
