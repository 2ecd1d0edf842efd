/** The probabilistic run of a document, with progress and a way to stop. */
import { type Draws, joinBlocks } from '../../shared/analysis/psa/draws.ts';
import { mergeProblems } from '../../shared/engine/problems.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError, type Issue } from '../../shared/model/issue.ts';
import { appPool, jobFor } from '../workers/app-pool.ts';

export type DrawsState =
  | { readonly status: 'none' }
  | { readonly status: 'running'; readonly done: number; readonly total: number }
  | { readonly status: 'done'; readonly draws: Draws; readonly problems: readonly Issue[] }
  | { readonly status: 'stopped'; readonly done: number; readonly total: number }
  | { readonly status: 'failed'; readonly issues: readonly Issue[] };

export interface DrawsRun {
  readonly state: DrawsState;
  readonly run: () => void;
  readonly stop: () => void;
}

/** Draws what the document's analysis asks for; an abort ends as `failed`, with no issues. */
export async function drawDocument(
  document: ModelDocument,
  signal: AbortSignal,
  tell: (state: DrawsState) => void,
): Promise<DrawsState> {
  const { samples, seed, plan } = document.analysis;
  if (samples === 0) return { status: 'none' };
  tell({ status: 'running', done: 0, total: samples });
  try {
    const onProgress = (done: number, total: number) => tell({ status: 'running', done, total });
    const settings = { samples, seed, plan };
    const blocks = await appPool().draws(jobFor(document), settings, { signal, onProgress });
    const ids = document.strategies.map(({ id }) => id);
    const draws = joinBlocks(ids, blocks, document.question.outcome.direction);
    const problems = mergeProblems(blocks.map((block) => block.problems));
    return { status: 'done', draws, problems };
  } catch (problem) {
    return { status: 'failed', issues: problem instanceof DocumentError ? problem.issues : [] };
  }
}
