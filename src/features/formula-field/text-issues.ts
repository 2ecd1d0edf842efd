/**
 *   textIssues(text, names): Issue[]
 *
 * What can be said of a formula's text by itself, at once: how it is written, and its
 * names. Kinds, and where it stands, are for the check of the whole document.
 */
import { checkNames } from '../../../shared/formula/names.ts';
import { parseFormula } from '../../../shared/formula/parse.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import type { FormulaNames } from './formula-names.ts';

export function textIssues(text: string, { scope }: FormulaNames): readonly Issue[] {
  const parsed = parseFormula(text);
  return parsed.expr ? checkNames(parsed.expr, scope) : parsed.issues;
}
