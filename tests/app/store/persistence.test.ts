import { afterEach, describe, expect, it, vi } from 'vitest';
import { getSetting } from '../../../src/store/device-settings.ts';
import { askToPersist, readStorageFacts } from '../../../src/store/persistence.ts';
import { madeAppraisal, openTab, sessionOf, setTitle, until } from './support.ts';

function storage(persisted: boolean, granted: boolean) {
  const persist = vi.fn(async () => granted);
  const estimate = async () => ({ usage: 1_000, quota: 50_000 });
  vi.stubGlobal('navigator', { storage: { persisted: async () => persisted, persist, estimate } });
  return persist;
}

afterEach(() => vi.unstubAllGlobals());

describe('lasting storage', () => {
  it('is asked for at the first edit only, and the answer kept', async () => {
    const persist = storage(false, true);
    const db = openTab();
    const session = await sessionOf(db, await madeAppraisal(db));
    expect(persist).not.toHaveBeenCalled();
    await session.edit(setTitle('A'), 'Title');
    await session.edit(setTitle('B'), 'Title');
    await until(() => persist.mock.calls.length > 0);
    await session.edit(setTitle('C'), 'Title');
    expect(persist).toHaveBeenCalledTimes(1);
    const facts = { kept: 'granted', usage: 1_000, quota: 50_000 };
    expect(await getSetting('storage', db)).toMatchObject(facts);
  });

  it('is not asked for where it is granted already', async () => {
    const persist = storage(true, false);
    expect(await askToPersist(openTab())).toMatchObject({ kept: 'granted' });
    expect(persist).not.toHaveBeenCalled();
  });

  it('may be refused, or unknown', async () => {
    storage(false, false);
    expect(await askToPersist(openTab())).toMatchObject({ kept: 'refused' });
    expect(await readStorageFacts()).toMatchObject({ kept: 'refused' });
    vi.stubGlobal('navigator', {});
    expect(await readStorageFacts()).toMatchObject({ kept: 'unknown', quota: null });
  });
});
