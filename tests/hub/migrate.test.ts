import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import SQLite from 'better-sqlite3';
import { expect, it, onTestFinished } from 'vitest';
import { appliedMigrations, migrateDatabase } from '../../server/migrate.ts';
import { folderWith, temporaryFolder } from '../setup/hub.ts';

/** Teams with members; then a rebuild of teams as the generator writes it. */
const PARENTS = `CREATE TABLE team (id integer PRIMARY KEY, name text);
--> statement-breakpoint
CREATE TABLE member (id integer PRIMARY KEY,
  team integer NOT NULL REFERENCES team(id) ON DELETE CASCADE);`;
const REBUILD = `PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE __new_team (id integer PRIMARY KEY, name text NOT NULL);
--> statement-breakpoint
INSERT INTO __new_team SELECT id, name FROM team;--> statement-breakpoint
DROP TABLE team;--> statement-breakpoint
ALTER TABLE __new_team RENAME TO team;--> statement-breakpoint
PRAGMA foreign_keys=ON;`;

function migrations(...files: string[]): string {
  const entries = files.map((_, idx) => ({
    idx,
    version: '6',
    when: 1_000 * (idx + 1),
    tag: `000${idx}_step`,
    breakpoints: true,
  }));
  const journal = { version: '7', dialect: 'sqlite', entries };
  const named = files.map((text, idx) => [`000${idx}_step.sql`, text]);
  return folderWith({
    'meta/_journal.json': JSON.stringify(journal),
    ...Object.fromEntries(named),
  });
}

/** A database with the first step applied, two teams and three members. */
function populated() {
  const folder = temporaryFolder();
  const sqlite = new SQLite(join(folder, 'hub.sqlite'));
  onTestFinished(() => void sqlite.close());
  sqlite.pragma('foreign_keys = ON');
  const backups = join(folder, 'backups');
  migrateDatabase(sqlite, migrations(PARENTS), backups);
  sqlite.exec("INSERT INTO team VALUES (1, 'North'), (2, 'South')");
  sqlite.exec('INSERT INTO member VALUES (1, 1), (2, 1), (3, 2)');
  return { sqlite, backups };
}

function count(sqlite: SQLite.Database, table: string): unknown {
  return sqlite.prepare(`SELECT count(*) FROM ${table}`).pluck().get();
}

it('keeps every row when a parent table is rebuilt', () => {
  const { sqlite, backups } = populated();
  migrateDatabase(sqlite, migrations(PARENTS, REBUILD), backups);
  expect(count(sqlite, 'team')).toBe(2);
  expect(count(sqlite, 'member')).toBe(3);
  expect(appliedMigrations(sqlite)).toEqual([1_000, 2_000]);
  expect(sqlite.pragma('foreign_keys', { simple: true })).toBe(1);
});

it('copies the data before it changes them, and only then', () => {
  const { sqlite, backups } = populated();
  const both = migrations(PARENTS, REBUILD);
  migrateDatabase(sqlite, both, backups);
  migrateDatabase(sqlite, both, backups);
  const [copy, ...others] = readdirSync(backups);
  expect(others).toEqual([]);
  const before = new SQLite(join(backups, copy ?? ''), { readonly: true });
  onTestFinished(() => void before.close());
  expect(count(before, 'member')).toBe(3);
  expect(appliedMigrations(before)).toEqual([1_000]);
});

it.each([
  ['a statement that fails', `DELETE FROM member;--> statement-breakpoint\nDROP TABLE nothing;`],
  ['rows that lose their parents', 'DELETE FROM team WHERE id = 1;'],
])('changes nothing at all after %s', (_name, step) => {
  const { sqlite, backups } = populated();
  expect(() => migrateDatabase(sqlite, migrations(PARENTS, step), backups)).toThrow();
  expect(count(sqlite, 'team')).toBe(2);
  expect(count(sqlite, 'member')).toBe(3);
  expect(appliedMigrations(sqlite)).toEqual([1_000]);
  expect(sqlite.pragma('foreign_keys', { simple: true })).toBe(1);
});

it('says as a code which rows would lose their parents', () => {
  const { sqlite, backups } = populated();
  const folder = migrations(PARENTS, 'DELETE FROM team WHERE id = 1;');
  expect(() => migrateDatabase(sqlite, folder, backups)).toThrow(
    expect.objectContaining({ code: 'database.orphans', params: { rows: 2, table: 'member' } }),
  );
});

it('refuses a database that a newer version has migrated', () => {
  const { sqlite, backups } = populated();
  migrateDatabase(sqlite, migrations(PARENTS, REBUILD), backups);
  expect(() => migrateDatabase(sqlite, migrations(PARENTS), backups)).toThrow('database.newer');
});
