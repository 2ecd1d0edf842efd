import { describe, expect, it } from 'vitest';
import { explainPayoff } from '../../../shared/analysis/explain/payoff.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { golden } from '../golden.ts';
import { CASES, off } from './examples.ts';

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

describe('explainPayoff', () => {
  it.each(CASES)('adds up to the totals by payoff of $name', ({ document, base }) => {
    for (const run of base.strategies) {
      for (const { id } of document.payoffs) {
        const want = sum(
          run.byPayoff.filter(({ payoff }) => payoff === id).map(({ total }) => total),
        );
        const told = explainPayoff(document, run.id, null, id);
        expect(off(told.total, want), `${run.id} ${id}`).toBeLessThan(1e-9);
        expect(told.cycles.at(-1)?.running ?? 0).toBe(told.total);
        for (const { occupancy, value, share, discount, product } of told.cycles.flatMap(
          ({ parts }) => parts,
        )) {
          expect(off(occupancy * (value ?? 0) * share * discount, product)).toBeLessThan(1e-9);
        }
      }
    }
  });

  it.each(CASES)('adds up by profile to the totals of $name', ({ document, base }) => {
    const profile = document.profiles.at(-1)!.id;
    for (const run of base.strategies) {
      const own = run.byProfile.find(({ id }) => id === profile)!;
      for (const measure of ['cost', 'outcome'] as const) {
        const parts = document.payoffs
          .filter((payoff) => payoff.measure === measure)
          .map(({ id }) => explainPayoff(document, run.id, profile, id).total);
        expect(off(sum(parts), own[measure])).toBeLessThan(1e-9);
      }
    }
  });

  // tests/golden/cohort.json: base R 4.2.2; costs counted and discounted at cycle end.
  it('gives the costs of each cycle of the HIV example', () => {
    const document = exampleOf('hiv-combination-therapy');
    const { published_example: published } = golden('cohort.json') as {
      published_example: Record<string, number[]>;
    };
    const costs = document.payoffs.filter(({ measure }) => measure === 'cost');
    ['mono', 'combination'].forEach((name, s) => {
      const strategy = document.strategies[s]!.id;
      const told = costs.map(({ id }) => explainPayoff(document, strategy, null, id).cycles);
      published[`cost_by_cycle_discounted_end_${name}`]!.forEach((want, cycle) => {
        const got = sum(told.map((cycles) => cycles[cycle]?.total ?? 0));
        expect(off(got, want), `${name} ${cycle}`).toBeLessThan(1e-10);
      });
    });
  });

  it('says each step: half of the start and half of the end of a cycle (by hand)', () => {
    const told = explainPayoff(tinyDocument(), 'treatment', 'all', 'drug');
    expect(told.sites).toEqual([
      { state: 'alive', path: ['payoffs', 0, 'amounts', 0, 'formula'], text: 'c_year' },
    ]);
    const [start, end] = told.cycles[0]!.parts;
    const common = { state: 'alive', value: 100, share: 0.5 };
    expect(start).toEqual({ ...common, moment: 'start', occupancy: 1, discount: 1, product: 50 });
    expect(end).toMatchObject({ ...common, moment: 'end', discount: 1.03 ** -1 });
    expect(end?.product).toBeCloseTo((100 * 0.92 * 0.5) / 1.03, 12);
    expect(explainPayoff(tinyDocument(), 'usual', 'all', 'drug').cycles).toEqual([]);
  });

  it('tells moves from those who could move, and a moment beyond the horizon counts nothing', () => {
    const tiny = tinyDocument();
    const base = { category: 'Events', measure: 'cost' as const, formula: '10' };
    const document = tinyDocument({
      payoffs: [
        ...tiny.payoffs,
        { ...base, id: 'death', label: 'Death', type: 'movement', from: 'alive', to: 'dead' },
        { ...base, id: 'late', label: 'Late', type: 'once', cycle: 11 },
        { ...base, id: 'first', label: 'First', type: 'start' },
      ],
    });
    const [first] = explainPayoff(document, 'usual', null, 'death').cycles;
    expect(first!.parts[0]).toMatchObject({ state: 'alive', moment: 'move', occupancy: 0.1 });
    expect(first!.parts[0]!.value).toBeCloseTo(10, 12);
    expect(explainPayoff(document, 'usual', null, 'late').cycles).toEqual([]);
    expect(explainPayoff(document, 'usual', null, 'first').total).toBe(10);
    expect(() => explainPayoff(document, 'usual', null, 'none')).toThrow(RangeError);
  });
});
