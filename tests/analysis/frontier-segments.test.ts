import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { frontierSegments } from '../../shared/analysis/frontier-segments.ts';
import { frontierRows, incremental } from '../../shared/analysis/incremental.ts';
import { netBenefit } from '../../shared/analysis/net-benefit.ts';
import { options, RUNS } from './arbitrary.ts';
import { optionsOf, tables } from './golden.ts';

// Source: the best strategy at each threshold in tests/golden (base R 4.2.2).
describe.each(tables)('golden table $id', ({ table }) => {
  it.each(table.nmb)('holds the best at $threshold', ({ threshold, tied_best }) => {
    const segments = frontierSegments(incremental(optionsOf(table)), Number.POSITIVE_INFINITY);
    const here = segments.filter(({ from, to }) => from <= threshold && threshold <= to);
    const best = here.flatMap(({ strategy, tied }) => [strategy, ...tied]);
    expect(new Set(best)).toEqual(new Set(tied_best));
  });
});

describe('frontierSegments', () => {
  const rows = incremental([
    { id: 'a', cost: 0, health: 0 },
    { id: 'b', cost: 100, health: 1 },
    { id: 'twin', cost: 100, health: 1 },
    { id: 'c', cost: 400, health: 2 },
  ]);

  it('stops at the highest threshold asked for', () => {
    expect(frontierSegments(rows, 250)).toEqual([
      { strategy: 'a', tied: [], from: 0, to: 100 },
      { strategy: 'b', tied: ['twin'], from: 100, to: 250 },
    ]);
    expect(frontierSegments(rows, 100)).toHaveLength(1);
  });

  it('T46: its corners are the ICERs of the frontier, without gaps', () => {
    fc.assert(
      fc.property(options, (list) => {
        const found = incremental(list);
        const segments = frontierSegments(found, Number.POSITIVE_INFINITY);
        expect(segments.slice(1).map(({ from }) => from)).toEqual(
          frontierRows(found)
            .slice(1)
            .map(({ icer }) => icer),
        );
        segments.forEach(({ to }, i) => {
          expect(to).toBe(segments[i + 1]?.from ?? Number.POSITIVE_INFINITY);
        });
      }),
      RUNS,
    );
  });

  it('agrees with net benefit at any threshold', () => {
    fc.assert(
      fc.property(options, fc.integer({ min: 0, max: 1_000_000 }), (list, threshold) => {
        const segments = frontierSegments(incremental(list), Number.POSITIVE_INFINITY);
        const here = segments.filter(({ from, to }) => from <= threshold && threshold <= to);
        const { best, tied } = netBenefit(list, threshold);
        const names = here.flatMap((segment) => [segment.strategy, ...segment.tied]);
        expect(tied).toEqual(expect.arrayContaining(names));
        if (tied.length === 1) expect(names).toEqual([best]);
      }),
      RUNS,
    );
  });
});
