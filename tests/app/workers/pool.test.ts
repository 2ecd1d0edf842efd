import { describe, expect, it } from 'vitest';
import { type BaseRun, BLOCK_DRAWS, type DrawsBlock } from '../../../shared/engine/results.ts';
import { DocumentError, error } from '../../../shared/model/issue.ts';
import { createPool, type Job, type Pool } from '../../../src/workers/pool.ts';
import type { Reply } from '../../../src/workers/simulator.ts';
import type { SimulatorWorker } from '../../../src/workers/spawn.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

/** Four whole blocks and a short one. */
const SETTINGS = { samples: 4 * BLOCK_DRAWS + 10, seed: 7, plan: 'plain' } as const;
const ENDS = [1, 2, 3, 4].map((n) => n * BLOCK_DRAWS).concat(SETTINGS.samples);
const document = tinyDocument();
const job: Job = { key: 'tiny', document };

/** Draw i of a block is i itself: whatever goes astray shows. */
function block(from: number, to: number): DrawsBlock {
  const column = Float64Array.from({ length: to - from }, (_, i) => from + i);
  return { from, to, cost: [column], outcome: [column], problems: [] };
}

interface Fake {
  readonly calls: string[];
  readonly stopped: number[];
  readonly spawn: () => SimulatorWorker;
}

interface FakeOptions {
  /** What a block waits for before it is given back. */
  readonly wait?: (worker: number, from: number) => Promise<void>;
  readonly refuse?: boolean;
  /** Worker that breaks down when first asked for a block. */
  readonly breaks?: number;
}

/** Workers that answer in this thread; they keep one document each, as the real ones do. */
function fakeWorkers({ wait = async () => {}, refuse, breaks }: FakeOptions = {}): Fake {
  const calls: string[] = [];
  const stopped: number[] = [];
  let count = 0;
  const spawn = (): SimulatorWorker => {
    const number = ++count;
    let loaded = '';
    let fail: (reason: Error) => void = () => {};
    const failed = new Promise<never>((_, reject) => {
      fail = reject;
    });
    failed.catch(() => {});
    const answer = <T>(key: string, value: T): Reply<T> => {
      if (loaded !== key) throw new Error(`worker ${number} holds ${loaded}, not ${key}`);
      return { ok: true, value };
    };
    const remote: SimulatorWorker['remote'] = {
      load: async (key) => {
        calls.push(`${number} load ${key}`);
        loaded = key;
        return refuse ? { ok: false, issues: [error('formula.empty')] } : { ok: true, value: null };
      },
      base: async (key) => answer(key, { cycles: 1 } as BaseRun),
      draws: async (key, _settings, from, to) => {
        calls.push(`${number} draws ${from}`);
        if (breaks === number) fail(new Error('out of memory'));
        // A worker works a block out in one go, whatever it is told meanwhile.
        const reply = answer(key, block(from, to));
        await wait(number, from);
        return breaks === number ? new Promise(() => {}) : reply;
      },
    };
    return { remote, failed, stop: () => stopped.push(number) };
  };
  return { calls, stopped, spawn };
}

function costs(blocks: readonly DrawsBlock[]): number[] {
  return blocks.flatMap(({ cost }) => [...(cost[0] ?? [])]);
}

/** A gate that opens when told to. */
function gate(): { open: () => void; opened: Promise<void> } {
  let open = () => {};
  const opened = new Promise<void>((resolve) => {
    open = resolve;
  });
  return { open, opened };
}

const settled = () => new Promise((resolve) => setTimeout(resolve, 0));

describe('a run of draws', () => {
  const whole = Array.from({ length: SETTINGS.samples }, (_, i) => i);

  it.each([1, 2, 3, 4])('is the same with %d workers', async (size) => {
    // The later the worker, the sooner it answers: blocks come back out of order.
    const wait = (worker: number) => new Promise<void>((go) => setTimeout(go, 8 / worker));
    const pool = createPool(fakeWorkers({ wait }).spawn, size);
    expect(costs(await pool.draws(job, SETTINGS))).toEqual(whole);
  });

  it('asks for the fixed blocks, the last one short, each once', async () => {
    const { spawn, calls } = fakeWorkers();
    const blocks = await createPool(spawn, 3).draws(job, SETTINGS);
    expect(blocks.map(({ from }) => from)).toEqual([0, ...ENDS.slice(0, -1)]);
    expect(blocks.map(({ to }) => to)).toEqual(ENDS);
    expect(calls.filter((call) => call.includes('draws'))).toHaveLength(5);
  });

  it('starts no more workers than there are blocks, and loads each once', async () => {
    const { spawn, calls } = fakeWorkers();
    const pool = createPool(spawn, 4);
    await pool.draws(job, { ...SETTINGS, samples: BLOCK_DRAWS + 1 });
    await pool.draws(job, { ...SETTINGS, samples: BLOCK_DRAWS + 1 });
    expect(calls.filter((call) => call.includes('load'))).toEqual(['1 load tiny', '2 load tiny']);
  });

  it('tells how far it is', async () => {
    const told: [number, number][] = [];
    const onProgress = (done: number, total: number) => told.push([done, total]);
    await createPool(fakeWorkers().spawn, 1).draws(job, SETTINGS, { onProgress });
    expect(told.map(([done]) => done)).toEqual(ENDS);
    expect(new Set(told.map(([, total]) => total))).toEqual(new Set([SETTINGS.samples]));
  });

  it('stops when told to, at once, and asks for no further block', async () => {
    const { opened, open } = gate();
    const { spawn, calls } = fakeWorkers({ wait: () => opened });
    const stop = new AbortController();
    const run = createPool(spawn, 1).draws(job, SETTINGS, { signal: stop.signal });
    await settled();
    stop.abort();
    await expect(run).rejects.toMatchObject({ name: 'AbortError' });
    open();
    await settled();
    expect(calls).toEqual(['1 load tiny', '1 draws 0']);
  });

  it('does not begin when it is told to stop before', async () => {
    const { spawn, calls } = fakeWorkers();
    const run = createPool(spawn, 1).draws(job, SETTINGS, { signal: AbortSignal.abort() });
    await expect(run).rejects.toMatchObject({ name: 'AbortError' });
    expect(calls).toEqual([]);
  });

  it('gives way to a newer one', async () => {
    const { opened, open } = gate();
    const pool = createPool(fakeWorkers({ wait: () => opened }).spawn, 2);
    const older = pool.draws(job, SETTINGS);
    await settled();
    const newer = pool.draws({ key: 'other', document }, { ...SETTINGS, samples: 2 * BLOCK_DRAWS });
    await expect(older).rejects.toMatchObject({ name: 'AbortError' });
    open();
    expect(costs(await newer)).toHaveLength(2 * BLOCK_DRAWS);
  });

  it('passes on what is wrong with the document, as data, and keeps the worker', async () => {
    const { spawn, stopped } = fakeWorkers({ refuse: true });
    const run = createPool(spawn, 2).draws(job, SETTINGS);
    await expect(run).rejects.toBeInstanceOf(DocumentError);
    await expect(run).rejects.toMatchObject({ issues: [{ code: 'formula.empty' }] });
    expect(stopped).toEqual([]);
  });

  it('fails when a worker breaks down, and starts another for the next run', async () => {
    const { spawn, stopped } = fakeWorkers({ breaks: 1 });
    const pool: Pool = createPool(spawn, 1);
    await expect(pool.draws(job, SETTINGS)).rejects.toThrow('out of memory');
    expect(stopped).toEqual([1]);
    expect(costs(await pool.draws(job, SETTINGS))).toEqual(whole);
  });
});

it('runs the base case of another document between two blocks', async () => {
  const { opened, open } = gate();
  const { spawn, calls } = fakeWorkers({ wait: () => opened });
  const pool = createPool(spawn, 1);
  const draws = pool.draws(job, { ...SETTINGS, samples: 2 * BLOCK_DRAWS });
  await settled();
  await expect(pool.base({ key: 'other', document })).resolves.toEqual({ cycles: 1 });
  open();
  expect(costs(await draws)).toHaveLength(2 * BLOCK_DRAWS);
  expect(calls.filter((call) => call.includes('load'))).toEqual([
    '1 load tiny',
    '1 load other',
    '1 load tiny',
  ]);
});
