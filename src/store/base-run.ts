/** The base case of a document in full: breakdowns, profiles and the cohort trace. */
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { BaseRun } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { appPool, jobFor } from '../workers/app-pool.ts';

/** A run and the document that it is of. */
export interface FullRun {
  readonly document: ModelDocument;
  readonly base: BaseRun;
}

/** Every edit makes a new document: runs of those gone by are not kept for long. */
const KEPT = 10_000;

/**
 * Null until it is there, and where the model is broken: what is broken is said
 * elsewhere. While a new document is run, the run of the one before stays.
 */
export function useFullRun(document: ModelDocument): FullRun | null {
  const { data } = useQuery({
    queryKey: ['full-run', jobFor(document).key],
    queryFn: () => run(document),
    placeholderData: keepPreviousData,
    structuralSharing: false,
    gcTime: KEPT,
  });
  return data ?? null;
}

async function run(document: ModelDocument): Promise<FullRun | null> {
  try {
    return { document, base: await appPool().base(jobFor(document)) };
  } catch (problem) {
    if (problem instanceof DocumentError) return null;
    throw problem;
  }
}
