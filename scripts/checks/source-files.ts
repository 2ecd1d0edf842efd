import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import { parseSync } from 'oxc-parser';

/** A source file as the checks see it; `path` is from the root, with forward slashes. */
export interface SourceFile {
  readonly path: string;
  readonly text: string;
}

/** What a check found; `line` counts from 1. */
export interface Finding {
  readonly code: string;
  readonly path: string;
  readonly line: number;
  readonly detail: string;
}

const SOURCE = /\.(ts|tsx|mts|mjs|js)$/;
const SKIPPED = new Set(['node_modules', 'dist', 'data', 'coverage', '.git', '.cache']);

/** Every source file under the folders given, in the order of their paths. */
export function readSources(root: string, folders: readonly string[]): SourceFile[] {
  return folders
    .flatMap((folder) => listFiles(join(root, folder)))
    .filter((file) => SOURCE.test(file))
    .map((file) => ({
      path: relative(root, file).split(sep).join('/'),
      text: readFileSync(file, 'utf8'),
    }))
    .sort((a, b) => (a.path < b.path ? -1 : 1));
}

function listFiles(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    if (SKIPPED.has(entry.name)) return [];
    const path = join(folder, entry.name);
    return entry.isDirectory() ? listFiles(path) : [path];
  });
}

/** The file's syntax tree and module records; a file that does not parse throws. */
export function parseSource(file: SourceFile) {
  const parsed = parseSync(file.path, file.text);
  const [error] = parsed.errors;
  if (error) throw new SyntaxError(`${file.path}: ${error.message}`);
  return parsed;
}

/** The line, from 1, that an offset of the text is on. */
export function lineOf(text: string, offset: number): number {
  return text.slice(0, offset).split('\n').length;
}
