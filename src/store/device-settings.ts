/** Small facts kept in the device's database: the author's name, what storage was granted. */
import { useLiveQuery } from 'dexie-react-hooks';
import { type AppDatabase, database } from './database.ts';
import type { StorageFacts } from './persistence.ts';

export interface DeviceSettings {
  /** Name that versions are signed with. */
  readonly author: string;
  /** What the browser answered when it was asked to keep the data. */
  readonly storage: StorageFacts;
}

export async function getSetting<K extends keyof DeviceSettings>(
  key: K,
  db: AppDatabase = database(),
): Promise<DeviceSettings[K] | null> {
  const row = await db.settings.get(key);
  return (row?.value as DeviceSettings[K] | undefined) ?? null;
}

export async function putSetting<K extends keyof DeviceSettings>(
  key: K,
  value: DeviceSettings[K],
  db: AppDatabase = database(),
): Promise<void> {
  await db.settings.put({ key, value });
}

/** Live: undefined while it is being read, null where nothing is kept or can be. */
export function useSetting<K extends keyof DeviceSettings>(
  key: K,
): DeviceSettings[K] | null | undefined {
  return useLiveQuery(() => getSetting(key).catch(() => null), [key]);
}
