/** Exponential distribution, S(x) = exp(-rate x): the Weibull of shape 1. */

import type { Univariate } from './univariate.ts';
import { weibull } from './weibull.ts';

/** `rate` > 0 per unit of x. */
export function exponential({ rate }: { rate: number }): Univariate {
  return {
    ...weibull({ shape: 1, scale: 1 / rate }),
    mean: 1 / rate,
    variance: 1 / (rate * rate),
  };
}
