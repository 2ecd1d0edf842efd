import { describe, expect, it } from 'vitest';
import { ENGINE_VERSION } from '../../../shared/engine/results.ts';
import { keepResults, keptResults, MOST_BYTES } from '../../../src/store/results-cache.ts';
import { breakWrites, openTab } from './support.ts';

const SETTINGS = { samples: 100, seed: 1, plan: 'plain' } as const;

function results(cost: number, draws = 100) {
  const column = () => new Float64Array(draws).fill(cost);
  const totals = { cost, outcome: 1, lifeYears: 1, byProfile: [], byPayoff: [] };
  return {
    base: { strategies: [{ id: 'usual', ...totals }], cycleLength: 1, cycles: 1, problems: [] },
    draws: { strategies: ['usual'], cost: [column()], health: [column()] },
    problems: [],
  };
}

describe('kept results', () => {
  it('come back by document, settings and engine', async () => {
    const db = openTab();
    await keepResults('one', SETTINGS, results(5), db);
    // As text: what comes out of the database here has another realm's arrays.
    const kept = await keptResults('one', SETTINGS, db);
    expect(JSON.stringify(kept)).toBe(JSON.stringify(results(5)));
    expect(await keptResults('two', SETTINGS, db)).toBeNull();
    expect(await keptResults('one', { ...SETTINGS, seed: 2 }, db)).toBeNull();
    await db.results.update(['one', '100 1 plain', ENGINE_VERSION], { engine: 'older' });
    expect(await keptResults('one', SETTINGS, db)).toBeNull();
  });

  it('drop the least used where there is no room for all', async () => {
    const db = openTab();
    // Two columns of 1,000 draws take 16,000 bytes; there is room for three.
    const keep = (name: string) => keepResults(name, SETTINGS, results(1, 1_000), db, 50_000);
    for (const name of ['a', 'b', 'c']) await keep(name);
    await keptResults('a', SETTINGS, db);
    await keep('d');
    const left = (await db.results.toArray()).map(({ document }) => document);
    expect(left.sort()).toEqual(['a', 'c', 'd']);
  });

  it('too large for all the room there is are not kept', async () => {
    const db = openTab();
    await keepResults('large', SETTINGS, results(1, MOST_BYTES / 16 + 1), db);
    expect(await db.results.count()).toBe(0);
  });

  it('are done without where nothing can be written', async () => {
    const db = openTab();
    breakWrites(db, () => new DOMException('full', 'QuotaExceededError'));
    await keepResults('one', SETTINGS, results(5), db);
    expect(await keptResults('one', SETTINGS, db)).toBeNull();
  });
});
