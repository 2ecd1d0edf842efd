import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type SQLite from 'better-sqlite3';
import { type MigrationMeta, readMigrationFiles } from 'drizzle-orm/migrator';
import { Fault } from './fault.ts';

/** Drizzle's own ledger, so that its tools can read the database too. */
const LEDGER = '__drizzle_migrations';

/**
 * Applies the migrations in `folder` that the database has not seen, all of them or
 * none. A database that has seen some is first copied to `backups`.
 *
 * Drizzle's own migrator is not used because of foreign keys: the generator's table
 * rebuilds drop the old table, and inside a transaction, where the rebuild tries to
 * switch them off, SQLite ignores the switch and deletes the children with it. Here
 * they are off before the transaction begins, and checked before it ends.
 * @throws Fault `database.newer` when a newer version has migrated the database, or
 * `database.orphans` when rows would lose their parents; then nothing has changed.
 */
export function migrateDatabase(sqlite: SQLite.Database, folder: string, backups: string): void {
  const known = readMigrationFiles({ migrationsFolder: folder });
  const applied = appliedMigrations(sqlite);
  const last = Math.max(0, ...applied);
  if (known.every((one) => one.folderMillis < last)) throw new Fault('database.newer', 500);
  const wanted = known.filter((one) => one.folderMillis > last);
  if (wanted.length === 0) return;
  if (applied.length > 0) backUp(sqlite, backups, applied.length + 1);
  sqlite.pragma('foreign_keys = OFF');
  try {
    sqlite.transaction(() => apply(sqlite, wanted)).exclusive();
  } finally {
    sqlite.pragma('foreign_keys = ON');
  }
}

/** Times of the migrations that the database has seen; none for a new database. */
export function appliedMigrations(sqlite: SQLite.Database): number[] {
  const exists = sqlite
    .prepare("SELECT 1 FROM sqlite_master WHERE type = 'table' AND name = ?")
    .get(LEDGER);
  if (!exists) return [];
  return sqlite.prepare(`SELECT created_at FROM ${LEDGER}`).pluck().all().map(Number);
}

function apply(sqlite: SQLite.Database, migrations: readonly MigrationMeta[]): void {
  sqlite.exec(`CREATE TABLE IF NOT EXISTS ${LEDGER}
    (id INTEGER PRIMARY KEY AUTOINCREMENT, hash text NOT NULL, created_at numeric)`);
  const note = sqlite.prepare(`INSERT INTO ${LEDGER} (hash, created_at) VALUES (?, ?)`);
  for (const migration of migrations) {
    for (const statement of migration.sql) sqlite.exec(statement);
    note.run(migration.hash, migration.folderMillis);
  }
  const orphans = sqlite.pragma('foreign_key_check') as { table: string }[];
  const [first] = orphans;
  if (first) {
    throw new Fault('database.orphans', 500, { rows: orphans.length, table: first.table });
  }
}

function backUp(sqlite: SQLite.Database, backups: string, next: number): void {
  mkdirSync(backups, { recursive: true });
  const stamp = new Date().toISOString().replace(/[:.]/g, '-');
  const file = join(backups, `before-migration-${next}-${stamp}.sqlite`);
  sqlite.prepare('VACUUM INTO ?').run(file);
}
