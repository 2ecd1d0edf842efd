/** How this tab stands with the device's database, for a notice on every page. */
import { useSyncExternalStore } from 'react';

/**
 * `blocked`: a tab with an older application holds the database, and has to be closed.
 * `outdated`: another tab has a newer application; this one let go and has to be reloaded.
 */
export type Connection = 'open' | 'blocked' | 'outdated';

let current: Connection = 'open';
const listeners = new Set<() => void>();

export function getConnection(): Connection {
  return current;
}

export function setConnection(next: Connection): void {
  if (next === current) return;
  current = next;
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useConnection(): Connection {
  return useSyncExternalStore(subscribe, getConnection);
}
