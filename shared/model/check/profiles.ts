import type { Profile } from '../document.ts';
import { error, type Issue } from '../issue.ts';
import type { Lookups } from './lookups.ts';

/** How far from 1 the sum of shares may be: rounding of a few hundred additions. */
const SUM_TOLERANCE = 1e-9;

/** Shares sum to 1; every profile has a value for each covariate and for no other. */
export function checkProfiles({ document }: Lookups): Issue[] {
  const covariates = new Set(document.covariates.map(({ id }) => id));
  const issues = document.profiles.flatMap((profile, index) =>
    checkCovariates(profile, index, covariates),
  );
  const sum = document.profiles.reduce((total, { share }) => total + share, 0);
  if (Math.abs(sum - 1) > SUM_TOLERANCE) {
    issues.push(error('profiles.sharesDoNotSum', ['profiles'], { sum }));
  }
  return issues;
}

function checkCovariates(
  { covariates: values }: Profile,
  index: number,
  covariates: ReadonlySet<string>,
): Issue[] {
  const path = ['profiles', index, 'covariates'];
  const missing = [...covariates].filter((id) => !Object.hasOwn(values, id));
  const unknown = Object.keys(values).filter((id) => !covariates.has(id));
  return [
    ...missing.map((id) => error('profiles.missingCovariate', path, { covariate: id })),
    ...unknown.map((id) => error('profiles.unknownCovariate', [...path, id], { covariate: id })),
  ];
}
