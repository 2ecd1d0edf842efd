import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { showDocument } from '../../../src/store/open-sessions.ts';
import type { Session } from '../../../src/store/session.ts';
import { listVersions } from '../../../src/store/versions.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import {
  breakWrites,
  freshName,
  madeAppraisal,
  openTab,
  sessionOf,
  setTitle,
  setValue,
  until,
  valueIn,
} from './support.ts';

const value = (session: Session, id = 'p_die') => valueIn(session.getState().document, id);

describe('an edit', () => {
  it('is in force at once, saving, then saved', async () => {
    const db = openTab();
    const session = await sessionOf(db, await madeAppraisal(db));
    const written = session.edit(setValue('p_die', 0.2), 'Value');
    expect(value(session)).toBe(0.2);
    expect(session.getState().work).toEqual({ status: 'saving' });
    expect(await written).toBe(true);
    expect(session.getState().work).toEqual({ status: 'saved' });
    expect(session.getState().changed).toBe(true);
  });

  it('is there after a reload, with all that came before it', async () => {
    const name = freshName();
    const db = openTab(name);
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    const writes = [0.2, 0.3, 0.4].map((p) => session.edit(setValue('p_die', p), 'Value'));
    await Promise.all([...writes, session.edit(setTitle('Another'), 'Title')]);
    const again = await sessionOf(openTab(name), id);
    expect(value(again)).toBe(0.4);
    expect(again.getState().appraisal?.title).toBe('Another');
    expect(digestOf(again.getState().document)).toBe(digestOf(session.getState().document));
  });

  it('that does not fit is left out and told', async () => {
    const db = openTab();
    const session = await sessionOf(db, await madeAppraisal(db));
    expect(await session.edit(setValue('nobody', 1), 'Value of nobody')).toBe(false);
    const { document, notices } = session.getState();
    expect(digestOf(document)).toBe(digestOf(tinyDocument()));
    expect(notices).toMatchObject([{ code: 'draft.dropped', label: 'Value of nobody' }]);
    session.dismiss(notices[0]?.id ?? 0);
    expect(session.getState().notices).toEqual([]);
  });

  it('tells who listens, once they listen and no longer', async () => {
    const db = openTab();
    const session = await sessionOf(db, await madeAppraisal(db));
    let told = 0;
    const leave = session.subscribe(() => {
      told += 1;
    });
    await session.edit(setValue('p_die', 0.2), 'Value');
    expect(told).toBeGreaterThan(1);
    leave();
    const before = told;
    await session.edit(setValue('p_die', 0.3), 'Value');
    expect(told).toBe(before);
  });
});

describe('undo and redo', () => {
  it('go back to the first digest and forth again, across reloads', async () => {
    const name = freshName();
    const db = openTab(name);
    const id = await madeAppraisal(db);
    let session = await sessionOf(db, id);
    const digests = [digestOf(session.getState().document)];
    for (const p of [0.2, 0.3, 0.4]) {
      await session.edit(setValue('p_die', p), `to ${p}`);
      digests.push(digestOf(session.getState().document));
    }
    for (const expected of [2, 1, 0]) {
      session = await sessionOf(openTab(name), id);
      expect(session.getState().undo?.label).toBe(`to ${[0.2, 0.3, 0.4][expected]}`);
      expect(await session.undo()).toBe(true);
      expect(digestOf(session.getState().document)).toBe(digests[expected]);
    }
    expect(session.getState().undo).toBeNull();
    expect(await session.undo()).toBe(false);
    for (const expected of [1, 2, 3]) {
      session = await sessionOf(openTab(name), id);
      expect(await session.redo()).toBe(true);
      expect(digestOf(session.getState().document)).toBe(digests[expected]);
    }
    expect(await session.redo()).toBe(false);
  });

  it('take a group of keystrokes as one step', async () => {
    const name = freshName();
    const db = openTab(name);
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    const { step } = session.getState();
    for (const text of ['A', 'Ab', 'Abc']) {
      await session.edit(setTitle(text), 'Title', { group: 'title:1' });
    }
    await session.edit(setTitle('Xyz'), 'Title', { group: 'title:2' });
    expect(session.getState().step).toBe(step + 2);
    const again = await sessionOf(openTab(name), id);
    await again.undo();
    expect(again.getState().document.question.title).toBe('Abc');
    await again.undo();
    expect(again.getState().document.question.title).toBe(tinyDocument().question.title);
    await again.redo();
    expect(again.getState().document.question.title).toBe('Abc');
  });

  it('forget what was undone once something new is done', async () => {
    const db = openTab();
    const session = await sessionOf(db, await madeAppraisal(db));
    await session.edit(setValue('p_die', 0.2), 'Value');
    await session.undo();
    expect(session.getState().redo?.label).toBe('Value');
    await session.edit(setTitle('New'), 'Title');
    expect(session.getState().redo).toBeNull();
  });
});

describe('a version', () => {
  it('has the one before as its parent, and undo goes past it', async () => {
    const name = freshName();
    const db = openTab(name);
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    const first = session.getState().appraisal?.head;
    await session.edit(setValue('p_die', 0.2), 'Value');
    const version = await session.saveVersion('Higher risk');
    expect(version).toMatchObject({ parents: [first], message: 'Higher risk', appraisal: id });
    expect(version.documentDigest).toBe(digestOf(session.getState().document));
    expect(session.getState()).toMatchObject({
      changed: false,
      appraisal: { head: version.digest },
    });
    const again = await sessionOf(openTab(name), id);
    expect(value(again)).toBe(0.2);
    await again.undo();
    expect(value(again)).toBe(0.1);
    expect(again.getState().changed).toBe(true);
    expect(value(await sessionOf(openTab(name), id))).toBe(0.1);
  });

  it('that would say the same is the current one', async () => {
    const db = openTab();
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    await session.edit(setValue('p_die', 0.2), 'Value');
    await session.undo();
    const version = await session.saveVersion('Nothing');
    expect(version.digest).toBe(session.getState().appraisal?.head);
    expect(await listVersions(id, db)).toHaveLength(1);
  });

  it('is gone back to by an edit, which can be undone', async () => {
    const db = openTab();
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    const first = session.getState().appraisal?.head ?? '';
    await session.edit(setValue('p_die', 0.2), 'Value');
    await session.saveVersion('Second');
    await session.edit(setTitle('Unsaved'), 'Title');
    const before = digestOf(session.getState().document);
    expect(await session.goBackTo(first, 'Back to the first')).toBe(true);
    expect(digestOf(session.getState().document)).toBe(digestOf(tinyDocument()));
    const third = await session.saveVersion('As it was');
    expect(third.documentDigest).toBe((await db.versions.get(first))?.documentDigest);
    expect(third.digest).not.toBe(first);
    await session.undo();
    expect(digestOf(session.getState().document)).toBe(before);
    await expect(session.goBackTo('no such', 'Back')).rejects.toMatchObject({
      code: 'store.failed',
    });
  });
});

describe('a document that is only shown', () => {
  it('becomes an appraisal with the first edit', async () => {
    const db = openTab();
    const session = showDocument('tiny', { document: tinyDocument(), source: 'example:tiny' }, db);
    expect(await db.appraisals.count()).toBe(0);
    expect(session.getState().appraisal).toBeNull();
    await session.edit(setValue('p_die', 0.2), 'Value');
    const { appraisal } = session.getState();
    expect(appraisal).toMatchObject({ source: 'example:tiny', draftSeq: 0 });
    expect(value(await sessionOf(db, appraisal?.id ?? ''))).toBe(0.2);
  });

  it('can be made a version as it stands', async () => {
    const db = openTab();
    const session = showDocument('tiny', { document: tinyDocument(), source: 'example:tiny' }, db);
    const version = await session.saveVersion('As found');
    expect(version.digest).toBe(session.getState().appraisal?.head);
  });
});

describe('a store that fails', () => {
  it('keeps the edits in memory, says that it is full, and writes them when it can', async () => {
    const name = freshName();
    const db = openTab(name);
    const id = await madeAppraisal(db);
    let full = true;
    const quota = new DOMException('full', 'QuotaExceededError');
    const tab = openTab(name);
    breakWrites(tab, (table) => (full && table === 'journal' ? quota : null));
    const session = await sessionOf(tab, id);
    expect(await session.edit(setValue('p_die', 0.2), 'Value')).toBe(false);
    expect(session.getState().work).toEqual({ status: 'failed', code: 'store.full' });
    expect(await session.edit(setTitle('Kept'), 'Title')).toBe(false);
    await session.undo();
    expect(value(session)).toBe(0.2);
    await expect(session.saveVersion('No')).rejects.toMatchObject({ code: 'store.full' });
    full = false;
    await session.retry();
    expect(session.getState().work).toEqual({ status: 'saved' });
    const again = await sessionOf(db, id);
    expect(digestOf(again.getState().document)).toBe(digestOf(session.getState().document));
    expect(again.getState().redo?.label).toBe('Title');
  });

  it('gives up kept results before it gives up work', async () => {
    const name = freshName();
    const db = openTab(name);
    const id = await madeAppraisal(db);
    await db.results.put({
      document: 'd',
      settings: 's',
      engine: 'e',
      payload: 1,
      size: 1,
      used: 1,
    });
    const tab = openTab(name);
    let refusals = 1;
    breakWrites(tab, (table) => {
      if (table !== 'journal' || refusals === 0) return null;
      refusals -= 1;
      return new DOMException('full', 'QuotaExceededError');
    });
    const session = await sessionOf(tab, id);
    expect(await session.edit(setValue('p_die', 0.2), 'Value')).toBe(true);
    expect(await db.results.count()).toBe(0);
  });

  it('says so where the browser keeps nothing, and work goes on', async () => {
    const db = openTab();
    breakWrites(db, () => new DOMException('barred', 'SecurityError'));
    const session = showDocument('tiny', { document: tinyDocument(), source: 'example:tiny' }, db);
    expect(await session.edit(setValue('p_die', 0.2), 'Value')).toBe(false);
    expect(session.getState()).toMatchObject({
      appraisal: null,
      work: { status: 'failed', code: 'store.unavailable' },
    });
    await session.undo();
    expect(value(session)).toBe(0.1);
    await session.redo();
    expect(value(session)).toBe(0.2);
  });

  it('passes over rows that no longer fit, and says how many', async () => {
    const db = openTab();
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    await session.edit(setValue('p_die', 0.2), 'Value');
    const row = { appraisal: id, seq: 2, edits: setValue('nobody', 1), inverse: [] };
    await db.journal.add({ ...row, label: 'Spoilt', time: 0 });
    const again = await sessionOf(db, id);
    expect(again.getState().notices).toMatchObject([{ code: 'draft.unreadable', count: 1 }]);
    expect(await again.edit(setTitle('On'), 'Title')).toBe(true);
    await until(() => again.getState().work.status === 'saved');
    expect(value(await sessionOf(db, id))).toBe(0.2);
  });
});
