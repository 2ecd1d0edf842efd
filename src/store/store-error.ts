/** What can go wrong with the device's store, as codes that the interface words. */
import { getConnection } from './connection.ts';

export type StoreCode =
  /** No room is left. */
  | 'store.full'
  /** The browser keeps nothing here, as in some private windows. */
  | 'store.unavailable'
  /** A newer application in another tab took the database over: reload. */
  | 'store.outdated'
  /** The appraisal was deleted, here or in another tab. */
  | 'store.deleted'
  | 'store.failed';

export class StoreError extends Error {
  readonly code: StoreCode;
  constructor(code: StoreCode, cause?: unknown) {
    super(code, { cause });
    this.name = 'StoreError';
    this.code = code;
  }
}

const UNAVAILABLE = new Set([
  'MissingAPIError',
  'OpenFailedError',
  'SecurityError',
  'InvalidStateError',
  'UnknownError',
]);

/** The code of whatever a database call threw; the cause inside tells more than its wrapper. */
export function storeCode(problem: unknown): StoreCode {
  if (problem instanceof StoreError) return problem.code;
  const names = namesOf(problem);
  if (names.includes('QuotaExceededError')) return 'store.full';
  if (names.includes('DatabaseClosedError') && getConnection() === 'outdated') {
    return 'store.outdated';
  }
  // A newer application has been here: this one cannot read its database.
  if (names.includes('VersionError')) return 'store.outdated';
  if (names.some((name) => UNAVAILABLE.has(name))) return 'store.unavailable';
  return 'store.failed';
}

/** Another tab wrote a row of the same key first. */
export function isTaken(problem: unknown): boolean {
  return namesOf(problem).includes('ConstraintError');
}

function namesOf(problem: unknown): string[] {
  const names: string[] = [];
  let here = problem as { name?: unknown; inner?: unknown } | null | undefined;
  for (let depth = 0; here && depth < 5; depth++) {
    if (typeof here.name === 'string') names.push(here.name);
    here = here.inner as typeof here;
  }
  return names;
}
