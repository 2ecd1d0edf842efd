/** A parameter's uncertainty in words and numbers, such as "Beta (10; 90)". */
import type { TFunction } from 'i18next';
import type { Distribution, ModelDocument } from '../../shared/model/document.ts';
import type { Language } from '../store/settings.ts';
import { formatValue } from './format.ts';

export function distributionWords(
  distribution: Distribution,
  document: ModelDocument,
  t: TFunction,
  language: Language,
): string {
  const name = t(`distributions.${distribution.type}`);
  if (distribution.type === 'inGroup') {
    const group = document.groups.find(({ id }) => id === distribution.group);
    return t('evidence.inGroup', { group: group?.label ?? distribution.group });
  }
  const numbers = numbersOf(distribution);
  if (numbers.length === 0) return name;
  return `${name} (${numbers.map((value) => formatValue(value, language)).join('; ')})`;
}

/** Its numbers in the order in which the trade writes them. */
function numbersOf(distribution: Exclude<Distribution, { type: 'inGroup' }>): number[] {
  switch (distribution.type) {
    case 'fixed':
      return [];
    case 'normal':
      return [distribution.mean, distribution.sd];
    case 'lognormal':
      return [distribution.meanlog, distribution.sdlog];
    case 'beta':
      return [distribution.alpha, distribution.beta];
    case 'gamma':
    case 'weibull':
    case 'loglogistic':
      return [distribution.shape, distribution.scale];
    case 'uniform':
      return [distribution.low, distribution.high];
    case 'triangular':
    case 'pert':
      return [distribution.low, distribution.mode, distribution.high];
    case 'exponential':
      return [distribution.rate];
    case 'gompertz':
      return [distribution.shape, distribution.rate];
    case 'generalisedGamma':
      return [distribution.mu, distribution.sigma, distribution.q];
    case 'empirical':
      return [distribution.values.length];
  }
}
