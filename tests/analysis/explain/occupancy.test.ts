import { describe, expect, it } from 'vitest';
import { explainOccupancy } from '../../../shared/analysis/explain/occupancy.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { golden } from '../golden.ts';
import { CASES, off } from './examples.ts';

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

describe('explainOccupancy', () => {
  it.each(CASES)('adds up to the trace of $name', ({ document, base }) => {
    const survival = document.movements.type === 'survival';
    for (const run of base.strategies) {
      for (const cycle of [0, 1, 2, Math.floor(base.cycles / 2), base.cycles]) {
        document.states.forEach(({ id }, state) => {
          const want = run.trace![cycle]![state]!;
          const told = explainOccupancy(document, run.id, null, id, cycle);
          expect(off(told.occupancy, want)).toBeLessThan(1e-12);
          if (cycle > 0 && !survival) {
            expect(off(sum(told.inflows.map(({ flow }) => flow)), want)).toBeLessThan(1e-12);
          }
          if (cycle < base.cycles && !survival) {
            expect(off(sum(told.outflows.map(({ flow }) => flow)), want)).toBeLessThan(1e-12);
          }
          for (const { occupancy, chance, flow } of [...told.inflows, ...told.outflows]) {
            expect(off(occupancy * chance, flow)).toBeLessThan(1e-12);
          }
          if (cycle === 0 || survival) {
            const terms = told.terms.map(({ sign, value }) => sign * value);
            expect(off(sum(terms), want)).toBeLessThan(1e-12);
          } else expect(told.terms).toEqual([]);
        });
      }
    }
  });

  // tests/golden/cohort.json: base R 4.2.2, checked by matrix powers in Python.
  it('gives the first cycles of the HIV example', () => {
    const document = exampleOf('hiv-combination-therapy');
    const { published_example: published } = golden('cohort.json') as {
      published_example: { trace_mono: number[][]; trace_combination: number[][] };
    };
    const traces = [published.trace_mono, published.trace_combination];
    document.strategies.forEach((strategy, s) => {
      for (let cycle = 0; cycle <= 5; cycle++) {
        document.states.forEach(({ id }, state) => {
          const told = explainOccupancy(document, strategy.id, null, id, cycle);
          expect(told.occupancy).toBeCloseTo(traces[s]![cycle]![state]!, 12);
        });
      }
    });
  });

  it('says whence, with what chance and by which formula', () => {
    const told = explainOccupancy(tinyDocument(), 'treatment', 'all', 'dead', 1);
    expect(told.inflows).toEqual([
      {
        state: 'alive',
        stays: false,
        occupancy: 1,
        chance: 0.1 * 0.8,
        flow: 0.1 * 0.8,
        site: { path: ['movements', 'rows', 0, 'cells', 0, 'formula'], text: 'die_now' },
      },
      { state: 'dead', stays: true, occupancy: 0, chance: 1, flow: 0, site: null },
    ]);
    expect(told.outflows.map(({ state, stays }) => [state, stays])).toEqual([['dead', true]]);
  });

  it('refuses what is not there', () => {
    const explain = (state: string, cycle: number) => () =>
      explainOccupancy(tinyDocument(), 'usual', null, state, cycle);
    expect(explain('nowhere', 0)).toThrow(RangeError);
    expect(explain('alive', 11)).toThrow(RangeError);
  });
});
