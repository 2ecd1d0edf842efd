import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  frontierRows,
  type IncrementalRow,
  incremental,
} from '../../shared/analysis/incremental.ts';
import { netBenefit } from '../../shared/analysis/net-benefit.ts';
import type { Option } from '../../shared/analysis/option.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { options, RUNS } from './arbitrary.ts';
import { expectClose } from './close.ts';
import { optionsOf, tables } from './golden.ts';

const WORD = {
  frontier: ['reference', 'frontier'],
  duplicate: ['frontier', 'dominated', 'extendedlyDominated'],
  dominated: ['dominated'],
  'extended dominated': ['extendedlyDominated'],
};

// Source: tests/golden/cohort.json and cohort_model1..3.json (base R 4.2.2, confirmed
// there by the upper envelope); ICERs to 1e-8 relative as the README there says.
describe.each(tables)('golden table $id', ({ table }) => {
  const rows = incremental(optionsOf(table));
  const byId = new Map(rows.map((row) => [row.id, row]));

  it('orders by cost', () => {
    expect(rows.map((row) => row.id)).toEqual(table.order_by_cost);
  });

  it('gives each strategy its status', () => {
    table.strategies.forEach((id, i) => {
      const status = table.status[i] as keyof typeof WORD;
      expect(WORD[status]).toContain(byId.get(id)?.status);
      expect(byId.get(id)?.tiedWith ?? null).toBe(
        status === 'duplicate' ? table.dominated_by_example[i] : null,
      );
    });
  });

  it('finds the frontier and its ICERs', () => {
    const frontier = frontierRows(rows);
    expect(frontier.map((row) => row.id)).toEqual(table.frontier);
    expect(frontier[0]?.status).toBe('reference');
    frontier.slice(1).forEach((row, i) => {
      expectClose(row.icer, table.frontier_icers_vs_previous[i] as number, 1e-8);
      expect(row.against).toBe(table.frontier[i]);
    });
    table.strategies.forEach((id, i) => {
      if (table.icer_by_strategy[i] === null) expect(byId.get(id)?.icer).toBeNull();
    });
  });
});

describe('incremental', () => {
  it('says why there is no ICER, and by whom a strategy is ruled out', () => {
    const table = tables[0]?.table;
    const rows = incremental(optionsOf(table as NonNullable<typeof table>));
    const row = (id: string) => rows.find((each) => each.id === id) as IncrementalRow;
    expect(row('S1')).toMatchObject({ status: 'reference', icer: null, noIcer: 'reference' });
    expect(row('S4')).toMatchObject({ noIcer: 'dominated', dominatedBy: 'S2' });
    expect(row('S8').extendedlyDominatedBy).toEqual(['S5', 'S7']);
    expect(row('S3').extendedlyDominatedBy).toEqual(['S2', 'S5']);
  });

  it('removes a strategy on the line between two others (equal ICERs)', () => {
    // 0.1 + 0.2 and the like: the line is straight only up to rounding.
    const rows = incremental([
      { id: 'a', cost: 0, health: 0 },
      { id: 'b', cost: 500, health: 0.1 },
      { id: 'c', cost: 1500, health: 0.1 + 0.2 },
    ]);
    expect(rows.map((row) => row.status)).toEqual(['reference', 'extendedlyDominated', 'frontier']);
  });

  it('takes differences of rounding for a tie', () => {
    const rows = incremental([
      { id: 'a', cost: 1000, health: 2 },
      { id: 'b', cost: 1000 * (1 - 1e-15), health: 2 * (1 - 2e-16) },
    ]);
    expect(rows.map((row) => row.tiedWith).filter((id) => id !== null)).toHaveLength(1);
    expect(rows.map((row) => row.icer)).toEqual([null, null]);
  });

  it('takes nothing, and one', () => {
    expect(incremental([])).toEqual([]);
    expect(incremental([{ id: 'a', cost: 1, health: 1 }])[0]?.status).toBe('reference');
  });

  it('refuses numbers that are not finite, naming the strategy', () => {
    const bad = [{ id: 'a', cost: Number.NaN, health: 1 }];
    expect(() => incremental(bad)).toThrow(DocumentError);
    try {
      incremental(bad);
    } catch (thrown) {
      expect((thrown as DocumentError).issues).toMatchObject([
        { code: 'analysis.notFinite', params: { strategy: 'a', quantity: 'cost' } },
      ]);
    }
  });
});

/** Two routes to the frontier that share nothing with the code under test. */
function envelope(list: readonly Option[]): Set<string> {
  const crossings = list.flatMap((a) =>
    list
      .filter((b) => b.health > a.health)
      .map((b) => (b.cost - a.cost) / (b.health - a.health))
      .filter((threshold) => threshold > 0),
  );
  const stops = [...new Set([0, ...crossings])].sort((a, b) => a - b);
  const inside = stops.map((stop, i) => {
    const next = stops[i + 1];
    return next === undefined ? stop * 2 + 1 : (stop + next) / 2;
  });
  const winners = new Set<string>();
  for (const threshold of inside) {
    const nmb = list.map((option) => threshold * option.health - option.cost);
    const highest = Math.max(...nmb);
    const size = Math.max(...list.map((o) => Math.abs(threshold * o.health) + Math.abs(o.cost)));
    list.forEach((option, i) => {
      if (highest - (nmb[i] as number) <= 1e-13 * size) winners.add(option.id);
    });
  }
  return winners;
}

describe('properties', () => {
  it('finds the frontier of the upper envelope by brute force', () => {
    // Integers only: crossings that differ by rounding make intervals of no width.
    const integers = options.filter((list) => list.every((o) => Number.isInteger(o.cost)));
    fc.assert(
      fc.property(integers, (list) => {
        const rows = incremental(list);
        const onFrontier = rows.filter(({ status }) => /reference|frontier/.test(status));
        expect(new Set(onFrontier.map((row) => row.id))).toEqual(envelope(list));
      }),
      RUNS,
    );
  });

  it('T45: ICERs along the frontier strictly rise, from above 0', () => {
    fc.assert(
      fc.property(options, (list) => {
        let before = 0;
        for (const row of frontierRows(incremental(list)).slice(1)) {
          expect(row.icer).toBeGreaterThan(before);
          before = row.icer as number;
        }
      }),
      RUNS,
    );
  });

  it('T45: what is dominated is never the one best', () => {
    fc.assert(
      fc.property(options, fc.double({ min: 0, max: 1e6, noNaN: true }), (list, threshold) => {
        const { best } = netBenefit(list, threshold);
        const row = incremental(list).find(({ id }) => id === best);
        expect(['reference', 'frontier']).toContain(row?.status);
      }),
      RUNS,
    );
  });

  it('names a strategy that truly dominates, and a pair whose mix truly does', () => {
    fc.assert(
      fc.property(options, (list) => {
        const rows = incremental(list);
        const get = (id: string) => rows.find((row) => row.id === id) as IncrementalRow;
        for (const row of rows) {
          if (row.status === 'dominated') {
            const by = get(row.dominatedBy as string);
            expect(by.cost <= row.cost && by.health >= row.health).toBe(true);
          }
          if (row.status === 'extendedlyDominated') {
            const [low, high] = (row.extendedlyDominatedBy as [string, string]).map(get) as [
              IncrementalRow,
              IncrementalRow,
            ];
            const share = (row.cost - low.cost) / (high.cost - low.cost);
            const mixed = low.health + share * (high.health - low.health);
            expect(mixed).toBeGreaterThanOrEqual(row.health - 1e-9 * Math.abs(row.health));
          }
        }
      }),
      RUNS,
    );
  });

  it('T42: a duplicate changes nothing for the others, and the tie is said', () => {
    fc.assert(
      fc.property(options, fc.nat(), (list, pick) => {
        const original = list[pick % list.length] as Option;
        const rows = incremental([...list, { ...original, id: 'twin' }]);
        expect(rows.filter(({ id }) => id !== 'twin')).toEqual(incremental(list));
        expect(rows.find(({ id }) => id === 'twin')?.tiedWith).not.toBeNull();
      }),
      RUNS,
    );
  });

  it('T43: the order given changes nothing but which of the tied comes first', () => {
    const distinct = options.filter(
      (list) => new Set(list.map((o) => `${o.cost}/${o.health}`)).size === list.length,
    );
    fc.assert(
      fc.property(distinct, (list) => {
        expect(incremental([...list].reverse())).toEqual(incremental(list));
      }),
      RUNS,
    );
  });

  it('T46: at a frontier ICER the two neighbours tie', () => {
    fc.assert(
      fc.property(options, (list) => {
        for (const row of frontierRows(incremental(list)).slice(1)) {
          const { tied } = netBenefit(list, row.icer as number);
          expect(tied).toContain(row.id);
          expect(tied).toContain(row.against);
        }
      }),
      RUNS,
    );
  });
});
