/**
 * What is wrong with a document, as data. `shared` never words a message: the
 * interface and the command line look the code up in their own language.
 */

/** Where in a document: keys and indices from the root. */
export type Path = readonly (string | number)[];

/** A stretch of a formula's text: offsets in UTF-16 units, end not included. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

export type IssueParams = Readonly<Record<string, string | number>>;

export interface Issue {
  /** Stable code such as `formula.unknownName`; worded by src/i18n and shared/cli. */
  readonly code: string;
  readonly severity: 'error' | 'warning';
  readonly path: Path;
  /** Values that the wording may name. */
  readonly params: IssueParams;
  /** Place inside the formula at `path`, where there is one. */
  readonly at?: Span;
}

export function error(code: string, path: Path = [], params: IssueParams = {}, at?: Span): Issue {
  return { code, severity: 'error', path, params, ...(at ? { at } : {}) };
}

export function warning(code: string, path: Path = [], params: IssueParams = {}, at?: Span): Issue {
  return { code, severity: 'warning', path, params, ...(at ? { at } : {}) };
}

export function hasErrors(issues: readonly Issue[]): boolean {
  return issues.some((issue) => issue.severity === 'error');
}

/** Thrown where a caller asked for a result that a broken document cannot give. */
export class DocumentError extends Error {
  readonly issues: readonly Issue[];
  constructor(issues: readonly Issue[]) {
    super(issues.map((issue) => issue.code).join(', '));
    this.name = 'DocumentError';
    this.issues = issues;
  }
}
