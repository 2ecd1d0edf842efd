/** What compile makes of time in state, survival curves and start shares, seen through a run. */
import { describe, expect, it } from 'vitest';
import { prepare } from '../../shared/engine/engine.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

function traceOf(overrides: Partial<ModelDocument>) {
  const run = prepare(tinyDocument({ payoffs: [], ...overrides })).base({ trace: true });
  return { trace: run.strategies[0]!.trace!, problems: run.problems };
}

describe('time in state', () => {
  it('lets the chance of leaving follow the years since arrival, the last tunnel holding', () => {
    const { trace } = traceOf({
      states: [
        { id: 'alive', label: 'Alive', type: 'timed', cycles: 3, dead: false },
        { id: 'dead', label: 'Dead', type: 'absorbing', dead: true },
      ],
      variables: [],
      movements: {
        type: 'rows',
        rows: [
          {
            id: 'r',
            from: 'alive',
            basis: 'probabilities',
            remainder: 'alive',
            cells: [{ id: 'c', to: 'dead', formula: '(1 + time_in_state) / 10' }],
          },
        ],
      },
    });
    // By hand: chances 0.1, 0.2, then 0.3 for ever.
    expect(trace[1]![0]).toBeCloseTo(0.9, 14);
    expect(trace[2]![0]).toBeCloseTo(0.9 * 0.8, 14);
    expect(trace[5]![0]).toBeCloseTo(0.9 * 0.8 * 0.7 ** 3, 14);
  });
});

describe('partitioned survival', () => {
  const states: ModelDocument['states'] = [
    { id: 'well', label: 'Without progression', type: 'ordinary', dead: false },
    { id: 'ill', label: 'Progressed', type: 'ordinary', dead: false },
    { id: 'dead', label: 'Dead', type: 'absorbing', dead: true },
  ];
  const curves = (well: string, alive: string): Partial<ModelDocument> => ({
    states,
    start: { remainder: 'well', shares: [] },
    movements: {
      type: 'survival',
      curves: [
        { id: 'a', state: 'well', formula: well },
        { id: 'b', state: 'ill', formula: alive },
      ],
      last: 'dead',
    },
  });

  it('has in each state what lies between the curves', () => {
    const { trace, problems } = traceOf(curves('exp(0 - 0.3 * time)', 'exp(0 - 0.1 * time)'));
    expect(problems).toEqual([]);
    trace.forEach(([well, ill, dead], k) => {
      expect(well).toBeCloseTo(Math.exp(-0.3 * k), 14);
      expect(ill).toBeCloseTo(Math.exp(-0.1 * k) - Math.exp(-0.3 * k), 14);
      expect(dead).toBeCloseTo(1 - Math.exp(-0.1 * k), 14);
    });
  });

  it('reports curves that cross, and does not uncross them', () => {
    const { trace, problems } = traceOf(curves('exp(0 - 0.1 * time)', 'exp(0 - 0.2 * time)'));
    expect(problems.map(({ code }) => code)).toEqual(['run.curvesCross']);
    expect(trace[1]![1]).toBeLessThan(0);
  });
});

describe('start', () => {
  it('is a formula a state, the remainder taking the rest', () => {
    const shares = [{ id: 's', state: 'dead', formula: 'p_die * 2' }];
    const { trace } = traceOf({ start: { remainder: 'alive', shares } });
    expect(trace[0]).toEqual([0.8, 0.2]);
  });

  it('reports more than there is', () => {
    const shares = [{ id: 's', state: 'dead', formula: 'p_die * 9 + p_die * 2' }];
    const { problems } = traceOf({ start: { remainder: 'alive', shares } });
    expect(problems.map(({ code }) => code)).toContain('run.startRemainderOutside');
  });
});
