import { randomUUID } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import SQLite from 'better-sqlite3';
import { type BetterSQLite3Database, drizzle } from 'drizzle-orm/better-sqlite3';
import { hub } from '../shared/db/hub.ts';
import { migrateDatabase } from './migrate.ts';
import { VERSION } from './version.ts';

export const MIGRATIONS = fileURLToPath(new URL('../drizzle', import.meta.url));

export interface Database {
  readonly orm: BetterSQLite3Database;
  readonly sqlite: SQLite.Database;
  /** Where the database file is, absolute. */
  readonly file: string;
  close(): void;
}

/**
 * Opens the hub's database in the folder given, made when missing, and brings it up
 * to this version. A database that already holds data is copied to `backups/` first.
 * @throws Fault `database.newer` when a newer version has migrated the database.
 */
export function openDatabase(dataFolder: string, migrations = MIGRATIONS): Database {
  mkdirSync(dataFolder, { recursive: true });
  const file = join(dataFolder, 'hub.sqlite');
  const sqlite = new SQLite(file);
  try {
    configure(sqlite);
    migrateDatabase(sqlite, migrations, join(dataFolder, 'backups'));
    const orm = drizzle(sqlite);
    introduce(orm);
    return { orm, sqlite, file, close: () => void sqlite.close() };
  } catch (error) {
    sqlite.close();
    throw error;
  }
}

/** Power cuts are normal: every commit is on the disk before it is answered. */
function configure(sqlite: SQLite.Database): void {
  sqlite.pragma('busy_timeout = 5000');
  sqlite.pragma('journal_mode = WAL');
  sqlite.pragma('synchronous = FULL');
  sqlite.pragma('foreign_keys = ON');
}

/** Gives the hub its identity at the first start; later starts change nothing. */
function introduce(orm: BetterSQLite3Database): void {
  orm
    .insert(hub)
    .values({
      row: 1,
      id: randomUUID(),
      createdVersion: VERSION,
      createdAt: new Date().toISOString(),
    })
    .onConflictDoNothing()
    .run();
}
