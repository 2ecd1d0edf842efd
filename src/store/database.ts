/**
 * The device's database: what is kept between visits. A version is never changed once it
 * is written; the draft is a version and the journal of edits made since.
 */
import Dexie, { type EntityTable, type Table } from 'dexie';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Edit } from '../../shared/model/edit/edit.ts';
import { setConnection } from './connection.ts';
import { StoreError } from './store-error.ts';

const SCHEMA_VERSION = 1;

export type Source =
  | `example:${string}`
  | `template:${string}`
  | `copy:${string}`
  | 'file'
  | 'empty';

export interface AppraisalRow {
  readonly id: string;
  /** Follows the title of the question. */
  readonly title: string;
  readonly source: Source;
  readonly author: string;
  /** Milliseconds since 1970 by this device's clock, for display. */
  readonly createdAt: number;
  readonly openedAt: number;
  /** Digest of the current version. */
  readonly head: string;
  /** Digest of the version that the draft starts from. */
  readonly draftBase: string;
  /** The draft is `draftBase` and every journal row past this number. */
  readonly draftSeq: number;
}

export interface VersionRow {
  /** Identity of the version: see versions.ts. */
  readonly digest: string;
  readonly appraisal: string;
  /** Digests, none for the first version. */
  readonly parents: readonly string[];
  readonly author: string;
  readonly message: string;
  readonly time: number;
  readonly document: ModelDocument;
  /** Digest of the document alone: two versions may hold the same. */
  readonly documentDigest: string;
  /** A name given later; no part of the identity. */
  readonly name?: string;
}

export interface JournalRow {
  readonly appraisal: string;
  /** 1, 2, 3 ... within the appraisal. */
  readonly seq: number;
  readonly edits: readonly Edit[];
  readonly inverse: readonly Edit[];
  readonly label: string;
  readonly time: number;
  /** Neighbouring rows of one group, such as the keystrokes in a field, are undone together. */
  readonly group?: string;
  /** First row of the step that this row undoes. */
  readonly undoOf?: number;
  /** The undo row that this row takes back. */
  readonly redoOf?: number;
}

export interface ResultRow {
  readonly document: string;
  readonly settings: string;
  readonly engine: string;
  readonly payload: unknown;
  /** Bytes, roughly. */
  readonly size: number;
  /** Rises with each use: the lowest is the first to be dropped. */
  readonly used: number;
}

export interface SettingRow {
  readonly key: string;
  readonly value: unknown;
}

export class AppDatabase extends Dexie {
  readonly appraisals!: EntityTable<AppraisalRow, 'id'>;
  readonly versions!: EntityTable<VersionRow, 'digest'>;
  readonly journal!: Table<JournalRow, [string, number]>;
  readonly results!: Table<ResultRow, [string, string, string]>;
  readonly settings!: EntityTable<SettingRow, 'key'>;

  constructor(name = 'steelyard') {
    // Strict: an edit called saved has reached the disk, and survives a power cut.
    super(name, { chromeTransactionDurability: 'strict', cache: 'disabled' });
    this.version(SCHEMA_VERSION).stores({
      appraisals: 'id, openedAt',
      versions: 'digest, appraisal',
      journal: '[appraisal+seq], appraisal',
      results: '[document+settings+engine], used',
      settings: 'key',
    });
    this.on('versionchange', () => {
      // A newer application, in another tab, waits for this one to let go.
      this.close();
      setConnection('outdated');
      return false;
    });
    this.on('blocked', () => {
      setConnection('blocked');
      return false;
    });
    this.on('ready', () => {
      // Dexie would open a newer schema as if it were its own: we do not write into it.
      if (Math.floor(this.backendDB().version / 10) > SCHEMA_VERSION) {
        setConnection('outdated');
        throw new StoreError('store.outdated');
      }
      setConnection('open');
    });
  }
}

let current: AppDatabase | null = null;

export function database(): AppDatabase {
  current ??= new AppDatabase();
  return current;
}
