/**
 *   renameSymbol(document, named, symbol): Edit[]
 *
 * A parameter, variable, table or covariate gets another symbol, in its definition and
 * in every formula that uses it, scenarios included.
 */
import type { ModelDocument } from '../../model/document.ts';
import type { Edit } from '../../model/edit/edit.ts';
import { formulaEdits, mapTexts } from '../../model/edit/formula-sites.ts';
import { listOf } from '../../model/edit/target.ts';
import { DocumentError } from '../../model/issue.ts';
import { type Named, ownerOf, symbolIssue, symbolOf } from './symbols.ts';
import { substitute } from './words-in.ts';

/**
 * No edits where it is called so already, or where there is no such thing.
 * @throws DocumentError with what `symbolIssue` says against the symbol
 */
export function renameSymbol(document: ModelDocument, named: Named, symbol: string): Edit[] {
  const old = symbolOf(document, named);
  if (old === undefined || old === symbol) return [];
  const issue = symbolIssue(document, symbol, named);
  if (issue) throw new DocumentError([issue]);
  const own: Edit = {
    type: 'set',
    at: [...listOf(named.what), { id: named.id }, 'symbol'],
    value: symbol,
  };
  // In a broken document another thing may have the symbol first: formulas mean that one.
  const owner = ownerOf(document, old);
  if (owner?.id !== named.id || owner.what !== named.what) return [own];
  const replacements = new Map([[old, symbol]]);
  return [
    own,
    ...formulaEdits(document, (formula) =>
      mapTexts(formula, (text) => substitute(text, replacements)),
    ),
  ];
}
