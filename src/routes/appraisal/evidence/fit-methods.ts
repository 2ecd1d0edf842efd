/**
 * Distributions from what a publication gives: which ways there are for a family, what
 * each asks for, and the fit (shared/engine/fit).
 */
import { betaFromCounts } from '../../../../shared/engine/fit/beta-counts.ts';
import { betaFromMoments } from '../../../../shared/engine/fit/beta-moments.ts';
import { betaFromQuantiles } from '../../../../shared/engine/fit/beta-quantiles.ts';
import { type Fitted, fitted, refused } from '../../../../shared/engine/fit/fitted.ts';
import { gammaFromMeanAndWidth } from '../../../../shared/engine/fit/gamma-mean-width.ts';
import { gammaFromMoments } from '../../../../shared/engine/fit/gamma-moments.ts';
import { gammaFromQuantiles } from '../../../../shared/engine/fit/gamma-quantiles.ts';
import { lognormalFromMoments } from '../../../../shared/engine/fit/lognormal-moments.ts';
import { lognormalFromQuantiles } from '../../../../shared/engine/fit/lognormal-quantiles.ts';
import { lognormalFromRatio } from '../../../../shared/engine/fit/lognormal-ratio.ts';
import { normalFromInterval } from '../../../../shared/engine/fit/normal-interval.ts';
import type { Distribution } from '../../../../shared/model/document.ts';

export type FitMethod = 'meanSe' | 'interval' | 'pointInterval' | 'counts';
export type FitNumber = 'mean' | 'se' | 'point' | 'lower' | 'upper' | 'events' | 'n';
export type FitNumbers = Readonly<Partial<Record<FitNumber, number>>>;

/** What each way asks for, in the order in which it is written. */
export const ASKED: Readonly<Record<FitMethod, readonly FitNumber[]>> = {
  meanSe: ['mean', 'se'],
  interval: ['lower', 'upper'],
  pointInterval: ['point', 'lower', 'upper'],
  counts: ['events', 'n'],
};

type Fit = (numbers: Required<FitNumbers>) => Fitted<Distribution['type']>;

const FITS: Partial<Record<Distribution['type'], Partial<Record<FitMethod, Fit>>>> = {
  normal: {
    meanSe: ({ mean, se }) =>
      se > 0
        ? fitted<'normal'>({ type: 'normal', mean, sd: se })
        : refused('fit.standardError', { se }),
    interval: normalFromInterval,
  },
  lognormal: {
    pointInterval: lognormalFromRatio,
    interval: lognormalFromQuantiles,
    meanSe: lognormalFromMoments,
  },
  beta: {
    counts: ({ events, n }) => betaFromCounts({ events, n, prior: 'none' }),
    meanSe: betaFromMoments,
    interval: betaFromQuantiles,
  },
  gamma: {
    meanSe: gammaFromMoments,
    pointInterval: ({ point, lower, upper }) =>
      gammaFromMeanAndWidth({ mean: point, lower, upper }),
    interval: gammaFromQuantiles,
  },
};

export function fitMethods(type: Distribution['type']): FitMethod[] {
  return Object.keys(FITS[type] ?? {}) as FitMethod[];
}

/** Null while a number that the way asks for is missing. */
export function fitBy(
  type: Distribution['type'],
  method: FitMethod,
  numbers: FitNumbers,
): Fitted<Distribution['type']> | null {
  const family = FITS[type]?.[method];
  if (!family || ASKED[method].some((name) => numbers[name] === undefined)) return null;
  return family(numbers as Required<FitNumbers>);
}

/** The base value that was stated along with it; undefined where none was. */
export function statedValue(method: FitMethod, numbers: FitNumbers): number | undefined {
  const { mean, point, events, n } = numbers;
  switch (method) {
    case 'meanSe':
      return mean;
    case 'pointInterval':
      return point;
    case 'counts':
      return events !== undefined && n ? events / n : undefined;
    case 'interval':
      return undefined;
  }
}
