/**
 *   usesOf(document, target): Use[]
 *
 * Everywhere that a thing is used: by its symbol in formulas, then by its id.
 */
import type { ModelDocument, Scenario, StrategyFormula } from '../../model/document.ts';
import { formulaPlaces, mapTexts } from '../../model/edit/formula-sites.ts';
import { referencesTo } from '../../model/edit/references-to.ts';
import type { Target } from '../../model/edit/target.ts';
import { type Use, useAt } from '../../model/edit/use.ts';
import { START_AGE } from '../../model/names.ts';
import { isNamed, type Named, ownerOf, symbolOf } from './symbols.ts';
import { wordsIn } from './words-in.ts';

export function usesOf(document: ModelDocument, target: Target): Use[] {
  const formulas = isNamed(target) ? formulaUses(document, target) : [];
  return [...formulas, ...referencesTo(document, target)];
}

/** Formulas that name a thing, those of scenarios last. */
export function formulaUses(document: ModelDocument, named: Named): Use[] {
  const names = namesOf(document, named);
  if (names.size === 0) return [];
  const places = formulaPlaces(document).filter(({ formula }) => mentions(formula, names));
  const scenarios = document.scenarios.filter((scenario) => overridesMention(scenario, names));
  return [
    ...places.map(({ owner, at }) => useAt(document, owner, at)),
    ...scenarios.map(({ id }) => useAt(document, 'scenario', ['scenarios', { id }, 'overrides'])),
  ];
}

/**
 * What formulas may write to mean a thing: its symbol, and `age` for the covariate that
 * ages start from. None where another thing has the symbol first.
 */
export function namesOf(document: ModelDocument, named: Named): ReadonlySet<string> {
  const symbol = symbolOf(document, named);
  if (symbol === undefined) return new Set();
  const owner = ownerOf(document, symbol);
  if (owner?.id !== named.id || owner.what !== named.what) return new Set();
  return new Set(named.what === 'covariate' && symbol === START_AGE ? [symbol, 'age'] : [symbol]);
}

function overridesMention({ overrides }: Scenario, names: ReadonlySet<string>): boolean {
  return overrides.some((each) => each.type === 'variable' && mentions(each.formula, names));
}

/** Whether any text of a formula names one of these. */
export function mentions(formula: StrategyFormula, names: ReadonlySet<string>): boolean {
  let found = false;
  mapTexts(formula, (text) => {
    found ||= wordsIn(text).some(({ name }) => names.has(name));
    return text;
  });
  return found;
}
