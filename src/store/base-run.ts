/** The base case of a document in full: breakdowns, profiles and the cohort trace. */
import { useQuery } from '@tanstack/react-query';
import type { BaseRun } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { appPool, jobFor } from '../workers/app-pool.ts';

/** Null until it is there, and where the model is broken: what is broken is said elsewhere. */
export function useBaseRun(document: ModelDocument): BaseRun | null {
  const { data } = useQuery({
    queryKey: ['base-run', jobFor(document).key],
    queryFn: () => run(document),
    structuralSharing: false,
  });
  return data ?? null;
}

async function run(document: ModelDocument): Promise<BaseRun | null> {
  try {
    return await appPool().base(jobFor(document));
  } catch (problem) {
    if (problem instanceof DocumentError) return null;
    throw problem;
  }
}
