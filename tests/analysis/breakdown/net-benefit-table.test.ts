import { describe, expect, it } from 'vitest';
import { netBenefitTable } from '../../../shared/analysis/breakdown/net-benefit-table.ts';
import type { BaseRun, StrategyRun } from '../../../shared/engine/results.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { off } from '../explain/examples.ts';
import { tables } from '../golden.ts';

/** A base run of given totals, for a document with those strategies. */
function given(ids: readonly string[], cost: readonly number[], outcome: readonly number[]) {
  const tiny = tinyDocument();
  const strategies: StrategyRun[] = ids.map((id, index) => ({
    ...{ id, cost: cost[index]!, outcome: outcome[index]!, lifeYears: 0 },
    ...{ byProfile: [], byPayoff: [] },
  }));
  const base: BaseRun = { strategies, cycleLength: 1, cycles: 1, problems: [] };
  const document: ModelDocument = tinyDocument({
    strategies: ids.map((id) => ({ id, label: id })),
    question: { ...tiny.question, comparator: ids[0]! },
  });
  return { document, base };
}

describe('netBenefitTable', () => {
  // tests/golden incremental tables: base R 4.2.2, best by the upper envelope of NMB lines.
  it.each(tables)('gives the net benefits of $id', ({ table }) => {
    const { document, base } = given(table.strategies, table.cost, table.effect);
    const thresholds = table.nmb.map(({ threshold }) => threshold);
    netBenefitTable(document, base, thresholds).forEach((column, at) => {
      const want = table.nmb[at]!;
      expect(column.threshold).toBe(want.threshold);
      expect([...column.tied].sort()).toEqual([...want.tied_best].sort());
      column.cells.forEach(({ nmb, inmb }, s) => {
        expect(off(nmb, want.nmb[s]!)).toBeLessThan(1e-10);
        expect(off(inmb, want.nmb[s]! - want.nmb[0]!)).toBeLessThan(1e-9);
      });
    });
  });

  it('has no net health benefit at a threshold of 0', () => {
    const { document, base } = given(['a', 'b'], [1, 2], [1, 3]);
    const [at0, at1] = netBenefitTable(document, base, [0, 1]);
    expect(at0!.cells.map(({ nhb }) => nhb)).toEqual([null, null]);
    expect(at1!.cells.map(({ nhb }) => nhb)).toEqual([0, 1]);
    expect([at0!.best, at1!.best]).toEqual(['a', 'b']);
  });
});
