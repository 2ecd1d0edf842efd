import { builtinModules } from 'node:module';
import { posix } from 'node:path';
import { type Import, importsOf } from './imports.ts';
import type { Finding, SourceFile } from './source-files.ts';

/** What each folder at the top may import besides itself; folders not named may import all. */
const TOP: Readonly<Record<string, readonly string[]>> = {
  src: ['shared'],
  server: ['shared'],
  shared: [],
};

/** What each part of shared/ may import besides itself: the arrows run one way. */
const SHARED: Readonly<Record<string, readonly string[]>> = {
  model: [],
  formula: ['model'],
  engine: ['model', 'formula'],
  analysis: ['model', 'formula', 'engine'],
  export: ['model', 'formula', 'engine', 'analysis'],
  sync: ['model'],
  db: ['model'],
  examples: ['model'],
  cli: ['model', 'formula', 'engine', 'analysis', 'export', 'sync', 'db', 'examples'],
};

/** Packages that run the same in a browser, on the hub and on the command line. */
const PORTABLE = [
  /^zod(\/|$)/,
  /^jsep(\/|$)/,
  /^canonicalize$/,
  /^fflate$/,
  /^papaparse$/,
  /^pure-rand(\/|$)/,
  /^ml-matrix$/,
  /^@noble\/hashes(\/|$)/,
  /^@stdlib\//,
];
const PORTABLE_IN: Readonly<Record<string, readonly RegExp[]>> = { db: [/^drizzle-orm(\/|$)/] };

/** Imports that cross a boundary the wrong way. */
export function boundaryFindings(file: SourceFile): Finding[] {
  return importsOf(file).flatMap((one) => {
    const code = breach(file.path, one);
    return code ? [{ code, path: file.path, line: one.line, detail: one.specifier }] : [];
  });
}

function breach(path: string, { specifier }: Import): string | undefined {
  if (!specifier.startsWith('.')) return packageBreach(path, specifier);
  const target = posix.join(posix.dirname(path), specifier);
  return topBreach(path, target) ?? sharedBreach(path, target) ?? featureBreach(path, target);
}

function topBreach(path: string, target: string): string | undefined {
  const from = part(path, 0);
  const to = part(target, 0);
  const allowed = TOP[from];
  if (!allowed || from === to || allowed.includes(to)) return undefined;
  // The version in package.json is data that the server and the app may read.
  return target === 'package.json' && from !== 'shared' ? undefined : 'boundary.top';
}

function sharedBreach(path: string, target: string): string | undefined {
  if (part(path, 0) !== 'shared' || part(target, 0) !== 'shared') return undefined;
  const from = part(path, 1);
  const to = part(target, 1);
  if (from === to) return undefined;
  return SHARED[from]?.includes(to) ? undefined : 'boundary.shared';
}

function featureBreach(path: string, target: string): string | undefined {
  if (!path.startsWith('src/features/') || !target.startsWith('src/features/')) return undefined;
  return part(path, 2) === part(target, 2) ? undefined : 'boundary.feature';
}

function packageBreach(path: string, specifier: string): string | undefined {
  const top = part(path, 0);
  if (top === 'src') return isNode(specifier) ? 'boundary.node' : undefined;
  const area = part(path, 1);
  if (top !== 'shared' || area === 'cli') return undefined;
  if (isNode(specifier)) return 'boundary.node';
  const allowed = [...PORTABLE, ...(PORTABLE_IN[area] ?? [])];
  return allowed.some((pattern) => pattern.test(specifier)) ? undefined : 'boundary.package';
}

function isNode(specifier: string): boolean {
  return specifier.startsWith('node:') || builtinModules.includes(specifier.split('/')[0] ?? '');
}

function part(path: string, index: number): string {
  return path.split('/')[index] ?? '';
}
