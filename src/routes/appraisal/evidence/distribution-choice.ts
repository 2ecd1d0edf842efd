/**
 *   distributionTypes(kind)                    those usual for a kind first
 *   startingAt(type, value, spread, kind)      a distribution of the type, to begin from
 */

import type { OwnDistribution } from '../../../../shared/engine/distributions/distribution.ts';
import { kindLimits } from '../../../../shared/engine/distributions/kind-limits.ts';
import { betaFromMoments } from '../../../../shared/engine/fit/beta-moments.ts';
import { gammaFromMoments } from '../../../../shared/engine/fit/gamma-moments.ts';
import { lognormalFromMoments } from '../../../../shared/engine/fit/lognormal-moments.ts';
import type { Kind } from '../../../../shared/model/kinds.ts';

export type OwnType = OwnDistribution['type'];

const ALL: readonly OwnType[] = [
  'fixed',
  'beta',
  'gamma',
  'lognormal',
  'normal',
  'uniform',
  'triangular',
  'pert',
  'weibull',
  'exponential',
  'loglogistic',
  'gompertz',
  'generalisedGamma',
  'empirical',
];

const SHARES: readonly OwnType[] = ['fixed', 'beta', 'uniform', 'pert', 'triangular'];
const POSITIVE: readonly OwnType[] = ['fixed', 'gamma', 'lognormal', 'pert', 'uniform'];

/** Common practice (Briggs, Claxton and Sculpher 2006): by what values the kind can have. */
const USUAL: Partial<Record<Kind, readonly OwnType[]>> = {
  probability: SHARES,
  utility: SHARES,
  disabilityWeight: SHARES,
  ratio: ['fixed', 'lognormal', 'gamma', 'pert', 'uniform'],
  logOdds: ['fixed', 'normal'],
  number: ['fixed', 'normal'],
};

export function distributionTypes(kind: Kind): OwnType[] {
  const usual = USUAL[kind] ?? POSITIVE;
  return [...usual, ...ALL.filter((type) => !usual.includes(type))];
}

/** Widest relative spread that a family is begun with. */
const START_SPREAD = 0.2;

export function startingAt(
  type: OwnType,
  value: number,
  spread: number,
  kind: Kind,
): OwnDistribution {
  const size = Math.abs(value) || 1;
  const se = spread > 0 && Number.isFinite(spread) ? spread : size * START_SPREAD;
  const [least, most] = kindLimits(kind, value);
  const low = Math.max(least, value - 2 * se);
  const high = Math.min(most, value + 2 * se);
  const range = low < high ? { low, high } : { low: value - se, high: value + se };
  const positive = value > 0 ? value : size;
  switch (type) {
    case 'fixed':
      return { type };
    case 'normal':
      return { type, mean: value, sd: se };
    case 'beta': {
      const fit = betaFromMoments({ mean: value, se: betaSpread(value, se) });
      return fit.ok ? fit.distribution : { type, alpha: 1, beta: 1 };
    }
    case 'gamma': {
      const fit = gammaFromMoments({ mean: value, se });
      return fit.ok ? fit.distribution : { type, shape: 1, scale: positive };
    }
    case 'lognormal': {
      const fit = lognormalFromMoments({ mean: value, se });
      return fit.ok ? fit.distribution : { type, meanlog: 0, sdlog: START_SPREAD };
    }
    case 'uniform':
      return { type, ...range };
    case 'triangular':
      return { type, ...range, mode: value };
    case 'pert':
      return { type, ...range, mode: value, weight: 4 };
    case 'weibull':
    case 'loglogistic':
      return { type, shape: 2, scale: positive };
    case 'exponential':
      return { type, rate: 1 / positive };
    case 'gompertz':
      return { type, shape: 0.1, rate: 0.1 };
    case 'generalisedGamma':
      return { type, mu: Math.log(positive), sigma: 0.5, q: 1 };
    case 'empirical':
      return { type, values: [value] };
  }
}

/** A standard error that a beta of this mean can have. */
function betaSpread(mean: number, se: number): number {
  return Math.min(se, 0.5 * Math.sqrt(Math.max(0, mean * (1 - mean))));
}
