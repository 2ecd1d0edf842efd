/** An appraisal as the page opens it: its document, then its base case. */
import { useQuery } from '@tanstack/react-query';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError, hasErrors, type Issue } from '../../shared/model/issue.ts';
import { appPool, jobFor } from '../workers/app-pool.ts';
import { type Comparison, compare } from './answer.ts';
import { exampleText } from './examples.ts';
import { FILE_SLUG, openedFile } from './opened-file.ts';

export type Opened =
  | { readonly found: false }
  | {
      readonly found: true;
      /** Name of the file it came from; null for a worked example. */
      readonly file: string | null;
      /** Null where the text is no sound document: `issues` say why. */
      readonly document: ModelDocument | null;
      readonly issues: readonly Issue[];
    };

export function useAppraisal(slug: string) {
  const number = slug === FILE_SLUG ? (openedFile()?.number ?? 0) : 0;
  return useQuery({
    queryKey: ['appraisal', slug, number],
    queryFn: () => open(slug),
    structuralSharing: false,
  });
}

async function open(slug: string): Promise<Opened> {
  const file = slug === FILE_SLUG ? openedFile() : null;
  const text = slug === FILE_SLUG ? (file?.text ?? null) : await exampleText(slug);
  if (text === null) return { found: false };
  const { readDocument } = await import('../../shared/model/read.ts');
  const { document, issues } = readDocument(text);
  return { found: true, file: file?.name ?? null, document, issues };
}

/** The base case compared, or what is wrong with the model: never both. */
export type BaseAnswer =
  | { readonly comparison: Comparison; readonly issues: readonly Issue[] }
  | { readonly comparison: null; readonly issues: readonly Issue[] };

/** @param document one object a version: it names the run. */
export function useBase(document: ModelDocument | null) {
  return useQuery({
    queryKey: ['base', document && jobFor(document).key],
    queryFn: () => runBase(document as ModelDocument),
    enabled: document !== null,
    structuralSharing: false,
  });
}

async function runBase(document: ModelDocument): Promise<BaseAnswer> {
  try {
    const base = await appPool().base(jobFor(document));
    if (hasErrors(base.problems)) return { comparison: null, issues: base.problems };
    return { comparison: compare(document, base), issues: base.problems };
  } catch (problem) {
    if (problem instanceof DocumentError) return { comparison: null, issues: problem.issues };
    throw problem;
  }
}
