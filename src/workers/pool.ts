/**
 * Spreads the fixed blocks of a probabilistic run over workers. A block's numbers depend
 * on the document, the settings and its place alone, and blocks are joined in order: the
 * result is the same whatever the number of workers and whichever finishes first.
 */
import {
  type BaseRun,
  BLOCK_DRAWS,
  type DrawsBlock,
  type SamplingSettings,
} from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import type { Reply } from './simulator.ts';
import type { SimulatorWorker } from './spawn.ts';

/** A document to run; the same key always names the same document. */
export interface Job {
  readonly key: string;
  readonly document: ModelDocument;
}

export interface DrawsOptions {
  readonly signal?: AbortSignal;
  /** Called after each block with the number of draws done. */
  readonly onProgress?: (done: number, total: number) => void;
}

export interface Pool {
  /** @throws DocumentError */
  base(job: Job): Promise<BaseRun>;
  /**
   * The blocks of a run, in order. A newer call stops an older one that is still running.
   * @throws DocumentError; an AbortError (DOMException) when stopped or replaced.
   */
  draws(job: Job, settings: SamplingSettings, options?: DrawsOptions): Promise<DrawsBlock[]>;
}

interface Seat {
  worker: SimulatorWorker;
  loaded: { key: string; done: Promise<void> } | null;
}

export function createPool(spawn: () => SimulatorWorker, size: number): Pool {
  const seats: (Seat | null)[] = Array.from({ length: size }, () => null);
  let latest: AbortController | null = null;

  /** Runs one call on a seat; a seat whose worker broke down is given up. */
  async function call<T>(
    index: number,
    job: Job,
    work: (remote: SimulatorWorker['remote']) => Promise<Reply<T>>,
  ): Promise<T> {
    seats[index] ??= { worker: spawn(), loaded: null };
    const seat = seats[index];
    try {
      // While this call waited, another may have loaded its own document here.
      do await load(seat, job);
      while (seat.loaded?.key !== job.key);
      return open(await Promise.race([work(seat.worker.remote), seat.worker.failed]));
    } catch (problem) {
      if (!(problem instanceof DocumentError) && seats[index] === seat) {
        seat.worker.stop();
        seats[index] = null;
      }
      throw problem;
    }
  }

  return {
    base: (job) => call(0, job, (remote) => remote.base(job.key)),
    draws: async (job, settings, { signal, onProgress } = {}) => {
      latest?.abort();
      const mine = new AbortController();
      latest = mine;
      const stop = () => mine.abort();
      signal?.addEventListener('abort', stop, { once: true });
      if (signal?.aborted) stop();
      try {
        const run = (index: number, from: number, to: number) =>
          call(index, job, (remote) => remote.draws(job.key, settings, from, to));
        return await runBlocks(size, settings.samples, mine, run, onProgress);
      } finally {
        signal?.removeEventListener('abort', stop);
      }
    },
  };
}

/** Loads the document once a seat: calls that follow wait for the same loading. */
function load(seat: Seat, job: Job): Promise<void> {
  if (seat.loaded?.key !== job.key) {
    const loading = Promise.race([
      seat.worker.remote.load(job.key, job.document),
      seat.worker.failed,
    ]);
    const done = loading.then((reply) => {
      open(reply);
    });
    seat.loaded = { key: job.key, done };
  }
  return seat.loaded.done;
}

function open<T>(reply: Reply<T>): T {
  if (!reply.ok) throw new DocumentError(reply.issues);
  return reply.value;
}

type RunBlock = (index: number, from: number, to: number) => Promise<DrawsBlock>;

/** Each seat takes the next block that nobody has, until none is left. */
async function runBlocks(
  size: number,
  samples: number,
  mine: AbortController,
  run: RunBlock,
  onProgress?: (done: number, total: number) => void,
): Promise<DrawsBlock[]> {
  const { signal } = mine;
  const blocks: DrawsBlock[] = [];
  let next = 0;
  let done = 0;
  const seat = async (index: number) => {
    while (next < samples) {
      signal.throwIfAborted();
      const from = next;
      next = Math.min(samples, from + BLOCK_DRAWS);
      const block = await run(index, from, next);
      signal.throwIfAborted();
      blocks.push(block);
      done += block.to - block.from;
      onProgress?.(done, samples);
    }
  };
  const seats = Math.min(size, Math.ceil(samples / BLOCK_DRAWS));
  try {
    await Promise.race([
      Promise.all(Array.from({ length: seats }, (_, index) => seat(index))),
      whenAborted(signal),
    ]);
  } catch (problem) {
    // The other seats stop at their next block.
    mine.abort();
    throw problem;
  }
  return blocks.sort((a, b) => a.from - b.from);
}

function whenAborted(signal: AbortSignal): Promise<never> {
  return new Promise((_, reject) => {
    const stop = () => reject(signal.reason);
    if (signal.aborted) stop();
    else signal.addEventListener('abort', stop, { once: true });
  });
}
