/** A database of its own for each test, and the document that is worked on. */
import Dexie from 'dexie';
import { IDBKeyRange, indexedDB } from 'fake-indexeddb';
import { onTestFinished } from 'vitest';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import { createAppraisal } from '../../../src/store/appraisals.ts';
import { AppDatabase } from '../../../src/store/database.ts';
import { readDraft } from '../../../src/store/journal.ts';
import { Session } from '../../../src/store/session.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

// Whatever was imported first: Dexie looks for the browser's own when it loads.
Object.assign(Dexie.dependencies, { indexedDB, IDBKeyRange });

let count = 0;

export function freshName(): string {
  count += 1;
  return `test-${count}`;
}

/** As a tab opens it; several may be open on one name. */
export function openTab(name: string = freshName()): AppDatabase {
  const db = new AppDatabase(name);
  onTestFinished(() => db.close());
  return db;
}

export async function madeAppraisal(db: AppDatabase, document = tinyDocument()): Promise<string> {
  return (await createAppraisal({ document, source: 'empty' }, db)).id;
}

/** The session that a tab would open: never one that is open already. */
export async function sessionOf(db: AppDatabase, id: string): Promise<Session> {
  const kept = await readDraft(db, id);
  if (!kept) throw new Error(`no appraisal ${id}`);
  const session = new Session(db, kept.point, kept.appraisal, null, kept.unreadable);
  onTestFinished(() => session.close());
  return session;
}

/** Sets the base-case value of a parameter. */
export function setValue(id: string, value: number): Edit[] {
  return [{ type: 'set', at: ['parameters', { id }, 'value'], value }];
}

export function setTitle(value: string): Edit[] {
  return [{ type: 'set', at: ['question', 'title'], value }];
}

export function valueIn(document: ModelDocument, id: string): number | undefined {
  return document.parameters.find((parameter) => parameter.id === id)?.value;
}

/** A database whose writes fail in the way given, from when it says. */
export function breakWrites(db: AppDatabase, fault: (table: string) => Error | null): void {
  db.use({
    stack: 'dbcore',
    name: 'broken',
    create: (core) => ({
      ...core,
      table: (name) => {
        const table = core.table(name);
        return {
          ...table,
          mutate: (request) => {
            const error = fault(name);
            return error ? Promise.reject(error) : table.mutate(request);
          },
        };
      },
    }),
  });
}

/** Polls until the check holds. */
export async function until(check: () => boolean): Promise<void> {
  for (let tries = 0; tries < 400; tries++) {
    if (check()) return;
    await new Promise((done) => setTimeout(done, 5));
  }
  throw new Error('it did not come about');
}
