/**
 * A simulator of its own for the draft in hand: its base case does not wait for the draws
 * that the pool makes of the one before.
 */
import type { ModelDocument } from '../../shared/model/document.ts';
import type { DraftAnswer } from './answer-draft.ts';
import type { DraftSimulator } from './simulator.ts';
import { type RemoteOf, type SimulatorWorker, spawnSimulator } from './spawn.ts';

type DraftWorker = SimulatorWorker<Pick<RemoteOf<DraftSimulator>, 'answer' | 'digest'>>;

export interface Answerer {
  answer(draft: ModelDocument): Promise<DraftAnswer>;
  digest(document: ModelDocument): Promise<string>;
}

/** A worker that breaks down is given up; the next call starts another. */
export function createAnswerer(spawn: () => DraftWorker): Answerer {
  let worker: DraftWorker | null = null;
  async function call<T>(work: (remote: DraftWorker['remote']) => Promise<T>): Promise<T> {
    worker ??= spawn();
    const mine = worker;
    try {
      return await Promise.race([work(mine.remote), mine.failed]);
    } catch (problem) {
      mine.stop();
      if (worker === mine) worker = null;
      throw problem;
    }
  }
  return {
    answer: (draft) => call((remote) => remote.answer(draft)),
    digest: (document) => call((remote) => remote.digest(document)),
  };
}

let current: Answerer | null = null;

/** The page's one; its worker starts with the first draft. */
export function appAnswerer(): Answerer {
  current ??= createAnswerer(spawnSimulator);
  return current;
}
