/**
 * Verification tests that need to know what an example's parameters mean. Numbers and
 * tolerances as in verification.test.ts.
 */
import { describe, expect, it } from 'vitest';
import type { ModelDocument } from '../../shared/model/document.ts';
import { expectRelative } from '../engine/close.ts';
import { baseOf, discounting, exampleOf, runOf, withValues } from './load.ts';

const F = 1e-9;

function withAmounts(document: ModelDocument, payoff: string, formula: string): ModelDocument {
  const payoffs = document.payoffs.map((each) =>
    each.id === payoff && each.type === 'state'
      ? { ...each, amounts: each.amounts.map((amount) => ({ ...amount, formula })) }
      : each,
  );
  return { ...document, payoffs };
}

function payoffOf(document: ModelDocument, strategy: string, payoff: string): number {
  return runOf(baseOf(document), strategy)
    .byPayoff.filter((each) => each.payoff === payoff)
    .reduce((sum, each) => sum + each.total, 0);
}

describe('HIV combination therapy', () => {
  const document = exampleOf('hiv-combination-therapy');

  it('T40: with a relative risk of 1 the traces are equal and only lamivudine costs more', () => {
    const same = withValues(document, { rr: 1 });
    const base = baseOf(same);
    const [mono, combination] = [runOf(base, 'mono'), runOf(base, 'combination')];
    expect(combination.trace).toEqual(mono.trace);
    const lamivudine = payoffOf(same, 'combination', 'lamivudine-cost');
    expect(lamivudine).toBeGreaterThan(0);
    expectRelative(combination.cost - mono.cost, lamivudine, F, 'cost');
  });

  it('T13: a higher relative risk takes life years away', () => {
    const years = [0.4, 0.509, 0.71, 1].map(
      (rr) => runOf(baseOf(withValues(document, { rr })), 'combination').lifeYears,
    );
    expect(years).toEqual([...years].sort((a, b) => b - a));
    expect(new Set(years).size).toBe(4);
  });

  it('T27: cost is linear in the price of lamivudine, and life years do not move', () => {
    const [free, half, full] = [0, 1043.25, 2086.5].map((lamivudine) =>
      runOf(baseOf(withValues(document, { lamivudine })), 'combination'),
    );
    expectRelative((free?.cost ?? 0) + (full?.cost ?? 0), 2 * (half?.cost ?? 0), F, 'cost');
    expect(full?.outcome).toBe(free?.outcome);
  });
});

describe('Keeping hearts well', () => {
  const document = exampleOf('keeping-hearts-well');

  it('T18: with every utility 1 and no discounting, QALYs are life years', () => {
    const full = withValues(document, {
      'u-mild': 1,
      'u-moderate': 1,
      'u-severe': 1,
      'u-surgery': 1,
    });
    for (const run of baseOf(discounting(full, { outcomes: 0 })).strategies) {
      expectRelative(run.outcome, run.lifeYears, F, run.id);
    }
  });

  it('T14: higher mortality takes life years away', () => {
    const tables = document.tables.map((table) => ({
      ...table,
      values: table.values.map((value) => value * 1.5),
    }));
    const [now, then] = [baseOf(document), baseOf({ ...document, tables })];
    for (const run of now.strategies) {
      expect(runOf(then, run.id).lifeYears).toBeLessThan(run.lifeYears);
    }
  });

  it('background mortality comes first: the mild die at the rate of the life table', () => {
    const everyoneMild = { ...document, start: { ...document.start, shares: [] } };
    const [profile] = document.profiles;
    const boys = { ...everyoneMild, profiles: [{ ...profile!, share: 1 }] };
    const [, first] = runOf(baseOf(boys), 'now').trace ?? [];
    // Boys of 8 lie between the points for 5 (0.0022) and 10 (0.0012).
    expect(first?.[4]).toBeCloseTo(0.0022 + (3 / 5) * (0.0012 - 0.0022), 12);
  });

  it('the better the reach of injections, the better the health', () => {
    const { strategies } = baseOf(document);
    const byReach = ['now', 'register', 'clinic', 'school'];
    const outcomes = byReach.map((id) => strategies.find((run) => run.id === id)?.outcome ?? 0);
    expect(outcomes).toEqual([...outcomes].sort((a, b) => a - b));
  });

  it('without an effect of injections, only costs differ', () => {
    const inert = baseOf(withValues(document, { 'b-full': 0, 'b-recover-full': 0 }));
    for (const run of inert.strategies) {
      expectRelative(run.outcome, runOf(inert, 'now').outcome, F, run.id);
    }
  });
});

describe('Test before treating', () => {
  const document = exampleOf('test-before-treating');

  it('T28: without disability weights, DALYs are the years of life lost', () => {
    const light = withValues(document, { 'dw-ill': 0, 'dw-severe': 0, 'dw-lasting': 0 });
    for (const run of baseOf(light).strategies) {
      expectRelative(run.outcome, payoffOf(light, run.id, 'yll'), F, run.id);
      expectRelative(payoffOf(light, run.id, 'yll'), payoffOf(document, run.id, 'yll'), F, run.id);
    }
  });

  it('the tree at the start shares fevers out by prevalence, accuracy and what is followed', () => {
    const [profile] = document.profiles;
    const young = { ...document, profiles: [{ ...profile!, share: 1 }] };
    const value = new Map(document.parameters.map((each) => [each.id, each.value]));
    const [january = 0] = document.tables.find(({ id }) => id === 'season')?.values ?? [];
    const share = value.get('malaria-young') ?? 0;
    const odds = (share / (1 - share)) * january;
    const malaria = odds / (1 + odds);
    const [sensitivity = 0, overruled = 0] = ['sens-rapid', 'overruled'].map((id) => value.get(id));
    const [first] = runOf(baseOf(young), 'rapid').trace ?? [];
    const treated = malaria * (sensitivity + (1 - sensitivity) * overruled);
    expectRelative(first?.[1] ?? 0, treated, F, 'malaria, treated');
    expectRelative(first?.[2] ?? 0, malaria - treated, F, 'malaria, missed');
    expect(runOf(baseOf(young), 'treat-all').trace?.[0]?.[2]).toBe(0);
  });
});

describe('A chair or a kidney', () => {
  const document = exampleOf('a-chair-or-a-kidney');

  it('nobody has a transplant without the programme', () => {
    const base = baseOf(document);
    for (const id of ['chairs', 'bags']) {
      expect(runOf(base, id).trace?.every((row) => row[2] === 0)).toBe(true);
    }
    expect(runOf(base, 'kidney').trace?.[5]?.[2]).toBeGreaterThan(0.05);
  });

  it('T25: without the price of new machines, cost falls by what they cost', () => {
    const machines = payoffOf(document, 'chairs', 'refit');
    expect(machines).toBeGreaterThan(0);
    const [with_, without] = [document, withValues(document, { 'c-refit': 0 })].map(
      (each) => runOf(baseOf(each), 'chairs').cost,
    );
    expectRelative((with_ ?? 0) - (without ?? 0), machines, 1e-9, 'machines');
  });

  it('T21: a gain in every utility adds so much for each discounted life year', () => {
    const ones = payoffOf(withAmounts(document, 'qalys', '1'), 'kidney', 'qalys');
    const more = withValues(document, {
      'u-chair': 0.67,
      'u-bag': 0.69,
      'u-kidney-first': 0.84,
      'u-kidney': 0.92,
    });
    const [before, after] = [document, more].map((each) => runOf(baseOf(each), 'kidney').outcome);
    expectRelative((after ?? 0) - (before ?? 0), 0.1 * ones, F, 'QALYs');
  });
});

describe('More time with a new drug', () => {
  const document = exampleOf('more-time-with-a-new-drug');

  it('reads occupancy off the curves', () => {
    const value = new Map(document.parameters.map((each) => [each.id, each.value]));
    const get = (id: string): number => value.get(id) ?? Number.NaN;
    const [younger] = document.profiles;
    const one = { ...document, profiles: [{ ...younger!, share: 1 }] };
    const row = runOf(baseOf(one), 'chemo').trace?.[12];
    // One year: Weibull survival, times Gompertz survival from age 46 (written out).
    const slope = get('mort-slope');
    const rate = get('mort-50') * Math.exp(slope * (46 - 50));
    const others = Math.exp((-rate / slope) * Math.expm1(slope));
    const stable = Math.exp(-((1 / get('pfs-scale')) ** get('pfs-shape'))) * others;
    expectRelative(row?.[0] ?? 0, stable, F, 'before progression');
  });

  it('T40: with hazard ratios of 1, only costs and the burden of the tablet differ', () => {
    const ones = {
      'hr-os-open': 1,
      'hr-pfs-open': 1,
      'lost-os': 1,
      'lost-pfs': 1,
      'loss-tablet': 0,
    };
    const base = baseOf(withValues(document, ones));
    for (const id of ['year', 'open']) {
      expect(runOf(base, id).trace).toEqual(runOf(base, 'chemo').trace);
      expectRelative(runOf(base, id).outcome, runOf(base, 'chemo').outcome, F, id);
    }
  });
});
