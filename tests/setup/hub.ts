import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { onTestFinished } from 'vitest';
import { openDatabase } from '../../server/db.ts';

/** A folder of its own for a test, removed after it. */
export function temporaryFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), 'steelyard-test-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

/** A real database in a folder of its own, closed after the test. */
export function temporaryDatabase() {
  const database = openDatabase(temporaryFolder());
  onTestFinished(() => database.close());
  return database;
}

/** A folder with the files given, by path and content. */
export function folderWith(files: Readonly<Record<string, string>>): string {
  const folder = temporaryFolder();
  for (const [path, content] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), content);
  }
  return folder;
}
