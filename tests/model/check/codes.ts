import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Issue } from '../../../shared/model/issue.ts';
import { checkReferences } from '../../../shared/model/references.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

/** What is said about the tiny document after a change: `code path`, one line an issue. */
export function said(change: (document: ModelDocument) => void): string[] {
  const document = tinyDocument();
  change(document);
  return checkReferences(document).map(line);
}

/** The whole issues of the tiny document after a change. */
export function issuesOf(change: (document: ModelDocument) => void): Issue[] {
  const document = tinyDocument();
  change(document);
  return checkReferences(document);
}

function line({ code, path }: Issue): string {
  return `${code} ${path.join('.')}`;
}
