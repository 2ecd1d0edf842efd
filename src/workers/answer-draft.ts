/** What can be said of a draft: its faults, or its base case. */
import { checkModel } from '../../shared/engine/check.ts';
import { prepare } from '../../shared/engine/engine.ts';
import type { BaseRun } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError, hasErrors, type Issue } from '../../shared/model/issue.ts';
import { checkDocument } from '../../shared/model/read.ts';

export interface DraftAnswer {
  /** Defaults filled in; null where the draft's shape or references are unsound. */
  readonly document: ModelDocument | null;
  /** All that was found, errors and warnings. */
  readonly issues: readonly Issue[];
  /** Null exactly where an issue is an error. */
  readonly base: BaseRun | null;
}

/** @param draft as edits left it, broken or not. */
export function answerDraft(draft: ModelDocument): DraftAnswer {
  const { document, issues: unsound } = checkDocument(draft);
  if (!document) return { document, issues: unsound, base: null };
  const found = checkModel(document);
  if (hasErrors(found)) return { document, issues: found, base: null };
  try {
    const base = prepare(document).base();
    const issues = [...found, ...base.problems];
    return { document, issues, base: hasErrors(issues) ? null : base };
  } catch (problem) {
    if (!(problem instanceof DocumentError)) throw problem;
    return { document, issues: [...found, ...problem.issues], base: null };
  }
}
