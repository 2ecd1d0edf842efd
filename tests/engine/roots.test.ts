import { describe, expect, it } from 'vitest';
import { openAccounts } from '../../shared/engine/accounts.ts';
import { compile } from '../../shared/engine/compile.ts';
import { reachedFrom, sojournsOf, strategyRoots } from '../../shared/engine/roots.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

function rootsOf(trace: boolean) {
  const model = compile(tinyDocument());
  const accounts = openAccounts(model, { tallies: 1, tallyOf: () => 0, lifeYears: null });
  const roots = strategyRoots(model.graph, model.plans[1]!, accounts.plans[1]!, 2, trace);
  return { graph: model.graph, roots };
}

describe('strategyRoots', () => {
  it('follows all states for a trace, else those that matter', () => {
    expect([...rootsOf(true).roots.followed]).toEqual([0, 1]);
    expect([...rootsOf(false).roots.followed]).toEqual([0]);
  });

  it('reads columns only', () => {
    const { graph, roots } = rootsOf(true);
    const read = [...roots.initial, ...roots.steps!.flatMap(({ factors }) => factors)];
    for (const node of read) expect(graph.node(node).wide).toBe(true);
  });
});

describe('reachedFrom', () => {
  it('holds every argument of what it holds', () => {
    const { graph, roots } = rootsOf(true);
    const reached = reachedFrom(graph, roots);
    for (const node of reached) {
      for (const arg of graph.node(node).args) expect(reached.has(arg)).toBe(true);
    }
  });
});

describe('sojournsOf', () => {
  it('names each weight set and substate once', () => {
    const { roots } = rootsOf(false);
    // The drug's cost and the QALYs are of one state under one rate.
    expect(roots.steady.length).toBeGreaterThan(0);
    expect(sojournsOf(roots)).toEqual([{ set: 0, substate: 0 }]);
  });
});
