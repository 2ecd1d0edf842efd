/**
 * The reference's own functions against numbers made with R 4.2.2 (tests/golden:
 * distributions.json, rates.json; tolerances of its README), so that the second
 * opinion stands by itself.
 */
import { describe, expect, it } from 'vitest';
import golden from '../golden/distributions.json' with { type: 'json' };
import rates from '../golden/rates.json' with { type: 'json' };
import { apply } from './functions.ts';
import { exponentialRow } from './matrix.ts';

type Params = Record<string, number>;

/** How each family's share above x is written as a call. */
const ALIVE: Record<string, (p: Params, x: number) => number> = {
  exponential: (p, x) => apply('alive_exponential', [x, p.rate as number]),
  weibull: (p, x) => apply('alive_weibull', [x, p.shape as number, p.scale as number]),
  gompertz: (p, x) => apply('alive_gompertz', [x, p.shape as number, p.rate as number]),
  lognormal: (p, x) => apply('alive_lognormal', [x, p.meanlog as number, p.sdlog as number]),
  loglogistic: (p, x) => apply('alive_loglogistic', [x, p.shape as number, p.scale as number]),
  gengamma: (p, x) =>
    apply('alive_generalised_gamma', [x, p.mu as number, p.sigma as number, p.Q as number]),
  normal: (p, x) => apply('standard_normal', [((p.mean as number) - x) / (p.sd as number)]),
};

describe('survival functions', () => {
  const cases = golden.cases.filter(({ family }) => family in ALIVE);
  it.each(cases.map((each) => [each.id, each] as const))('%s', (_, { family, params, points }) => {
    points.x.forEach((x, i) => {
      const want = points.sf[i] as number;
      const got = ALIVE[family]?.(params as unknown as Params, x) as number;
      expect(Math.abs(got - want), `at ${x}: ${got}, want ${want}`).toBeLessThanOrEqual(1e-11);
    });
  });
});

describe('conversions', () => {
  const close = (got: number, want: number) =>
    expect(Math.abs(got - want), `${got}, want ${want}`).toBeLessThanOrEqual(1e-12);
  const { conversions } = rates;

  it('rate to chance and back', () => {
    for (const { inputs, expected } of conversions.rate_to_prob) {
      close(apply('chance', [inputs.rate, inputs.t]), expected.p);
    }
    for (const { inputs, expected } of conversions.prob_to_rate) {
      close(apply('hazard', [inputs.p, inputs.t]), expected.rate);
    }
  });

  it('one length of cycle to another', () => {
    for (const { inputs, expected } of conversions.change_cycle) {
      close(apply('rescale', [inputs.p, inputs.from, inputs.to]), expected.p);
    }
  });

  it('competing rates', () => {
    for (const { inputs, expected } of conversions.competing) {
      const total = inputs.rates.reduce((a, b) => a + b, 0);
      inputs.rates.forEach((rate, i) => {
        close(apply('competing', [rate, total, inputs.t]), expected.p[i] as number);
      });
    }
  });

  it('an effect on a chance', () => {
    for (const { inputs, expected } of conversions.apply_effect) {
      close(apply('times_odds', [inputs.p, inputs.v]), expected.odds_ratio);
      close(apply('times_risk', [inputs.p, inputs.v]), expected.risk_ratio);
      close(apply('times_hazard', [inputs.p, inputs.v]), expected.hazard_ratio);
    }
  });

  it('log odds and the normal distribution', () => {
    for (const { inputs, expected } of conversions.logit) {
      close(apply('chance_of_log_odds', [inputs.x]), expected.expit);
      close(apply('standard_normal', [inputs.x]), expected.probit_inverse);
      close(apply('chance_of', [Math.exp(inputs.x)]), expected.expit);
    }
  });
});

describe('matrix exponential', () => {
  it.each(rates.matrix_exponential.map((each) => [each.id, each] as const))('%s', (_, each) => {
    for (const { t, P } of each.at) {
      const scaled = each.generator.map((row) => row.map((x) => x * t));
      P.forEach((row, i) => {
        const got = exponentialRow(scaled, i);
        row.forEach((want, j) => {
          const value = got[j] as number;
          expect(Math.abs(value - want), `${value}, want ${want}`).toBeLessThanOrEqual(1e-12);
        });
      });
    }
  });
});
