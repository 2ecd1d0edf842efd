/** Reading the draft of an appraisal: its base and the journal rows made since. */
import Dexie from 'dexie';
import type { AppDatabase, AppraisalRow, JournalRow } from './database.ts';
import { type Point, replay } from './draft.ts';
import { afterStep, NO_HISTORY } from './history.ts';

/** Rows past the number `after`, in order. */
export async function journalOf(
  db: AppDatabase,
  appraisal: string,
  after: number,
): Promise<JournalRow[]> {
  return db.journal
    .where('[appraisal+seq]')
    .between([appraisal, after], [appraisal, Dexie.maxKey], false)
    .toArray();
}

export interface KeptDraft {
  readonly appraisal: AppraisalRow;
  readonly point: Point;
  /** Rows that do not fit, and were passed over. */
  readonly unreadable: number;
}

/** As the last edit left it; null where the device has no such appraisal. */
export async function readDraft(db: AppDatabase, id: string): Promise<KeptDraft | null> {
  const kept = await db.transaction('r', db.appraisals, db.versions, db.journal, async () => {
    const appraisal = await db.appraisals.get(id);
    const base = appraisal && (await db.versions.get(appraisal.draftBase));
    return base && { appraisal, base, rows: await journalOf(db, id, 0) };
  });
  if (!kept) return null;
  const { appraisal, base, rows } = kept;
  const { draftSeq } = appraisal;
  // What went into the version can be undone too.
  const history = rows.filter(({ seq }) => seq <= draftSeq).reduce(afterStep, NO_HISTORY);
  const start = { seq: draftSeq, document: base.document, history };
  const since = rows.filter(({ seq }) => seq > draftSeq);
  return { appraisal, ...replay(start, since) };
}
