import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import * as conversions from '../../shared/formula/conversions.ts';
import rates from '../golden/rates.json' with { type: 'json' };

// tests/golden/rates.json: closed forms in R 4.2.2, absolute tolerance 1e-12 (its README).
const close = (got: number, want: number) =>
  expect(Math.abs(got - want)).toBeLessThanOrEqual(1e-12);
const golden = rates.conversions;

describe('against the reference set', () => {
  it.each(golden.rate_to_prob)('chance of $inputs', ({ inputs, expected }) => {
    close(conversions.chance(inputs.rate, inputs.t), expected.p);
  });

  it.each(golden.prob_to_rate)('hazard of $inputs', ({ inputs, expected }) => {
    close(conversions.hazard(inputs.p, inputs.t), expected.rate);
  });

  it.each(golden.change_cycle)('rescale of $inputs', ({ inputs, expected }) => {
    close(conversions.rescale(inputs.p, inputs.from, inputs.to), expected.p);
  });

  it.each(golden.competing)('competing of $inputs', ({ inputs, expected }) => {
    const total = inputs.rates.reduce((a, b) => a + b);
    inputs.rates.forEach((rate, index) => {
      close(conversions.competing(rate, total, inputs.t), expected.p[index] ?? Number.NaN);
    });
    close(1 - conversions.chance(total, inputs.t), expected.stay);
  });

  it.each(golden.apply_effect)('effects on $inputs', ({ inputs, expected }) => {
    close(conversions.timesOdds(inputs.p, inputs.v), expected.odds_ratio);
    close(conversions.timesRisk(inputs.p, inputs.v), expected.risk_ratio);
    close(conversions.timesHazard(inputs.p, inputs.v), expected.hazard_ratio);
  });

  it.each(golden.or_to_rr)('odds ratio to relative risk of $inputs', ({ inputs, expected }) => {
    close(conversions.timesOdds(inputs.p0, inputs.or) / inputs.p0, expected.rr);
  });

  it.each(golden.logit)('logit, complementary log-log and probit at $inputs.x', (entry) => {
    const { x } = entry.inputs;
    close(conversions.chanceOfLogOdds(x), entry.expected.expit);
    close(conversions.chance(Math.exp(x), 1), entry.expected.cloglog_inverse);
    close(conversions.standardNormal(x), entry.expected.probit_inverse);
  });

  it('keeps the digits of small chances, to 1e-12 relative', () => {
    for (const { inputs, expected } of golden.rate_to_prob) {
      const got = conversions.chance(inputs.rate, inputs.t);
      expect(Math.abs(got - expected.p)).toBeLessThanOrEqual(1e-12 * expected.p);
    }
    const [deep] = golden.logit;
    const tail = conversions.standardNormal(deep?.inputs.x ?? 0);
    expect(tail / (deep?.expected.probit_inverse ?? 0)).toBeCloseTo(1, 12);
  });
});

describe('laws', () => {
  const chanceValue = fc.double({ min: 1e-9, max: 0.999, noNaN: true });
  const years = fc.double({ min: 0.01, max: 50, noNaN: true });
  const ratio = fc.double({ min: 0.01, max: 20, noNaN: true });
  const near = (got: number, want: number) =>
    expect(Math.abs(got - want)).toBeLessThanOrEqual(1e-11 * Math.abs(want));

  it('hazard undoes chance, and rescale goes by way of the rate', () => {
    fc.assert(
      fc.property(chanceValue, years, years, (p, from, to) => {
        const rate = conversions.hazard(p, from);
        near(conversions.chance(rate, from), p);
        near(conversions.rescale(p, from, to), conversions.chance(rate, to));
      }),
    );
  });

  it('chance_of undoes odds, chance_of_log_odds undoes log_odds', () => {
    fc.assert(
      fc.property(chanceValue, (p) => {
        near(conversions.chanceOf(conversions.odds(p)), p);
        near(conversions.chanceOfLogOdds(conversions.logOdds(p)), p);
      }),
    );
  });

  it('effects act on odds and on hazards as they say', () => {
    fc.assert(
      fc.property(chanceValue, ratio, years, (p, effect, time) => {
        const raised = conversions.timesOdds(p, effect);
        const odds = conversions.odds(p) * effect;
        near(raised, conversions.chanceOf(odds));
        const rate = conversions.hazard(p, time);
        near(conversions.timesHazard(p, effect), conversions.chance(rate * effect, time));
      }),
    );
  });
});

describe('edges', () => {
  it('are limits, not NaN', () => {
    expect(conversions.chance(0, 5)).toBe(0);
    expect(conversions.hazard(0, 1)).toBe(0);
    expect(conversions.hazard(1, 1)).toBe(Number.POSITIVE_INFINITY);
    expect(conversions.rescale(1, 5, 1)).toBe(1);
    expect(conversions.odds(1)).toBe(Number.POSITIVE_INFINITY);
    expect(conversions.chanceOf(Number.POSITIVE_INFINITY)).toBe(1);
    expect(conversions.timesOdds(1, 3)).toBe(1);
    expect(conversions.timesHazard(1, 0.5)).toBe(1);
    expect(conversions.chanceOfLogOdds(-800)).toBe(0);
    expect(conversions.competing(0, 0, 1)).toBe(0);
    expect(conversions.eventBy(0.8, 0.6)).toBeCloseTo(0.25, 15);
    expect(conversions.eventBy(0, 0)).toBe(1);
  });
});
