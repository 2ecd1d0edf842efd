/**
 * The sessions of this tab, by the address that shows them: an appraisal of this device
 * by its id, a worked example by its name. The same address is the same session, so that
 * going from page to page loses nothing, even where nothing can be written.
 */
import { useEffect, useState } from 'react';
import { type AppDatabase, database } from './database.ts';
import { exampleText } from './examples.ts';
import { NO_HISTORY } from './history.ts';
import { readDraft } from './journal.ts';
import type { Origin } from './new-appraisal.ts';
import { Session } from './session.ts';
import { type StoreCode, StoreError, storeCode } from './store-error.ts';

/** Sessions kept open though no page shows them. */
const MOST_IDLE = 8;

interface Open {
  readonly address: string;
  readonly db: AppDatabase;
  readonly session: Session;
}

let open: Open[] = [];
const opening = new Map<string, Promise<Session | null>>();

/** The session at an address, where this tab has it already. */
export function openedSession(address: string, db: AppDatabase = database()): Session | null {
  return open.find((one) => one.db === db && addressOf(one) === address)?.session ?? null;
}

/**
 * Opens what an address names: null where there is nothing.
 * @throws StoreError
 */
export function openAppraisal(
  address: string,
  db: AppDatabase = database(),
): Promise<Session | null> {
  const known = openedSession(address, db);
  if (known) return Promise.resolve(known);
  const key = `${db.name} ${address}`;
  const begun = opening.get(key);
  if (begun) return begun;
  const work = find(address, db).finally(() => opening.delete(key));
  opening.set(key, work);
  return work;
}

/**
 * Shows a document at an address without keeping it: the first edit makes an appraisal of
 * it, whose id is its address from then on.
 */
export function showDocument(
  address: string,
  origin: Origin,
  db: AppDatabase = database(),
): Session {
  open = open.filter((one) => one.db !== db || addressOf(one) !== address);
  const start = { seq: 0, document: origin.document, history: NO_HISTORY };
  return keep(address, db, new Session(db, start, null, origin));
}

/** Lets go of every session, as closing the tab would; what was being written is written. */
export async function closeSessions(): Promise<void> {
  const all = open;
  open = [];
  await Promise.all(all.map(({ session }) => session.close()));
}

export type Opening =
  | { readonly status: 'opening' }
  | { readonly status: 'missing' }
  | { readonly status: 'failed'; readonly code: StoreCode }
  | { readonly status: 'open'; readonly session: Session };

const WAITING: Opening = { status: 'opening' };

export function useOpenAppraisal(address: string): Opening {
  const [found, setFound] = useState<{ address: string; opening: Opening } | null>(null);
  const known = openedSession(address);
  useEffect(() => {
    let isCurrent = true;
    void attemptToOpen(address).then((opening) => {
      if (isCurrent) setFound({ address, opening });
    });
    return () => {
      isCurrent = false;
    };
  }, [address]);
  if (known) return { status: 'open', session: known };
  return found?.address === address ? found.opening : WAITING;
}

async function attemptToOpen(address: string): Promise<Opening> {
  try {
    const session = await openAppraisal(address);
    return session ? { status: 'open', session } : { status: 'missing' };
  } catch (problem) {
    return { status: 'failed', code: storeCode(problem) };
  }
}

async function find(address: string, db: AppDatabase): Promise<Session | null> {
  const text = await exampleText(address);
  if (text !== null) {
    const { readDocument } = await import('../../shared/model/read.ts');
    const { document } = readDocument(text);
    return document && showDocument(address, { document, source: `example:${address}` }, db);
  }
  try {
    const kept = await readDraft(db, address);
    if (!kept) return null;
    const { appraisal, point, unreadable } = kept;
    const session = keep(address, db, new Session(db, point, appraisal, null, unreadable));
    void db.appraisals.update(address, { openedAt: Date.now() }).catch(() => {});
    return session;
  } catch (problem) {
    throw new StoreError(storeCode(problem), problem);
  }
}

/** A document shown moves to its own address when it becomes an appraisal. */
function addressOf({ address, session }: Open): string {
  return session.getState().appraisal?.id ?? address;
}

function keep(address: string, db: AppDatabase, session: Session): Session {
  const idle = open.filter((one) => isIdle(one.session));
  const gone = new Set(idle.slice(0, Math.max(0, idle.length + 1 - MOST_IDLE)));
  open = [...open.filter((one) => !gone.has(one)), { address, db, session }];
  for (const one of gone) void one.session.close();
  return session;
}

/** Nobody looks at it, and nothing of it would be lost. */
function isIdle(session: Session): boolean {
  return !session.isWatched && session.getState().work.status === 'saved';
}

if (typeof document !== 'undefined') {
  // A tab that slept may not have been told what others wrote.
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState !== 'visible') return;
    for (const { session } of open) void session.refresh();
  });
}
