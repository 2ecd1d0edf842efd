import { expect, test } from 'vitest';
import { FORMAT_VERSION } from '../../shared/model/document.ts';
import { MIGRATIONS, type Migration, migrate } from '../../shared/model/migrate.ts';

// Made-up steps: format version 1 is the first, so there are no real ones yet.
const steps: Migration[] = [
  { from: 2, to: 3, migrate: ({ name, ...rest }) => ({ ...rest, title: name }) },
  { from: 1, to: 2, migrate: (value) => ({ ...value, name: `${value.label}!` }) },
];

test('steps are taken in order of version, whatever their order in the list', () => {
  const { value } = migrate({ formatVersion: 1, label: 'a', kept: [1] }, 1, 3, steps);
  expect(value).toEqual({ formatVersion: 3, label: 'a', kept: [1], title: 'a!' });
});

test('the value given is not changed', () => {
  const value = Object.freeze({ formatVersion: 1, label: 'a' });
  migrate(value, 1, 3, steps);
  expect(value).toEqual({ formatVersion: 1, label: 'a' });
});

test('the present version needs no step', () => {
  const value = { formatVersion: 3 };
  expect(migrate(value, 3, 3, steps)).toEqual({ value, issue: null });
});

test('a gap between steps refuses the document', () => {
  expect(migrate({ formatVersion: 1 }, 1, 3, steps.slice(0, 1)).issue).toMatchObject({
    code: 'document.olderFormat',
    path: ['formatVersion'],
    params: { got: 1, known: 3 },
  });
});

test('no step leads past the version asked for', () => {
  expect(migrate({ formatVersion: 1 }, 1, 2, steps).value).toMatchObject({ formatVersion: 2 });
  const leap: Migration = { from: 1, to: 4, migrate: (value) => value };
  expect(migrate({ formatVersion: 1 }, 1, 3, [leap]).issue?.code).toBe('document.olderFormat');
});

test('the real steps lead from version 1 to the present one', () => {
  expect(migrate({}, 1, FORMAT_VERSION, MIGRATIONS).issue).toBeNull();
});
