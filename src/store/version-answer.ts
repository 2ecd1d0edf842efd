/** What a version that is not in hand gives: to set two versions' answers side by side. */
import type { Draws } from '../../shared/analysis/psa/draws.ts';
import type { Issue } from '../../shared/model/issue.ts';
import { type Answerer, appAnswerer } from '../workers/answerer.ts';
import { type Comparison, compare } from './answer.ts';
import { type AppDatabase, database, type VersionRow } from './database.ts';
import { keptResults } from './results-cache.ts';

export interface VersionAnswer {
  /** Null where the version is broken: `issues` say why. */
  readonly comparison: Comparison | null;
  /** Null where they were never made on this device, or are kept no longer. */
  readonly draws: Draws | null;
  readonly issues: readonly Issue[];
}

export async function answerOfVersion(
  { document, documentDigest }: Pick<VersionRow, 'document' | 'documentDigest'>,
  answerer: Pick<Answerer, 'answer'> = appAnswerer(),
  db: AppDatabase = database(),
): Promise<VersionAnswer> {
  const kept = await keptResults(documentDigest, document.analysis, db);
  if (kept) {
    const { base, draws, problems } = kept;
    return { comparison: compare(document, base), draws, issues: problems };
  }
  const { issues, base } = await answerer.answer(document);
  return { comparison: base && compare(document, base), draws: null, issues };
}
