import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eventBy } from '../../shared/formula/conversions.ts';
import { MEANING } from '../../shared/formula/meaning.ts';
import * as survival from '../../shared/formula/survival.ts';
import distributions from '../golden/distributions.json' with { type: 'json' };
import reference from '../golden/survival.json' with { type: 'json' };

type Curve = (time: number) => number;
type Params = Record<string, number>;

/** The curve of a fit, by the reference's name of the distribution. */
function curveOf(distribution: string, p: Params): Curve {
  const name = `alive_${distribution === 'gengamma' ? 'generalised_gamma' : distribution}`;
  const meaning = MEANING.get(name);
  const order: Record<string, string[]> = {
    exponential: ['rate'],
    weibull: ['shape', 'scale'],
    lognormal: ['meanlog', 'sdlog'],
    loglogistic: ['shape', 'scale'],
    gompertz: ['shape', 'rate'],
    gengamma: ['mu', 'sigma', 'Q'],
  };
  const values = (order[distribution] ?? []).map((key) => p[key] ?? Number.NaN);
  if (!meaning || values.length === 0) throw new Error(distribution);
  return (time) => meaning(time, ...values);
}

const close = (got: number, want: number, tolerance: number) =>
  expect(Math.abs(got - want)).toBeLessThanOrEqual(tolerance * Math.abs(want));

const fits = reference.cases.flatMap((entry) =>
  entry.fits.map((fit) => ({ data: entry.data, ...fit })),
);

// tests/golden/survival.json: survreg of R's survival 3.5-3; closed forms at 1e-12.
describe.each(fits)('$distribution fitted to $data', (fit) => {
  const curve = curveOf(fit.distribution, fit.params as unknown as Params);

  it('gives the survival that R gives', () => {
    fit.t.forEach((time, index) => {
      close(curve(time), fit.S[index] ?? Number.NaN, 1e-12);
    });
  });

  it('gives the probability within the next cycle', () => {
    const { u, t, p } = fit.per_cycle;
    t.forEach((time, index) => {
      close(eventBy(curve(time), curve(time + u)), p[index] ?? Number.NaN, 1e-11);
    });
  });
});

describe('Gompertz by its own maximum likelihood', () => {
  it.each(reference.cases.filter((entry) => entry.gompertz))('$data', ({ gompertz }) => {
    const curve = curveOf('gompertz', gompertz.params);
    gompertz.t.forEach((time, index) => {
      close(curve(time), gompertz.S[index] ?? Number.NaN, 1e-12);
    });
  });
});

// tests/golden/distributions.json: R's p* functions and closed forms; sf at 1e-11 relative.
describe('upper tails of the distributions', () => {
  const families = ['exponential', 'weibull', 'lognormal', 'loglogistic', 'gompertz', 'gengamma'];
  const sets = distributions.cases.filter((entry) => families.includes(entry.family));

  it('has sets of every family', () => {
    expect(new Set(sets.map((entry) => entry.family))).toEqual(new Set(families));
  });

  it.each(sets)('$id', ({ family, params, points }) => {
    const curve = curveOf(family, params as unknown as Params);
    points.x.forEach((x, index) => {
      close(curve(Number(x)), Number(points.sf[index]), 1e-11);
    });
  });
});

describe('laws', () => {
  const time = fc.double({ min: 0, max: 100, noNaN: true });
  const positive = fc.double({ min: 0.05, max: 20, noNaN: true });

  it('is 1 at and before the start, and never rises', () => {
    const q = fc.double({ min: -3, max: 3, noNaN: true });
    fc.assert(
      fc.property(time, time, positive, positive, q, (t, more, a, b, anyQ) => {
        const curves: Curve[] = [
          (at) => survival.aliveExponential(at, a),
          (at) => survival.aliveWeibull(at, a, b),
          (at) => survival.aliveGompertz(at, anyQ, a),
          (at) => survival.aliveLognormal(at, a, b),
          (at) => survival.aliveLoglogistic(at, a, b),
          (at) => survival.aliveGeneralisedGamma(at, a, b, anyQ),
        ];
        for (const curve of curves) {
          expect(curve(0)).toBe(1);
          expect(curve(-t)).toBe(1);
          expect(curve(t + more)).toBeLessThanOrEqual(curve(t) * (1 + 1e-12));
        }
      }),
    );
  });

  // Prentice 1974: q = 1 is Weibull, q near 0 the log-normal, q = sigma the gamma.
  it('meets its special cases in the generalised gamma', () => {
    fc.assert(
      fc.property(time, fc.double({ min: -2, max: 2, noNaN: true }), positive, (t, mu, sigma) => {
        const general = survival.aliveGeneralisedGamma(t, mu, sigma, 1);
        const weibull = survival.aliveWeibull(t, 1 / sigma, Math.exp(mu));
        expect(Math.abs(general - weibull)).toBeLessThanOrEqual(1e-11 * weibull + 1e-300);
        const flat = survival.aliveGeneralisedGamma(t, mu, sigma, 1e-12);
        const lognormal = survival.aliveLognormal(t, mu, sigma);
        expect(Math.abs(flat - lognormal)).toBeLessThanOrEqual(1e-11);
      }),
    );
  });

  it('meets the exponential in the Gompertz of shape 0', () => {
    expect(survival.aliveGompertz(7, 0, 0.1)).toBe(survival.aliveExponential(7, 0.1));
    close(survival.aliveGompertz(7, 1e-12, 0.1), survival.aliveExponential(7, 0.1), 1e-11);
  });
});
