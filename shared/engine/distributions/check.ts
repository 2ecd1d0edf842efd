/** Whether a parameter's distribution has a meaning, and one that suits its kind and value. */
import type { Group, Parameter } from '../../model/document.ts';
import { error, hasErrors, type Issue, type Path, warning } from '../../model/issue.ts';
import { distributionOf, type OwnDistribution } from './distribution.ts';
import { isUnusual, kindLimits } from './kind-limits.ts';
import { marginalOf } from './marginal.ts';
import type { Univariate } from './univariate.ts';

/** Most that may lie outside the kind's limits unsaid: rounding, not meaning. */
const NEGLIGIBLE = 1e-12;

/** Numbers that the family needs to be above 0. */
const POSITIVE: Partial<Record<OwnDistribution['type'], readonly string[]>> = {
  normal: ['sd'],
  lognormal: ['sdlog'],
  beta: ['alpha', 'beta'],
  gamma: ['shape', 'scale'],
  pert: ['weight'],
  weibull: ['shape', 'scale'],
  exponential: ['rate'],
  loglogistic: ['shape', 'scale'],
  gompertz: ['rate'],
  generalisedGamma: ['sigma'],
};

/**
 * Issues of one parameter, each naming it by `params.parameter` (its symbol); `path` is the
 * parameter's place. Errors: `distribution.notFinite`, `distribution.notPositive`,
 * `distribution.limits` (low, mode and high do not rise), `distribution.empty`,
 * `distribution.infinite` (some draws are infinite), `distribution.valueOutside` (the base
 * value cannot be drawn). Warnings: `distribution.outsideKind`, `distribution.unusualForKind`,
 * `distribution.valueFar` (the base value is outside the 95% interval). Members of groups are
 * checked by `checkGroups`.
 */
export function checkDistribution(parameter: Parameter, path: Path): Issue[] {
  const { distribution, symbol, kind } = parameter;
  if (distribution.type === 'inGroup') return [];
  const place = [...path, 'distribution'];
  const issues = checkNumbers(distribution, symbol, place);
  if (hasErrors(issues)) return issues;
  const law = distributionOf(distribution, parameter.value);
  if (isUnusual(distribution.type, kind)) {
    const params = { parameter: symbol, distribution: distribution.type, kind };
    issues.push(warning('distribution.unusualForKind', place, params));
  }
  return [...issues, ...checkLaw(parameter, law, path)];
}

/** The same for a member of a group, by its marginal there; the group must be sound. */
export function checkMember(parameter: Parameter, groups: readonly Group[], path: Path): Issue[] {
  return checkLaw(parameter, marginalOf(parameter, groups), path);
}

function checkNumbers(distribution: OwnDistribution, parameter: string, path: Path): Issue[] {
  const entries = Object.entries(distribution);
  const numbers = entries.filter(([, value]) => typeof value === 'number') as [string, number][];
  const positive = POSITIVE[distribution.type] ?? [];
  const issues: Issue[] = [];
  for (const [name, value] of numbers) {
    const params = { parameter, name, value };
    if (!Number.isFinite(value)) issues.push(error('distribution.notFinite', path, params));
    else if (positive.includes(name) && value <= 0) {
      issues.push(error('distribution.notPositive', path, params));
    }
  }
  return [...issues, ...checkLimits(distribution, parameter, path)];
}

function checkLimits(distribution: OwnDistribution, parameter: string, path: Path): Issue[] {
  if (distribution.type === 'empirical') {
    const { values } = distribution;
    if (values.length === 0) return [error('distribution.empty', path, { parameter })];
    const bad = values.find((value) => !Number.isFinite(value));
    const params = { parameter, name: 'values', value: bad ?? 0 };
    return bad === undefined ? [] : [error('distribution.notFinite', path, params)];
  }
  if (!('low' in distribution && 'high' in distribution)) return [];
  const { low, high } = distribution as { low: number; high: number };
  const mode = 'mode' in distribution ? (distribution.mode as number) : low;
  if (low < high && low <= mode && mode <= high) return [];
  const params = { parameter, low, high, ...('mode' in distribution ? { mode } : {}) };
  return [error('distribution.limits', path, params)];
}

function checkLaw(parameter: Parameter, law: Univariate, path: Path): Issue[] {
  return [
    ...checkDraws(parameter, law, path),
    ...checkKind(parameter, law, path),
    ...checkValue(parameter, law, path),
  ];
}

/** The largest and smallest draw that can come must be numbers. */
function checkDraws({ symbol }: Parameter, law: Univariate, path: Path): Issue[] {
  const ends = [law.quantile(2 ** -53), law.quantile(1 - 2 ** -53)];
  if (ends.every(Number.isFinite)) return [];
  return [error('distribution.infinite', [...path, 'distribution'], { parameter: symbol })];
}

function checkKind({ symbol, kind, value }: Parameter, law: Univariate, path: Path): Issue[] {
  const [low, high] = kindLimits(kind, value);
  const [least, most] = law.support;
  const below = least < low ? law.cdf(low) - (law.discrete ? law.pdf(low) : 0) : 0;
  const above = most > high ? law.sf(high) : 0;
  if (below + above <= NEGLIGIBLE) return [];
  const params = { parameter: symbol, kind, share: below + above, low, high };
  return [warning('distribution.outsideKind', [...path, 'distribution'], params)];
}

function checkValue({ symbol, value }: Parameter, law: Univariate, path: Path): Issue[] {
  const place = [...path, 'value'];
  const [least, most] = law.support;
  if (!(value >= least && value <= most)) {
    const params = { parameter: symbol, value, low: least, high: most };
    return [error('distribution.valueOutside', place, params)];
  }
  const [low, high] = [law.quantile(0.025), law.quantile(0.975)];
  if (value >= low && value <= high) return [];
  return [warning('distribution.valueFar', place, { parameter: symbol, value, low, high })];
}
