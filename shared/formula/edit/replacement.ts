/**
 *   replacementOf(document, named): FormulaChange | null
 *
 * Puts the value of a thing in its place in formulas: a parameter's number, a variable's
 * own formula, a covariate's value where all profiles have the same. Null where there is
 * no one value, or where a formula would grow past what the format holds.
 */
import type { ModelDocument, StrategyFormula } from '../../model/document.ts';
import {
  combined,
  type FormulaChange,
  formulaPlaces,
  mapTexts,
} from '../../model/edit/formula-sites.ts';
import { LIMITS } from '../limits.ts';
import type { Named } from './symbols.ts';
import { mentions, namesOf } from './uses.ts';
import { substitute } from './words-in.ts';

export function replacementOf(document: ModelDocument, named: Named): FormulaChange | null {
  const value = textOf(document, named);
  if (value === null) return null;
  const names = namesOf(document, named);
  const everyone = document.strategies.map(({ id }) => id);
  const change: FormulaChange = (formula, strategies = everyone) => {
    if (!mentions(formula, names)) return formula;
    const inText = (text: string, own: string) => substitute(text, replacements(names, own));
    if (typeof value === 'string') return mapTexts(formula, (text) => inText(text, value));
    return combined([formula, value], strategies, ([text = '', own = '']) => inText(text, own));
  };
  return isTooLong(document, change) ? null : change;
}

/** `age` is the start age and the time since. */
function replacements(names: ReadonlySet<string>, value: string): Map<string, string> {
  const inBrackets = /^(\d+(\.\d+)?|[A-Za-z]\w*)$/.test(value) ? value : `(${value})`;
  const text = (name: string) => (name === 'age' ? `(${inBrackets} + time)` : inBrackets);
  return new Map([...names].map((name) => [name, text(name)]));
}

function textOf(document: ModelDocument, { what, id }: Named): StrategyFormula | null {
  switch (what) {
    case 'parameter': {
      const parameter = document.parameters.find((each) => each.id === id);
      return parameter ? String(parameter.value) : null;
    }
    case 'variable':
      return document.variables.find((each) => each.id === id)?.formula ?? null;
    case 'covariate': {
      const values = new Set(document.profiles.map(({ covariates }) => covariates[id]));
      const [value] = values;
      return values.size === 1 && value !== undefined ? String(value) : null;
    }
    case 'table':
      return null;
  }
}

function isTooLong(document: ModelDocument, change: FormulaChange): boolean {
  let longest = 0;
  for (const { formula, strategies } of formulaPlaces(document)) {
    mapTexts(change(formula, strategies), (text) => {
      longest = Math.max(longest, text.length);
      return text;
    });
  }
  return longest > LIMITS.length;
}
