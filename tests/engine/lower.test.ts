import { describe, expect, it } from 'vitest';
import { Graph } from '../../shared/engine/graph.ts';
import { Lowering } from '../../shared/engine/lower.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

function lowering(overrides: Partial<ModelDocument> = {}) {
  const graph = new Graph();
  const place = { strategy: 'usual', cycle: graph.clock('cycle') };
  return { graph, place, lowering: new Lowering(graph, tinyDocument(overrides)) };
}

describe('Lowering', () => {
  it('puts the strategy’s own formula in place of a variable', () => {
    const { graph, place, lowering: own } = lowering();
    const usual = own.formula('die_now', place);
    expect(usual).toBe(own.formula('p_die', place));
    const treated = own.formula('die_now', { ...place, strategy: 'treatment' });
    expect(graph.node(treated).operation).toMatchObject({ op: 'binary', name: 'multiply' });
  });

  it('reads the clocks', () => {
    const { graph, place, lowering: own } = lowering();
    const at = { ...place, cycle: graph.constant(3), tunnel: 2 };
    expect(graph.valueOf(own.formula('cycle', at))).toBe(3);
    expect(graph.valueOf(own.formula('time', at))).toBe(3);
    expect(graph.valueOf(own.formula('time_in_state', at))).toBe(2);
    expect(graph.valueOf(own.formula('cycle_length', at))).toBe(1);
    expect(own.formula('age', at)).toBe(own.formula('start_age + 3', at));
  });

  it('knows no time in state but where a state is timed', () => {
    const { place, lowering: own } = lowering();
    expect(() => own.formula('time_in_state', place)).toThrow(DocumentError);
  });

  it('reads tables', () => {
    const table = {
      id: 't',
      symbol: 'prices',
      label: 'Prices',
      keys: [{ label: 'year', points: [0, 1] }],
      values: [5, 8],
      interpolation: 'step' as const,
    };
    const { graph, place, lowering: own } = lowering({ tables: [table] });
    expect(graph.valueOf(own.formula('lookup(prices, 1.5)', place))).toBe(8);
    const read = own.formula('lookup(prices, cycle)', place);
    expect(own.formula('lookup(prices, cycle)', { ...place, strategy: 'treatment' })).toBe(read);
  });

  it('refuses a chain of variables that would overflow the stack', () => {
    const variables = Array.from({ length: 1_500 }, (_, k) => ({
      id: `v${k}`,
      symbol: `v${k}`,
      label: `v${k}`,
      formula: k === 0 ? 'p_die' : `v${k - 1} + 1`,
    }));
    const { place, lowering: own } = lowering({ variables });
    expect(() => own.formula('v1499', place)).toThrow(DocumentError);
    expect(() => own.formula('v100', place)).not.toThrow();
  });
});
