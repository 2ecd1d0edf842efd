import { releaseProxy, wrap } from 'comlink';
import type { Simulator } from './simulator.ts';

/** The simulator from the other side of the thread: every answer is a promise. */
export type RemoteSimulator = {
  readonly [K in keyof Simulator]: (
    ...args: Parameters<Simulator[K]>
  ) => Promise<ReturnType<Simulator[K]>>;
};

/** A worker as the pool sees it. */
export interface SimulatorWorker {
  readonly remote: RemoteSimulator;
  /** Rejects when the worker cannot start or breaks down; Comlink would wait for ever. */
  readonly failed: Promise<never>;
  stop(): void;
}

export function spawnSimulator(): SimulatorWorker {
  const worker = new Worker(new URL('./simulator.worker.ts', import.meta.url), {
    type: 'module',
    name: 'simulator',
  });
  const remote = wrap<Simulator>(worker);
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

/** All cores but one, which the page keeps; never more than four, for small memories. */
export function poolSize(): number {
  return Math.min(4, Math.max(1, (navigator.hardwareConcurrency || 2) - 1));
}
