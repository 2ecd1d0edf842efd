/**
 * Versions of an appraisal: each the whole document with its parents, addressed by the
 * digest of what it says. They are only ever added.
 */
import { useLiveQuery } from 'dexie-react-hooks';
import { digestOf } from '../../shared/model/digest.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { type AppDatabase, database, type VersionRow } from './database.ts';

export interface NewVersion {
  readonly appraisal: string;
  readonly parents: readonly string[];
  readonly author: string;
  readonly message: string;
  readonly time: number;
  /** Defaults filled in. */
  readonly document: ModelDocument;
}

export function makeVersion(version: NewVersion): VersionRow {
  const documentDigest = digestOf(version.document);
  const digest = digestOf({ ...version, document: documentDigest });
  return { ...version, digest, documentDigest };
}

/** Newest first; a version comes before its parents whatever the device's clock did. */
export async function listVersions(
  appraisal: string,
  db: AppDatabase = database(),
): Promise<VersionRow[]> {
  const rows = await db.versions.where({ appraisal }).toArray();
  return inOrder(rows);
}

/** Live: undefined while it is being read. */
export function useVersions(appraisal: string | null): VersionRow[] | undefined {
  return useLiveQuery(() => (appraisal === null ? [] : listVersions(appraisal)), [appraisal]);
}

export async function readVersion(
  digest: string,
  db: AppDatabase = database(),
): Promise<VersionRow | null> {
  return (await db.versions.get(digest)) ?? null;
}

/** Keeps a name for a version, or takes it away where the name is blank. */
export async function nameVersion(
  digest: string,
  name: string,
  db: AppDatabase = database(),
): Promise<void> {
  await db.versions.update(digest, { name: name.trim() || undefined });
}

/** As a reader would see it: the defaults of fields left out are put in. */
export async function completed(document: ModelDocument): Promise<ModelDocument> {
  const { documentSchema } = await import('../../shared/model/document.ts');
  const parsed = documentSchema.safeParse(document);
  return parsed.success ? parsed.data : document;
}

/** Longest way from the first version, then time. */
function inOrder(rows: readonly VersionRow[]): VersionRow[] {
  const depths = depthsOf(rows);
  const depth = ({ digest }: VersionRow) => depths.get(digest) ?? 0;
  return [...rows].sort((a, b) => depth(b) - depth(a) || b.time - a.time);
}

function depthsOf(rows: readonly VersionRow[]): Map<string, number> {
  const depths = new Map(rows.map(({ digest }) => [digest, 0]));
  let settled = false;
  for (let round = 0; round < rows.length && !settled; round++) {
    settled = true;
    for (const { digest, parents } of rows) {
      const depth = 1 + Math.max(-1, ...parents.map((parent) => depths.get(parent) ?? -1));
      if (depth > (depths.get(digest) ?? 0)) {
        depths.set(digest, depth);
        settled = false;
      }
    }
  }
  return depths;
}
