import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { inRepository } from './paths.mjs';
import { runPackage } from './run.mjs';

/** All that the built app is made of. */
const SOURCES = [
  'src',
  'shared',
  'public',
  'index.html',
  'vite.config.ts',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];
/** Written last, inside dist: a build that was cut short is built again. */
const STAMP = inRepository('dist', '.built-from');

/** One digest of every source's path and content. */
export function digestOf(paths) {
  const hash = createHash('sha256');
  for (const file of paths.flatMap(filesUnder)) {
    hash.update(`${file}\0`).update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/** Builds the app unless dist was built from these very sources; throws when it fails. */
export function build() {
  const digest = digestOf(SOURCES.map((source) => inRepository(source)));
  if (existsSync(STAMP) && readFileSync(STAMP, 'utf8') === digest) return;
  console.log('Building the app …');
  const done = runPackage('vite/bin/vite.js', ['build', '--logLevel', 'warn']);
  if (!done) throw new Error('vite build failed: see its messages above.');
  writeFileSync(STAMP, digest);
}

function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  const names = readdirSync(path).sort();
  return names.flatMap((name) => filesUnder(join(path, name)));
}
