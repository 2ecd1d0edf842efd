/**
 * Results that were had before, by what they depend on alone: the document, the settings
 * of the draws and the engine. They can always be had again, so the least used are dropped
 * where there are many, and all of them where the device is full.
 */
import type { Draws } from '../../shared/analysis/psa/draws.ts';
import {
  type BaseRun,
  ENGINE_VERSION,
  type SamplingSettings,
} from '../../shared/engine/results.ts';
import type { Issue } from '../../shared/model/issue.ts';
import { type AppDatabase, database } from './database.ts';

export interface KeptResults {
  readonly base: BaseRun;
  readonly draws: Draws;
  /** What only the draws showed. */
  readonly problems: readonly Issue[];
}

/** Bytes kept at most. */
export const MOST_BYTES = 32 * 2 ** 20;

/** Null where nothing is kept, or nothing can be read. */
export async function keptResults(
  document: string,
  settings: SamplingSettings,
  db: AppDatabase = database(),
): Promise<KeptResults | null> {
  const key = keyOf(document, settings);
  try {
    return await db.transaction('rw', db.results, async () => {
      const row = await db.results.get(key);
      if (!row) return null;
      await db.results.update(key, { used: await nextUse(db) });
      return row.payload as KeptResults;
    });
  } catch {
    // Being without them costs time only.
    return null;
  }
}

/** Keeps results where there is room; where there is none, goes without. */
export async function keepResults(
  document: string,
  settings: SamplingSettings,
  results: KeptResults,
  db: AppDatabase = database(),
  most: number = MOST_BYTES,
): Promise<void> {
  const size = sizeOf(results);
  if (size > most) return;
  const [, text, engine] = keyOf(document, settings);
  try {
    await db.transaction('rw', db.results, async () => {
      const used = await nextUse(db);
      await db.results.put({ document, settings: text, engine, payload: results, size, used });
      await makeRoom(db, most);
    });
  } catch {
    // As above.
  }
}

function keyOf(document: string, settings: SamplingSettings): [string, string, string] {
  const { samples, seed, plan } = settings;
  return [document, `${samples} ${seed} ${plan}`, ENGINE_VERSION];
}

async function nextUse(db: AppDatabase): Promise<number> {
  return ((await db.results.orderBy('used').last())?.used ?? 0) + 1;
}

/** Drops the least used until the others fit. */
async function makeRoom(db: AppDatabase, most: number): Promise<void> {
  const rows: { key: [string, string, string]; size: number }[] = [];
  await db.results.orderBy('used').each(({ document, settings, engine, size }) => {
    rows.push({ key: [document, settings, engine], size });
  });
  let total = rows.reduce((sum, { size }) => sum + size, 0);
  for (const { key, size } of rows) {
    if (total <= most) return;
    await db.results.delete(key);
    total -= size;
  }
}

/** The columns, and the rest as text would take. */
function sizeOf({ base, draws, problems }: KeptResults): number {
  const columns = [...draws.cost, ...draws.health];
  const bytes = columns.reduce((sum, column) => sum + column.byteLength, 0);
  return bytes + JSON.stringify([base, problems]).length;
}
