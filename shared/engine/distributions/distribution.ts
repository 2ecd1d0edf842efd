/** From a distribution of the document to its functions: one line a family. */
import type { Distribution } from '../../model/document.ts';
import { beta } from './beta.ts';
import { empirical } from './empirical.ts';
import { exponential } from './exponential.ts';
import { fixed } from './fixed.ts';
import { gamma } from './gamma.ts';
import { generalisedGamma } from './generalised-gamma.ts';
import { gompertz } from './gompertz.ts';
import { loglogistic } from './loglogistic.ts';
import { lognormal } from './lognormal.ts';
import { normal } from './normal.ts';
import { pert } from './pert.ts';
import { triangular } from './triangular.ts';
import { uniform } from './uniform.ts';
import type { Univariate } from './univariate.ts';
import { weibull } from './weibull.ts';

/** A distribution that stands by itself; see `marginalOf` for members of a group. */
export type OwnDistribution = Exclude<Distribution, { type: 'inGroup' }>;

type Family<T extends OwnDistribution['type']> = (
  of: Extract<OwnDistribution, { type: T }>,
  value: number,
) => Univariate;

const FAMILIES: { readonly [T in OwnDistribution['type']]: Family<T> } = {
  fixed: (_, value) => fixed(value),
  normal,
  lognormal,
  beta,
  gamma,
  uniform,
  triangular,
  pert,
  weibull,
  exponential,
  loglogistic,
  gompertz,
  generalisedGamma,
  empirical,
};

/**
 * The functions of `distribution`, whose numbers must have passed `checkDistribution`.
 * `value` is the parameter's base value, which a `fixed` one takes.
 */
export function distributionOf(distribution: OwnDistribution, value: number): Univariate {
  const family = FAMILIES[distribution.type] as Family<OwnDistribution['type']>;
  return family(distribution as never, value);
}
