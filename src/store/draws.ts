/**
 * The probabilistic run of the appraisal in view: with progress, a way to stop, and its
 * draws kept, so that moving the poise asks nothing of the engine.
 */
import { useCallback, useEffect, useRef, useState } from 'react';
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

const kept = new WeakMap<ModelDocument, Extract<DrawsState, { status: 'done' }>>();

/** @param document what to draw from, or null to wait: a broken model is not run. */
export function useDraws(document: ModelDocument | null): DrawsRun {
  const [state, setState] = useState<DrawsState>({ status: 'none' });
  const controller = useRef<AbortController | null>(null);
  const run = useCallback(() => {
    controller.current?.abort();
    if (!document) return setState({ status: 'none' });
    const known = kept.get(document);
    if (known) return setState(known);
    const mine = new AbortController();
    controller.current = mine;
    const tell = (next: DrawsState) => {
      if (controller.current === mine && !mine.signal.aborted) setState(next);
    };
    void drawDocument(document, mine.signal, tell).then(tell);
  }, [document]);
  const stop = useCallback(() => {
    controller.current?.abort();
    setState((now) => (now.status === 'running' ? { ...now, status: 'stopped' } : now));
  }, []);
  useEffect(() => {
    run();
    return () => controller.current?.abort();
  }, [run]);
  return { state, run, stop };
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
    const done = { status: 'done', draws, problems } as const;
    kept.set(document, done);
    return done;
  } catch (problem) {
    return { status: 'failed', issues: problem instanceof DocumentError ? problem.issues : [] };
  }
}
