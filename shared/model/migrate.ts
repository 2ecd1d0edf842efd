import { error, type Issue } from './issue.ts';

export type PlainObject = Readonly<Record<string, unknown>>;

/** One step from a format version to a later one: pure, on plain JSON, before validation. */
export interface Migration {
  readonly from: number;
  /** Above `from`. */
  readonly to: number;
  readonly migrate: (value: PlainObject) => PlainObject;
}

/** The steps that this version knows. Format version 1 is the first: none yet. */
export const MIGRATIONS: readonly Migration[] = [];

export type MigrationResult =
  | { readonly value: PlainObject; readonly issue: null }
  | { readonly value: null; readonly issue: Issue };

/**
 * Brings a document from format version `from` to version `to`, a step at a time,
 * and writes the reached version into `formatVersion`. Fails with
 * `document.olderFormat` where a step is missing.
 */
export function migrate(
  value: PlainObject,
  from: number,
  to: number,
  steps: readonly Migration[] = MIGRATIONS,
): MigrationResult {
  let current = value;
  let version = from;
  while (version < to) {
    const step = steps.find((each) => each.from === version && each.to > version && each.to <= to);
    if (!step) {
      const params = { got: from, known: to };
      return { value: null, issue: error('document.olderFormat', ['formatVersion'], params) };
    }
    current = { ...step.migrate(current), formatVersion: step.to };
    version = step.to;
  }
  return { value: current, issue: null };
}
