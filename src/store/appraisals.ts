/** The appraisals of this device: listed, made, renamed, copied, deleted and brought back. */
import { useLiveQuery } from 'dexie-react-hooks';
import { openChannel } from './channel.ts';
import {
  type AppDatabase,
  type AppraisalRow,
  database,
  type JournalRow,
  type VersionRow,
} from './database.ts';
import { getSetting } from './device-settings.ts';
import { journalOf } from './journal.ts';
import { addAppraisal, makeAppraisal, type Origin } from './new-appraisal.ts';
import { openAppraisal } from './open-sessions.ts';
import type { Session } from './session.ts';
import { StoreError, storeCode } from './store-error.ts';
import { completed } from './versions.ts';

/** The one opened last comes first. */
export function listAppraisals(db: AppDatabase = database()): Promise<AppraisalRow[]> {
  return db.appraisals.orderBy('openedAt').reverse().toArray();
}

export type AppraisalList =
  | { readonly status: 'reading' }
  | { readonly status: 'read'; readonly appraisals: readonly AppraisalRow[] }
  | { readonly status: 'failed'; readonly code: ReturnType<typeof storeCode> };

/** Live, whichever tab makes the change. */
export function useAppraisals(): AppraisalList {
  const read = (): Promise<AppraisalList> =>
    listAppraisals().then(
      (appraisals) => ({ status: 'read', appraisals }),
      (problem) => ({ status: 'failed', code: storeCode(problem) }),
    );
  return useLiveQuery(read) ?? { status: 'reading' };
}

/**
 * Makes an appraisal of a document: a template, an empty one, or one that was read.
 * @throws StoreError
 */
export async function createAppraisal(
  { document, source }: Origin,
  db: AppDatabase = database(),
): Promise<AppraisalRow> {
  const origin = { document: await completed(document), source };
  return guarded(async () => {
    const made = makeAppraisal(origin, (await getSetting('author', db)) ?? '', Date.now());
    await db.transaction('rw', db.appraisals, db.versions, () => addAppraisal(db, made));
    return made.appraisal;
  });
}

/**
 * Gives the question a new title, as an edit like any other.
 * @param label what the edit is called in the history
 * @throws StoreError
 */
export async function renameAppraisal(
  id: string,
  title: string,
  label: string,
  db: AppDatabase = database(),
): Promise<void> {
  const session = await opened(id, db);
  const written = await session.edit(
    [{ type: 'set', at: ['question', 'title'], value: title }],
    label,
  );
  const { work } = session.getState();
  if (!written) throw new StoreError(work.status === 'failed' ? work.code : 'store.failed');
}

/**
 * A new appraisal from the draft of another; its history stays with the other.
 * @throws StoreError
 */
export async function duplicateAppraisal(
  id: string,
  title: string,
  db: AppDatabase = database(),
): Promise<AppraisalRow> {
  const { document } = (await opened(id, db)).getState();
  const copy = { ...document, question: { ...document.question, title } };
  return createAppraisal({ document: copy, source: `copy:${id}` }, db);
}

/** All that was deleted, to be brought back until the page is closed. */
export interface Deleted {
  readonly appraisal: AppraisalRow;
  readonly versions: readonly VersionRow[];
  readonly journal: readonly JournalRow[];
}

/**
 * Deletes an appraisal with its versions and its draft; null where it was gone already.
 * @throws StoreError
 */
export async function deleteAppraisal(
  id: string,
  db: AppDatabase = database(),
): Promise<Deleted | null> {
  const deleted = await guarded(() =>
    db.transaction('rw', db.appraisals, db.versions, db.journal, async () => {
      const appraisal = await db.appraisals.get(id);
      if (!appraisal) return null;
      const versions = await db.versions.where({ appraisal: id }).toArray();
      const journal = await journalOf(db, id, 0);
      await db.appraisals.delete(id);
      await db.versions.where({ appraisal: id }).delete();
      await db.journal.where({ appraisal: id }).delete();
      return { appraisal, versions, journal };
    }),
  );
  tellTabs(db, id);
  return deleted;
}

/**
 * Brings back what was deleted, as it was.
 * @throws StoreError
 */
export async function restoreAppraisal(
  { appraisal, versions, journal }: Deleted,
  db: AppDatabase = database(),
): Promise<void> {
  await guarded(() =>
    db.transaction('rw', db.appraisals, db.versions, db.journal, async () => {
      await db.appraisals.add(appraisal);
      await db.versions.bulkAdd([...versions]);
      await db.journal.bulkAdd([...journal]);
    }),
  );
  tellTabs(db, appraisal.id);
}

async function opened(id: string, db: AppDatabase): Promise<Session> {
  const session = await openAppraisal(id, db);
  if (!session) throw new StoreError('store.deleted');
  return session;
}

async function guarded<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (problem) {
    throw new StoreError(storeCode(problem), problem);
  }
}

function tellTabs(db: AppDatabase, appraisal: string): void {
  const channel = openChannel(`${db.name}.journal`, () => {});
  channel.tell({ appraisal });
  channel.close();
}
