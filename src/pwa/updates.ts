/**
 * The service worker's news, as a small store: ready to work offline, a new version that
 * waits for the reader's word, or one that another tab has already put in use.
 */

import { registerSW } from 'virtual:pwa-register';
import { useSyncExternalStore } from 'react';

export type UpdateState = 'none' | 'offlineReady' | 'waiting' | 'changedElsewhere';

const HOUR = 3_600_000;
const listeners = new Set<() => void>();
let state: UpdateState = 'none';
let asked = false;
let activate: () => Promise<void> = async () => {};

export function startUpdates(): void {
  if (!import.meta.env.PROD) return;
  activate = registerSW({
    immediate: true,
    onOfflineReady: () => set('offlineReady'),
    onNeedRefresh: () => set('waiting'),
    // Only the tab whose reader asked reloads by itself: no page is swapped under another.
    onNeedReload: () => (asked ? window.location.reload() : set('changedElsewhere')),
    onRegisteredSW: (_url, registration) => {
      if (registration) lookEveryHour(registration);
    },
    // Without a service worker (a private window, say) the app works while online.
    onRegisterError: () => {},
  });
}

function lookEveryHour(registration: ServiceWorkerRegistration): void {
  setInterval(() => {
    if (navigator.onLine) registration.update().catch(() => {});
  }, HOUR);
}

/** Puts the waiting version in use and reloads this page. */
export function takeNewVersion(): void {
  if (state === 'changedElsewhere') {
    window.location.reload();
    return;
  }
  asked = true;
  void activate();
}

export function dismissUpdate(): void {
  set('none');
}

export function useUpdateState(): UpdateState {
  return useSyncExternalStore(subscribe, () => state);
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function set(next: UpdateState): void {
  state = next;
  for (const listener of listeners) listener();
}
