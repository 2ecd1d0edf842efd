import type { ModelDocument } from '../../model/document.ts';
import type { Named } from './symbols.ts';

/** The symbol of a thing, or undefined where there is no such thing. */
export function symbolOf(document: ModelDocument, { what, id }: Named): string | undefined {
  const lists = {
    parameter: document.parameters,
    variable: document.variables,
    table: document.tables,
    covariate: document.covariates,
  };
  return lists[what].find((item) => item.id === id)?.symbol;
}
