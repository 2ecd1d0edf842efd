/** Evidence and definitions that no formula names. */
import type { ModelDocument } from '../model/document.ts';
import { type Issue, type Path, warning } from '../model/issue.ts';

/**
 * Members of Dirichlet groups of which some member is used: the others are the row's
 * remainder, which no formula need name.
 */
function spared(document: ModelDocument, used: ReadonlySet<string>): Set<string> {
  const symbols = new Map(document.parameters.map(({ id, symbol }) => [id, symbol]));
  const groups = document.groups.filter(({ type }) => type === 'dirichlet');
  const members = groups.map((group) => group.members.flatMap((id) => symbols.get(id) ?? []));
  return new Set(members.filter((list) => list.some((symbol) => used.has(symbol))).flat());
}

/**
 * `formula.unused` (warning; params what, symbol) at each parameter, variable and table
 * whose symbol is not in `used`.
 */
export function checkUnused(document: ModelDocument, used: ReadonlySet<string>): Issue[] {
  const spare = spared(document, used);
  const unused = (what: string, list: readonly { symbol: string }[], path: Path): Issue[] =>
    list.flatMap(({ symbol }, index) => {
      if (used.has(symbol) || spare.has(symbol)) return [];
      return [warning('formula.unused', [...path, index, 'symbol'], { what, symbol })];
    });
  return [
    ...unused('parameter', document.parameters, ['parameters']),
    ...unused('variable', document.variables, ['variables']),
    ...unused('table', document.tables, ['tables']),
  ];
}
