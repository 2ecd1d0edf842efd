import { afterEach, describe, expect, it } from 'vitest';
import { setConnection } from '../../../src/store/connection.ts';
import { isTaken, StoreError, storeCode } from '../../../src/store/store-error.ts';

const named = (name: string, inner?: unknown) => Object.assign(new Error(name), { name, inner });

afterEach(() => setConnection('open'));

describe('what the database throws', () => {
  it.each([
    ['a full device', new DOMException('', 'QuotaExceededError'), 'store.full'],
    // A transaction that fails when it is committed says why only inside.
    ['full at commit', named('AbortError', named('QuotaExceededError')), 'store.full'],
    ['no database', named('DatabaseClosedError', named('MissingAPIError')), 'store.unavailable'],
    ['barred', named('OpenFailedError', named('SecurityError')), 'store.unavailable'],
    ['a newer schema', named('VersionError'), 'store.outdated'],
    ['one of ours', new StoreError('store.deleted'), 'store.deleted'],
    ['another', named('DataError'), 'store.failed'],
    ['no error at all', undefined, 'store.failed'],
  ])('%s', (_, problem, code) => {
    expect(storeCode(problem)).toBe(code);
  });

  it('after letting go for a newer application', () => {
    expect(storeCode(named('DatabaseClosedError'))).toBe('store.failed');
    setConnection('outdated');
    expect(storeCode(named('DatabaseClosedError'))).toBe('store.outdated');
  });

  it('where the number is taken', () => {
    expect(isTaken(named('AbortError', named('ConstraintError')))).toBe(true);
    expect(isTaken(named('AbortError'))).toBe(false);
  });
});
