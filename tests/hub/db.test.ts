import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import SQLite from 'better-sqlite3';
import { expect, it } from 'vitest';
import { openDatabase } from '../../server/db.ts';
import { hub } from '../../shared/db/hub.ts';
import { temporaryDatabase, temporaryFolder } from '../setup/hub.ts';

it('is set for power cuts and for keeping parents: WAL, full sync, foreign keys', () => {
  const { sqlite } = temporaryDatabase();
  expect(sqlite.pragma('journal_mode', { simple: true })).toBe('wal');
  expect(sqlite.pragma('synchronous', { simple: true })).toBe(2);
  expect(sqlite.pragma('foreign_keys', { simple: true })).toBe(1);
  expect(sqlite.pragma('busy_timeout', { simple: true })).toBe(5000);
});

it('gives the hub one identity, kept from start to start', () => {
  const folder = temporaryFolder();
  const first = openDatabase(folder);
  const [made] = first.orm.select().from(hub).all();
  first.close();
  const second = openDatabase(folder);
  const rows = second.orm.select().from(hub).all();
  second.close();
  expect(rows).toEqual([made]);
  expect(made?.id).toMatch(/^[0-9a-f-]{36}$/);
  expect(readdirSync(folder)).not.toContain('backups');
});

it('makes a data folder that is not there', () => {
  const folder = join(temporaryFolder(), 'a', 'b');
  openDatabase(folder).close();
  expect(readdirSync(folder)).toContain('hub.sqlite');
});

it('lets the table hold no second hub', () => {
  const { sqlite } = temporaryDatabase();
  const add = sqlite.prepare("INSERT INTO hub VALUES (2, 'x', '0', '2026-01-01T00:00:00Z')");
  expect(() => add.run()).toThrow(/hub_one_row/);
});

it('has the same tables as the schema says (the migrations are not behind it)', () => {
  const { sqlite } = temporaryDatabase();
  const columns = sqlite.pragma('table_info(hub)') as { name: string; notnull: number }[];
  expect(columns.map((one) => one.name)).toEqual(['row', 'id', 'created_version', 'created_at']);
  expect(columns.every((one) => one.notnull === 1)).toBe(true);
});

it('leaves a file that is no database as it was and throws', () => {
  const folder = temporaryFolder();
  const other = new SQLite(join(folder, 'hub.sqlite'));
  other.exec('CREATE TABLE __drizzle_migrations (id, hash, created_at)');
  other.exec("INSERT INTO __drizzle_migrations VALUES (1, 'x', 99999999999999)");
  other.close();
  expect(() => openDatabase(folder)).toThrow('database.newer');
});
