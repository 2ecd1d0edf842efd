/** The result of a fit: a distribution as the document writes it, or why there is none. */
import type { Distribution } from '../../model/document.ts';
import { error, type Issue, type IssueParams } from '../../model/issue.ts';

export type Fitted<T extends Distribution['type']> =
  | { readonly ok: true; readonly distribution: Extract<Distribution, { type: T }> }
  | { readonly ok: false; readonly issue: Issue };

export function fitted<T extends Distribution['type']>(
  distribution: Extract<Distribution, { type: T }>,
): Fitted<T> {
  return { ok: true, distribution };
}

/** Codes begin with `fit.`; `params` hold the values that were refused and their limits. */
export function refused(
  code: string,
  params: IssueParams,
): { readonly ok: false; readonly issue: Issue } {
  return { ok: false, issue: error(code, [], params) };
}
