import type { Issue } from '../issue.ts';
import type { Lookups } from './lookups.ts';
import { checkStrategyFormula } from './references-of.ts';

/** A variable by strategy names known strategies and covers them all. */
export function checkVariables(lookups: Lookups): Issue[] {
  return lookups.document.variables.flatMap(({ formula }, index) =>
    checkStrategyFormula(lookups, formula, ['variables', index, 'formula']),
  );
}
