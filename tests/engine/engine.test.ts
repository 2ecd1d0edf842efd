import { describe, expect, it } from 'vitest';
import { drawParameters } from '../../shared/engine/draw/draw.ts';
import { prepare } from '../../shared/engine/engine.ts';
import { BLOCK_DRAWS } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const settings = { samples: 2 * BLOCK_DRAWS + 17, seed: 3, plan: 'plain' } as const;

describe('prepare', () => {
  it('gives the base case of a two-state model (T12: geometric closed form)', () => {
    const { strategies, problems, cycles } = prepare(tinyDocument()).base();
    expect(problems).toEqual([]);
    expect(cycles).toBe(10);
    // Trapezoid over survival q^k, discounted at 3%: by hand.
    const years = (q: number, v: number) => {
      let sum = 0;
      for (let k = 0; k <= 10; k++) sum += (k === 0 || k === 10 ? 0.5 : 1) * (q * v) ** k;
      return sum;
    };
    const [usual, treatment] = strategies;
    expect(usual!.outcome).toBeCloseTo(0.8 * years(0.9, 1 / 1.03), 12);
    expect(usual!.cost).toBe(0);
    expect(usual!.lifeYears).toBeCloseTo(years(0.9, 1), 12);
    expect(treatment!.outcome).toBeCloseTo(0.8 * years(0.92, 1 / 1.03), 12);
    expect(treatment!.cost).toBeCloseTo(100 * years(0.92, 1 / 1.03), 10);
  });

  it('breaks totals down by payoff and profile, and they add up (T26, T61)', () => {
    const tiny = tinyDocument();
    const profiles = [
      { id: 'young', label: 'Young', share: 0.25, covariates: { start_age: 20 } },
      { id: 'old', label: 'Old', share: 0.75, covariates: { start_age: 60 } },
    ];
    const variables: ModelDocument['variables'] = [
      {
        ...tiny.variables[0]!,
        formula: {
          byStrategy: { treatment: 'p_die * rr_die * age / 100' },
          otherwise: 'p_die * age / 100',
        },
      },
    ];
    for (const run of prepare({ ...tiny, profiles, variables }).base().strategies) {
      for (const measure of ['cost', 'outcome'] as const) {
        const parts = run.byPayoff.filter((part) => part.measure === measure);
        expect(parts.reduce((sum, { total }) => sum + total, 0)).toBeCloseTo(run[measure], 12);
        const weighted = run.byProfile.reduce(
          (sum, part, k) => sum + profiles[k]!.share * part[measure],
          0,
        );
        expect(weighted).toBeCloseTo(run[measure], 12);
      }
    }
  });

  it('gives the same draws whatever blocks are asked for (T49)', () => {
    const engine = prepare(tinyDocument());
    const whole = engine.draws(settings, 0, settings.samples);
    for (const [from, to] of [
      [0, BLOCK_DRAWS],
      [BLOCK_DRAWS, settings.samples],
      [7, 9],
    ] as const) {
      const part = engine.draws(settings, from, to);
      part.cost.forEach((column, s) => {
        expect([...column]).toEqual([...whole.cost[s]!.subarray(from, to)]);
      });
      part.outcome.forEach((column, s) => {
        expect([...column]).toEqual([...whole.outcome[s]!.subarray(from, to)]);
      });
    }
    const again = prepare(tinyDocument()).draws(settings, 0, settings.samples);
    expect(again.cost.map((column) => [...column])).toEqual(
      whole.cost.map((column) => [...column]),
    );
  });

  it('gives in a draw what the base case gives at its values', () => {
    const tiny = tinyDocument();
    const values = drawParameters(tiny.parameters, [], settings, 0, 3);
    const draws = prepare(tiny).simulate(values, 0, 3);
    for (let draw = 0; draw < 3; draw++) {
      const parameters = tiny.parameters.map((parameter) => ({
        ...parameter,
        value: values.get(parameter.id)![draw]!,
      }));
      prepare({ ...tiny, parameters })
        .base()
        .strategies.forEach((run, s) => {
          expect(draws.cost[s]![draw]).toBeCloseTo(run.cost, 9);
          expect(draws.outcome[s]![draw]).toBeCloseTo(run.outcome, 12);
        });
    }
  });

  it('gives the base case in every draw where nothing is uncertain (T48)', () => {
    const tiny = tinyDocument();
    const parameters = tiny.parameters.map((parameter) => ({
      ...parameter,
      distribution: { type: 'fixed' as const },
    }));
    const engine = prepare({ ...tiny, parameters });
    const base = engine.base();
    const { cost, outcome } = engine.draws(settings, 0, 5);
    base.strategies.forEach((run, s) => {
      for (const value of cost[s]!) expect(value).toBeCloseTo(run.cost, 9);
      for (const value of outcome[s]!) expect(value).toBeCloseTo(run.outcome, 12);
    });
  });

  it('refuses a broken document with all its errors', () => {
    const tiny = tinyDocument();
    const broken = { ...tiny, variables: [{ ...tiny.variables[0]!, formula: 'p_dye * 2' }] };
    const codes = () => {
      try {
        prepare(broken);
        return [];
      } catch (thrown) {
        return (thrown as DocumentError).issues.map(({ code }) => code);
      }
    };
    expect(() => prepare(broken)).toThrow(DocumentError);
    expect(codes()).toContain('formula.unknownName');
  });

  it('says when a total is no number', () => {
    const tiny = tinyDocument();
    const payoffs = tiny.payoffs.map((payoff) => ({
      ...payoff,
      amounts: [{ id: 'x', state: 'alive', formula: 'ln(c_year - 100) * 0 + 1e308 * c_year' }],
    })) as ModelDocument['payoffs'];
    const engine = prepare({ ...tiny, payoffs });
    expect(engine.base().problems.map(({ code }) => code)).toContain('run.notFinite');
    const { problems } = engine.draws({ ...settings, samples: 4 }, 0, 4);
    expect(problems[0]).toMatchObject({
      code: 'run.notFinite',
      severity: 'warning',
      params: { count: 4, draw: 0 },
    });
  });
});
