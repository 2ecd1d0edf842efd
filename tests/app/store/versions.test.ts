import { renderHook, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { createAppraisal } from '../../../src/store/appraisals.ts';
import { database } from '../../../src/store/database.ts';
import {
  completed,
  listVersions,
  makeVersion,
  nameVersion,
  readVersion,
  useVersions,
} from '../../../src/store/versions.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { madeAppraisal, openTab, sessionOf, setValue } from './support.ts';

const facts = { appraisal: 'a', author: 'Ada', message: 'm', time: 1, document: tinyDocument() };

describe('a version', () => {
  it('is addressed by all that it says, parents included', () => {
    const one = makeVersion({ ...facts, parents: [] });
    expect(one.documentDigest).toBe(digestOf(tinyDocument()));
    expect(makeVersion({ ...facts, parents: [] }).digest).toBe(one.digest);
    expect(makeVersion({ ...facts, parents: [one.digest] }).digest).not.toBe(one.digest);
    expect(makeVersion({ ...facts, parents: [], message: 'n' }).digest).not.toBe(one.digest);
  });

  it('keeps a name given later, which changes nothing of its identity', async () => {
    const db = openTab();
    const id = await madeAppraisal(db);
    const [first] = await listVersions(id, db);
    const digest = first?.digest ?? '';
    await nameVersion(digest, ' As sent to the committee ', db);
    expect(await readVersion(digest, db)).toEqual({ ...first, name: 'As sent to the committee' });
    await nameVersion(digest, '  ', db);
    expect((await readVersion(digest, db))?.name).toBeUndefined();
    expect(await readVersion('nobody', db)).toBeNull();
  });

  it('has a graph: every parent is there, and comes after its children in the list', async () => {
    const db = openTab();
    const id = await madeAppraisal(db);
    const session = await sessionOf(db, id);
    for (const p of [0.2, 0.3, 0.1]) {
      await session.edit(setValue('p_die', p), 'Value');
      await session.saveVersion(`p ${p}`);
    }
    const versions = await listVersions(id, db);
    expect(versions.map(({ message }) => message)).toEqual(['p 0.1', 'p 0.3', 'p 0.2', '']);
    versions.forEach(({ parents }, index) => {
      const next = versions[index + 1];
      expect(parents).toEqual(next ? [next.digest] : []);
    });
    // The first document came back: another version of it, with the same digest of its own.
    expect(versions[0]?.documentDigest).toBe(versions[3]?.documentDigest);
    for (const { digest, documentDigest, name: _, ...said } of versions) {
      expect(makeVersion(said)).toMatchObject({ digest, documentDigest });
    }
  });

  it('of a broken document is kept as it is', async () => {
    const broken = { ...tinyDocument(), strategies: [] };
    expect(await completed(broken)).toEqual(broken);
  });

  it('shows up in the live list', async () => {
    const row = await createAppraisal({ document: tinyDocument(), source: 'empty' });
    const { result } = renderHook(() => useVersions(row.id));
    await waitFor(() => expect(result.current?.map(({ digest }) => digest)).toEqual([row.head]));
    const none = renderHook(() => useVersions(null));
    await waitFor(() => expect(none.result.current).toEqual([]));
    await database().delete();
  });
});
