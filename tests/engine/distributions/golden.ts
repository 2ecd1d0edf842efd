/** The reference distributions of tests/golden/distributions.json as the document writes them. */
import type { OwnDistribution } from '../../../shared/engine/distributions/distribution.ts';
import golden from '../../golden/distributions.json' with { type: 'json' };

export interface GoldenCase {
  id: string;
  family: string;
  distribution: OwnDistribution;
  mean: number;
  variance: number;
  quantiles: { p: number[]; x: number[] };
  points: { x: number[]; cdf: number[]; sf: number[]; pdf: number[]; logpdf: number[] };
}

type Params = Record<string, number>;
type Raw = (typeof golden.cases)[number];

/** From R's parametrisation to the document's; Stacy's is a generalised gamma (Prentice 1974). */
const TRANSLATE: Record<string, (p: Params) => object> = {
  beta: (p) => ({ type: 'beta', ...p }),
  gamma: (p) => ({ type: 'gamma', shape: p.shape, scale: 1 / (p.rate ?? 1) }),
  exponential: (p) => ({ type: 'exponential', ...p }),
  lognormal: (p) => ({ type: 'lognormal', ...p }),
  normal: (p) => ({ type: 'normal', ...p }),
  uniform: (p) => ({ type: 'uniform', low: p.min, high: p.max }),
  triangular: (p) => ({ type: 'triangular', low: p.min, mode: p.mode, high: p.max }),
  pert: (p) => ({ type: 'pert', low: p.min, mode: p.mode, high: p.max, weight: p.lambda }),
  weibull: (p) => ({ type: 'weibull', ...p }),
  loglogistic: (p) => ({ type: 'loglogistic', ...p }),
  gompertz: (p) => ({ type: 'gompertz', ...p }),
  gengamma: (p) => ({ type: 'generalisedGamma', mu: p.mu, sigma: p.sigma, q: p.Q }),
  stacy: ({ a = 1, d = 1, p = 1 }) => ({
    type: 'generalisedGamma',
    mu: Math.log(a) + Math.log(d / p) / p,
    sigma: Math.sqrt(p / d) / p,
    q: Math.sqrt(p / d),
  }),
};

/** Infinity, -Infinity and NaN are strings in the file. */
const numbers = (values: readonly (number | string)[]) => values.map(Number);

function read(raw: Raw): GoldenCase {
  const { points, quantiles } = raw;
  return {
    id: raw.id,
    family: raw.family,
    distribution: TRANSLATE[raw.family]?.(raw.params as unknown as Params) as OwnDistribution,
    mean: Number(raw.mean),
    variance: Number(raw.variance),
    quantiles: { p: quantiles.p, x: numbers(quantiles.x) },
    points: {
      x: numbers(points.x),
      cdf: numbers(points.cdf),
      sf: numbers(points.sf),
      pdf: numbers(points.pdf),
      logpdf: numbers(points.logpdf),
    },
  };
}

export const goldenCases: readonly GoldenCase[] = golden.cases.map(read);
export const goldenDirichlets = golden.dirichlet;
export const goldenNormals = golden.multivariate_normal;
