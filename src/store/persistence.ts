/**
 * Whether the browser promises to keep what is stored here. It is asked once, at the
 * first edit, when there is something to keep; its answer is a fact that Settings shows.
 */
import { type AppDatabase, database } from './database.ts';
import { getSetting, putSetting } from './device-settings.ts';

export interface StorageFacts {
  /** `unknown`: the browser has no way to be asked. */
  readonly kept: 'granted' | 'refused' | 'unknown';
  /** Bytes in use and at most, where the browser says. */
  readonly usage: number | null;
  readonly quota: number | null;
  readonly time: number;
}

/** What holds now, without asking for anything. */
export async function readStorageFacts(): Promise<StorageFacts> {
  return facts((storage) => storage.persisted());
}

/** Asks the browser to keep the data; some ask the reader in turn. */
export async function askToPersist(db: AppDatabase = database()): Promise<StorageFacts> {
  const found = await facts(async (storage) => {
    return (await storage.persisted()) || (await storage.persist());
  });
  await putSetting('storage', found, db).catch(() => {
    // A full or barred database says so elsewhere; the answer still holds.
  });
  return found;
}

const asked = new WeakSet<AppDatabase>();

/** Asks unless this device was asked before. */
export async function askOnce(db: AppDatabase): Promise<void> {
  if (asked.has(db)) return;
  asked.add(db);
  const known = await getSetting('storage', db).catch(() => null);
  if (known === null || known.kept === 'unknown') await askToPersist(db);
}

async function facts(ask: (storage: StorageManager) => Promise<boolean>): Promise<StorageFacts> {
  const time = Date.now();
  const storage = navigator.storage as StorageManager | undefined;
  if (!storage?.persist) return { kept: 'unknown', usage: null, quota: null, time };
  try {
    const kept = (await ask(storage)) ? 'granted' : 'refused';
    const { usage, quota } = await storage.estimate();
    return { kept, usage: usage ?? null, quota: quota ?? null, time };
  } catch {
    return { kept: 'unknown', usage: null, quota: null, time };
  }
}
