/** The first rows of an appraisal: itself and its first version. */
import type { ModelDocument } from '../../shared/model/document.ts';
import type { AppDatabase, AppraisalRow, Source, VersionRow } from './database.ts';
import { makeVersion } from './versions.ts';

export interface Origin {
  /** As read: defaults filled in. */
  readonly document: ModelDocument;
  readonly source: Source;
}

export interface NewAppraisal {
  readonly appraisal: AppraisalRow;
  readonly version: VersionRow;
}

export function makeAppraisal(
  { document, source }: Origin,
  author: string,
  time: number,
): NewAppraisal {
  const id = makeId();
  const version = makeVersion({ appraisal: id, parents: [], author, message: '', time, document });
  const head = version.digest;
  const { title } = document.question;
  const dates = { createdAt: time, openedAt: time };
  return {
    appraisal: { id, title, source, author, ...dates, head, draftBase: head, draftSeq: 0 },
    version,
  };
}

/** Within a transaction on both tables. */
export async function addAppraisal(
  db: AppDatabase,
  { appraisal, version }: NewAppraisal,
): Promise<void> {
  await db.appraisals.add(appraisal);
  await db.versions.add(version);
}

/** 96 random bits in hex: `crypto.randomUUID` is not there on a plain local network. */
function makeId(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(12));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
