/** A document as a JSON file: out of the device, and in again. */
import { canonical } from '../../shared/model/canonical.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Issue } from '../../shared/model/issue.ts';
import { createAppraisal } from './appraisals.ts';
import { type AppDatabase, type AppraisalRow, database } from './database.ts';
import { completed } from './versions.ts';

/** Keys in canonical order, two spaces: equal documents are equal texts. */
export async function exportText(document: ModelDocument): Promise<string> {
  const ordered: unknown = JSON.parse(canonical(await completed(document)));
  return `${JSON.stringify(ordered, null, 2)}\n`;
}

/** A file name that every system takes. */
export function exportName(document: ModelDocument): string {
  // A draft may be broken anywhere.
  const title: unknown = document.question?.title;
  const plain = String(title ?? '')
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase();
  const words = plain.replace(/[^a-z0-9]+/g, '-').replace(/^-+|-+$/g, '');
  return `${words.slice(0, 60).replace(/-+$/, '') || 'appraisal'}.json`;
}

export interface Imported {
  /** Null where the text is refused: `issues` say why. */
  readonly appraisal: AppraisalRow | null;
  /** What is wrong with it, also where it can be opened and mended. */
  readonly issues: readonly Issue[];
}

/**
 * Makes an appraisal of a file's text. A document whose references alone are broken is
 * taken in, to be mended: it may be somebody's work in progress.
 * @throws StoreError
 */
export async function importText(text: string, db: AppDatabase = database()): Promise<Imported> {
  const { readDocument } = await import('../../shared/model/read.ts');
  const read = readDocument(text);
  const document = read.document ?? read.draft;
  if (!document) return { appraisal: null, issues: read.issues };
  const appraisal = await createAppraisal({ document, source: 'file' }, db);
  return { appraisal, issues: read.issues };
}
