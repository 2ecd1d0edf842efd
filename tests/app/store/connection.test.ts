import { renderHook, waitFor } from '@testing-library/react';
import Dexie from 'dexie';
import { describe, expect, it, onTestFinished } from 'vitest';
import { setConnection, useConnection } from '../../../src/store/connection.ts';
import { freshName, madeAppraisal, openTab, sessionOf, setTitle } from './support.ts';

describe('a newer application in another tab', () => {
  it('gets the database; this tab lets go, says so, and keeps its edits in memory', async () => {
    const name = freshName();
    const db = openTab(name);
    const session = await sessionOf(db, await madeAppraisal(db));
    const { result } = renderHook(() => useConnection());
    expect(result.current).toBe('open');
    const newer = new Dexie(name);
    onTestFinished(() => newer.close());
    newer.version(2).stores({
      appraisals: 'id, openedAt',
      versions: 'digest, appraisal',
      journal: '[appraisal+seq], appraisal',
      results: '[document+settings+engine], used',
      settings: 'key',
      another: 'id',
    });
    await newer.open();
    await waitFor(() => expect(result.current).toBe('outdated'));
    expect(await session.edit(setTitle('Kept in memory'), 'Title')).toBe(false);
    const { work, document } = session.getState();
    expect(work).toEqual({ status: 'failed', code: 'store.outdated' });
    expect(document.question.title).toBe('Kept in memory');
    setConnection('open');
    newer.close();
    // An old application that comes after is told the same.
    await expect(madeAppraisal(openTab(name))).rejects.toMatchObject({ code: 'store.outdated' });
  });
});

describe('an older application in another tab', () => {
  it('that does not let go is told of', async () => {
    const name = freshName();
    const older = new Dexie(name);
    older.version(0.1).stores({ appraisals: 'id' });
    older.on('versionchange', () => false);
    await older.open();
    const db = openTab(name);
    const { result } = renderHook(() => useConnection());
    const opening = db.open();
    await waitFor(() => expect(result.current).toBe('blocked'));
    older.close();
    await opening;
    await waitFor(() => expect(result.current).toBe('open'));
  });
});
