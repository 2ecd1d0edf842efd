import { releaseProxy, wrap } from 'comlink';
import type { DraftSimulator, Simulator } from './simulator.ts';

/** The simulator from the other side of the thread: every answer is a promise. */
export type RemoteOf<S extends { [K in keyof S]: (...args: never[]) => unknown }> = {
  readonly [K in keyof S]: (...args: Parameters<S[K]>) => Promise<ReturnType<S[K]>>;
};

/** A worker as the pool sees it. */
export interface SimulatorWorker<R = RemoteOf<Simulator>> {
  readonly remote: R;
  /** Rejects when the worker cannot start or breaks down; Comlink would wait for ever. */
  readonly failed: Promise<never>;
  stop(): void;
}

export function spawnSimulator(): SimulatorWorker<RemoteOf<DraftSimulator>> {
  const worker = new Worker(new URL('./simulator.worker.ts', import.meta.url), {
    type: 'module',
    name: 'simulator',
  });
  const remote = wrap<DraftSimulator>(worker);
  const failed = new Promise<never>((_, reject) => {
    worker.addEventListener('error', (event) => {
      event.preventDefault();
      reject(new Error(event.message || 'The simulator did not start.'));
    });
  });
  failed.catch(() => {});
  const stop = () => {
    remote[releaseProxy]();
    worker.terminate();
  };
  return { remote, failed, stop };
}

/** For small memories. */
export const MOST_WORKERS = 4;

/** As many as chosen; else all cores but one, which the page keeps. */
export function poolSize(chosen: number | null): number {
  const cores = chosen ?? (navigator.hardwareConcurrency || 2) - 1;
  return Math.min(MOST_WORKERS, Math.max(1, cores));
}
