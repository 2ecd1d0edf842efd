/**
 * One appraisal at work. Edits are in force at once and go to the journal in their order,
 * as soon as the one before is written; the state of the work is told at every moment.
 *
 * Two tabs may work on one appraisal: a row's number can be taken once only, so whoever
 * finds it taken reads what the other wrote and puts its own on top.
 */
import { useSyncExternalStore } from 'react';
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Edit } from '../../shared/model/edit/edit.ts';
import { type Channel, openChannel } from './channel.ts';
import type { AppDatabase, AppraisalRow, JournalRow, VersionRow } from './database.ts';
import { getSetting } from './device-settings.ts';
import {
  advance,
  attempt,
  fieldsBetween,
  type Pending,
  type Point,
  type Proposal,
  rebase,
  replay,
} from './draft.ts';
import { joins } from './history.ts';
import { journalOf } from './journal.ts';
import { addAppraisal, makeAppraisal, type Origin } from './new-appraisal.ts';
import { askOnce } from './persistence.ts';
import { isTaken, type StoreCode, StoreError, storeCode } from './store-error.ts';
import { completed, makeVersion } from './versions.ts';

export type Work =
  | { readonly status: 'saved' }
  | { readonly status: 'saving' }
  /** Edits stay in memory and are tried again: export them where it does not mend. */
  | { readonly status: 'failed'; readonly code: StoreCode };

/** Something that happened to the work and that the reader has to be told. */
export interface Notice {
  readonly id: number;
  /**
   * `draft.covered`: another tab changed the same thing; the edit made here stands, and
   * undoing it brings the other back. `draft.dropped`: the edit made here fits no longer
   * and is not in force. `draft.unreadable`: edits kept on this device fit no longer.
   */
  readonly code: 'draft.covered' | 'draft.dropped' | 'draft.unreadable';
  /** Of the edit; empty for `draft.unreadable`. */
  readonly label: string;
  readonly count: number;
}

export interface SessionState {
  /** Null while a document is only shown: the first edit makes it an appraisal. */
  readonly appraisal: AppraisalRow | null;
  readonly document: ModelDocument;
  /** Rises with every step; the keystrokes of one group are one step. */
  readonly step: number;
  readonly undo: { readonly label: string } | null;
  readonly redo: { readonly label: string } | null;
  /** Whether there are edits since the current version. */
  readonly changed: boolean;
  readonly work: Work;
  readonly notices: readonly Notice[];
}

export interface EditOptions {
  /** Edits that follow each other with the same group are undone together. */
  readonly group?: string;
}

const SAVED: Work = { status: 'saved' };
const SAVING: Work = { status: 'saving' };

export class Session {
  private pending: Pending[] = [];
  private work: Work = SAVED;
  private notices: readonly Notice[] = [];
  private step = 0;
  private noticed = 0;
  private state: SessionState;
  private turn: Promise<unknown> = Promise.resolve();
  private readonly listeners = new Set<() => void>();
  private readonly channel: Channel;

  constructor(
    private readonly db: AppDatabase,
    private confirmed: Point,
    private appraisal: AppraisalRow | null,
    private readonly origin: Origin | null,
    unreadable = 0,
  ) {
    this.channel = openChannel(`${db.name}.journal`, (told) => {
      if (told.appraisal === this.appraisal?.id) void this.refresh();
    });
    this.state = this.look();
    if (unreadable > 0) this.notify('draft.unreadable', '', unreadable);
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly getState = (): SessionState => this.state;

  get isWatched(): boolean {
    return this.listeners.size > 0;
  }

  /**
   * Puts edits into force, at once. Edits that do not fit are left out, with a notice.
   * @returns whether they are written to this device; never rejects
   */
  edit(edits: readonly Edit[], label: string, { group }: EditOptions = {}): Promise<boolean> {
    void askOnce(this.db);
    return this.propose({ edits, label, time: Date.now(), ...(group ? { group } : {}) });
  }

  /** @returns as `edit`; false where there is nothing to undo */
  undo(): Promise<boolean> {
    const top = this.latest.history.undo?.top;
    if (!top) return Promise.resolve(false);
    const { edits, label, seq } = top;
    return this.propose({ edits, label, time: Date.now(), undoOf: seq });
  }

  redo(): Promise<boolean> {
    const top = this.latest.history.redo?.top;
    if (!top) return Promise.resolve(false);
    const { edits, label, seq } = top;
    return this.propose({ edits, label, time: Date.now(), redoOf: seq });
  }

  /**
   * Makes the draft a version; where nothing differs from the current one, that one is it.
   * @throws StoreError
   */
  saveVersion(message: string): Promise<VersionRow> {
    return this.alone(async () => {
      await this.drain(true);
      if (this.work.status === 'failed') throw new StoreError(this.work.code);
      try {
        for (;;) {
          const version = await this.addVersion(message);
          if (version) return version;
          await this.readOthers();
        }
      } catch (problem) {
        throw new StoreError(storeCode(problem), problem);
      }
    });
  }

  /**
   * Brings back what a version says, as an edit like any other: it can be undone.
   * @returns as `edit`
   * @throws StoreError where the version cannot be read
   */
  async goBackTo(digest: string, label: string): Promise<boolean> {
    const version = await this.db.versions.get(digest).catch((problem) => {
      throw new StoreError(storeCode(problem), problem);
    });
    if (!version) throw new StoreError('store.failed');
    const edits = fieldsBetween(this.state.document, version.document);
    return edits.length === 0 || this.edit(edits, label);
  }

  /** Tries again to write what could not be written. */
  retry(): Promise<void> {
    return this.alone(() => this.drain());
  }

  /** Reads what other tabs wrote. */
  refresh(): Promise<void> {
    return this.alone(async () => {
      await this.readOthers().catch((problem) => this.fail(problem));
      await this.drain();
    });
  }

  dismiss(notice: number): void {
    this.notices = this.notices.filter(({ id }) => id !== notice);
    this.publish();
  }

  /** Waits for what is being written, then lets go. */
  async close(): Promise<void> {
    await this.turn;
    this.channel.close();
  }

  private get latest(): Point {
    return this.pending.at(-1)?.after ?? this.confirmed;
  }

  private propose(proposal: Proposal): Promise<boolean> {
    const before = this.latest;
    const next = attempt(() => advance(before, proposal));
    if (!next) {
      this.notify('draft.dropped', proposal.label, 1);
      return Promise.resolve(false);
    }
    if (!joins(before.history, proposal.group)) this.step += 1;
    const written = new Promise<boolean>((done) => this.pending.push({ ...next, done }));
    if (this.work.status === 'saved') this.work = SAVING;
    this.publish();
    void this.alone(() => this.drain());
    return written;
  }

  /** One at a time: writing, reading and making versions. */
  private alone<T>(work: () => Promise<T>): Promise<T> {
    const mine = this.turn.then(work);
    this.turn = mine.catch(() => {});
    return mine;
  }

  /**
   * Writes all that waits, in order.
   * @param adopt makes an appraisal of a document shown, even where nothing waits
   */
  private async drain(adopt = false): Promise<void> {
    let freed = false;
    while (this.pending.length > 0 || (adopt && !this.appraisal)) {
      const batch = [...this.pending];
      try {
        await this.write(batch);
        this.settle(batch);
      } catch (problem) {
        try {
          if (isTaken(problem) && (await this.readOthers())) continue;
          if (storeCode(problem) === 'store.full' && !freed) {
            // Results can be had again: they make room for work.
            freed = true;
            await this.db.results.clear();
            continue;
          }
        } catch (another) {
          return this.fail(another);
        }
        return this.fail(problem);
      }
    }
    if (this.work.status === 'saving') this.tell(SAVED);
  }

  private async write(batch: readonly Pending[]): Promise<void> {
    const { db, origin } = this;
    const title = titleOf(batch.at(-1)?.after.document);
    const author = this.appraisal ? '' : ((await getSetting('author', db)) ?? '');
    const made = this.appraisal || !origin ? null : makeAppraisal(origin, author, Date.now());
    const row = this.appraisal ?? made?.appraisal;
    if (!row) throw new StoreError('store.deleted');
    const { id } = row;
    await db.transaction('rw', db.appraisals, db.versions, db.journal, async () => {
      // Asked for together: each wait between would leave what was typed unwritten for longer.
      const known = made ? addAppraisal(db, made).then(() => true) : db.appraisals.get(id);
      const rows = batch.map(({ row: step }) => db.journal.add({ ...step, appraisal: id }));
      const [found] = await Promise.all([known, ...rows]);
      if (!found) throw new StoreError('store.deleted');
      if (title && title !== row.title) await db.appraisals.update(id, { title });
    });
    this.appraisal = title ? { ...row, title } : row;
  }

  private settle(batch: readonly Pending[]): void {
    this.confirmed = batch.at(-1)?.after ?? this.confirmed;
    this.pending = this.pending.slice(batch.length);
    this.work = this.pending.length > 0 ? SAVING : SAVED;
    this.publish();
    this.tellOthers();
    for (const { done } of batch) done(true);
  }

  /**
   * Takes in what other tabs wrote, and puts what waits on top.
   * @returns whether there was anything
   */
  private async readOthers(): Promise<boolean> {
    if (!this.appraisal) return false;
    const { id } = this.appraisal;
    const { db, confirmed } = this;
    const [appraisal, theirs] = await db.transaction('r', db.appraisals, db.journal, () =>
      Promise.all([db.appraisals.get(id), journalOf(db, id, confirmed.seq)]),
    );
    if (!appraisal) throw new StoreError('store.deleted');
    this.appraisal = appraisal;
    if (theirs.length > 0) this.takeIn(theirs);
    if (this.work.status === 'failed' && this.pending.length === 0) this.work = SAVED;
    this.publish();
    return theirs.length > 0;
  }

  private takeIn(theirs: readonly JournalRow[]): void {
    const { point, unreadable } = replay(this.confirmed, theirs);
    const edits = theirs.flatMap((row) => row.edits);
    const { pending, dropped, covering } = rebase(point, this.pending, edits);
    this.confirmed = point;
    this.pending = [...pending];
    this.step += 1;
    if (unreadable > 0) this.notify('draft.unreadable', '', unreadable);
    for (const { row } of covering) this.notify('draft.covered', row.label, 1);
    for (const { row, done } of dropped) {
      this.notify('draft.dropped', row.label, 1);
      done(false);
    }
  }

  /** Null where another tab has moved on meanwhile. */
  private async addVersion(message: string): Promise<VersionRow | null> {
    const { db, appraisal, confirmed } = this;
    if (!appraisal) throw new StoreError('store.deleted');
    const { id, head } = appraisal;
    const document = await completed(confirmed.document);
    const author = (await getSetting('author', db)) ?? '';
    const facts = { appraisal: id, parents: [head], author, message, time: Date.now() };
    const version = makeVersion({ ...facts, document });
    const moved = { head: version.digest, draftBase: version.digest, draftSeq: confirmed.seq };
    const result = await db.transaction('rw', db.appraisals, db.versions, db.journal, async () => {
      const now = await db.appraisals.get(id);
      if (!now) throw new StoreError('store.deleted');
      const behind = await journalOf(db, id, confirmed.seq);
      if (now.head !== head || behind.length > 0) return null;
      const current = await db.versions.get(head);
      if (current?.documentDigest === version.documentDigest) return current;
      await db.versions.add(version);
      await db.appraisals.update(id, moved);
      return version;
    });
    if (result === version) this.appraisal = { ...appraisal, ...moved };
    this.publish();
    this.tellOthers();
    return result;
  }

  private fail(problem: unknown): void {
    this.tell({ status: 'failed', code: storeCode(problem) });
    for (const { done } of this.pending) done(false);
  }

  private tellOthers(): void {
    if (this.appraisal) this.channel.tell({ appraisal: this.appraisal.id });
  }

  private notify(code: Notice['code'], label: string, count: number): void {
    this.noticed += 1;
    this.notices = [...this.notices, { id: this.noticed, code, label, count }];
    this.publish();
  }

  private tell(work: Work): void {
    this.work = work;
    this.publish();
  }

  private publish(): void {
    this.state = this.look();
    for (const listener of this.listeners) listener();
  }

  private look(): SessionState {
    const { appraisal, step, work, notices, latest } = this;
    const { undo, redo } = latest.history;
    return {
      appraisal,
      document: latest.document,
      step,
      undo: undo && { label: undo.top.label },
      redo: redo && { label: redo.top.label },
      changed: latest.seq > (appraisal?.draftSeq ?? 0),
      work,
      notices,
    };
  }
}

export function useSessionState(session: Session): SessionState {
  return useSyncExternalStore(session.subscribe, session.getState);
}

/** Null where a draft has none that could be shown in a list. */
function titleOf(document: ModelDocument | undefined): string | null {
  const title: unknown = document?.question?.title;
  return typeof title === 'string' && title.trim() !== '' ? title : null;
}
