import { renderHook, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import {
  createAppraisal,
  deleteAppraisal,
  duplicateAppraisal,
  listAppraisals,
  renameAppraisal,
  restoreAppraisal,
  useAppraisals,
} from '../../../src/store/appraisals.ts';
import { database } from '../../../src/store/database.ts';
import { putSetting } from '../../../src/store/device-settings.ts';
import { openAppraisal } from '../../../src/store/open-sessions.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { breakWrites, freshName, openTab, sessionOf, setValue, until, valueIn } from './support.ts';

const origin = { document: tinyDocument(), source: 'empty' } as const;

describe('an appraisal', () => {
  it('is made with its first version, signed by the author of this device', async () => {
    const db = openTab();
    await putSetting('author', 'Ada', db);
    const row = await createAppraisal(origin, db);
    expect(row).toMatchObject({ title: origin.document.question.title, author: 'Ada' });
    const version = await db.versions.get(row.head);
    expect(version).toMatchObject({ parents: [], author: 'Ada', appraisal: row.id });
    expect(version?.documentDigest).toBe(digestOf(origin.document));
  });

  it('fills in what the document leaves out', async () => {
    const db = openTab();
    const { groups: _, ...bare } = tinyDocument();
    const row = await createAppraisal({ ...origin, document: bare as never }, db);
    expect((await db.versions.get(row.head))?.document.groups).toEqual([]);
  });

  it('is renamed by an edit of its question', async () => {
    const db = openTab();
    const { id } = await createAppraisal(origin, db);
    await renameAppraisal(id, 'Renamed', 'Rename', db);
    expect((await listAppraisals(db)).map(({ title }) => title)).toEqual(['Renamed']);
    const session = await sessionOf(db, id);
    expect(session.getState().undo?.label).toBe('Rename');
    await session.undo();
    expect((await db.appraisals.get(id))?.title).toBe(origin.document.question.title);
    await expect(renameAppraisal('nobody', 'X', 'Rename', db)).rejects.toMatchObject({
      code: 'store.deleted',
    });
  });

  it('is copied as its draft stands', async () => {
    const db = openTab();
    const { id } = await createAppraisal(origin, db);
    await (await openAppraisal(id, db))?.edit(setValue('p_die', 0.3), 'Value');
    const copy = await duplicateAppraisal(id, 'A copy', db);
    expect(copy).toMatchObject({ title: 'A copy', source: `copy:${id}` });
    const session = await sessionOf(db, copy.id);
    expect(valueIn(session.getState().document, 'p_die')).toBe(0.3);
    expect((await listAppraisals(db)).length).toBe(2);
  });

  it('is deleted whole, told to who has it open, and brought back as it was', async () => {
    const name = freshName();
    const db = openTab(name);
    const { id } = await createAppraisal(origin, db);
    const open = await sessionOf(openTab(name), id);
    await open.edit(setValue('p_die', 0.3), 'Value');
    const deleted = await deleteAppraisal(id, db);
    expect(await Promise.all([db.versions.count(), db.journal.count()])).toEqual([0, 0]);
    await until(() => open.getState().work.status === 'failed');
    expect(open.getState().work).toEqual({ status: 'failed', code: 'store.deleted' });
    expect(await open.edit(setValue('p_die', 0.4), 'Value')).toBe(false);
    expect(await db.journal.count()).toBe(0);
    expect(await deleteAppraisal(id, db)).toBeNull();
    if (deleted) await restoreAppraisal(deleted, db);
    await until(() => open.getState().work.status === 'saved');
    expect(valueIn((await sessionOf(db, id)).getState().document, 'p_die')).toBe(0.4);
  });

  it('cannot be made on a full device: a coded error, and nothing half written', async () => {
    const db = openTab();
    breakWrites(db, (table) =>
      table === 'versions' ? new DOMException('full', 'QuotaExceededError') : null,
    );
    await expect(createAppraisal(origin, db)).rejects.toMatchObject({ code: 'store.full' });
    expect(await listAppraisals(db)).toEqual([]);
  });

  it('shows up in the live list', async () => {
    const { result } = renderHook(() => useAppraisals());
    expect(result.current).toEqual({ status: 'reading' });
    await waitFor(() => expect(result.current).toEqual({ status: 'read', appraisals: [] }));
    const row = await createAppraisal(origin);
    await waitFor(() => expect(result.current).toEqual({ status: 'read', appraisals: [row] }));
    await database().delete();
  });
});
