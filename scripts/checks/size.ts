import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import { gzipSync } from 'node:zlib';

/** Bytes of script, gzipped, that the first route may need. */
export const FIRST_ROUTE_LIMIT = 250 * 1024;
/** Bytes, as they lie on the disk, that the service worker may fetch ahead. */
export const PRECACHE_LIMIT = 4 * 1024 * 1024;

/** One chunk of Vite's build manifest. */
export interface Chunk {
  readonly file: string;
  readonly imports?: readonly string[];
}
export type BuildManifest = Readonly<Record<string, Chunk>>;

/** What must be there with no network: all that a page or a worker can ask for. */
const NEEDED = /\.(js|mjs|css|woff2?|ttf|otf|wasm)$/;
/** The browser itself keeps the service worker. */
const SERVICE_WORKER = 'sw.js';

/**
 * Script files that the sources given need before they can show anything: their own
 * chunks and what those import statically.
 * @throws Error when the manifest does not name a source: a renamed route must not
 * make the budget pass.
 */
export function scriptsOf(manifest: BuildManifest, sources: readonly string[]): string[] {
  const files = new Set<string>();
  const visit = (key: string) => {
    const chunk = manifest[key];
    if (!chunk) throw new Error(`the build manifest has no chunk for ${key}`);
    if (files.has(chunk.file)) return;
    files.add(chunk.file);
    chunk.imports?.forEach(visit);
  };
  sources.forEach(visit);
  return [...files];
}

/** Bytes of files of `dist`, each gzipped apart, as they travel. */
export function gzippedBytes(dist: string, files: readonly string[]): number {
  const sizes = files.map((file) => gzipSync(readFileSync(join(dist, file))).length);
  return sizes.reduce((sum, size) => sum + size, 0);
}

/** Addresses in the service worker's precache manifest, as workbox writes it. */
export function precachedFiles(serviceWorker: string): string[] {
  return [...serviceWorker.matchAll(/["']?url["']?\s*:\s*["']([^"']+)["']/g)].map(
    (match) => match[1]?.replace(/^\//, '') ?? '',
  );
}

/** Bytes of files of `dist`, as they lie on the disk. */
export function plainBytes(dist: string, files: readonly string[]): number {
  return files.reduce((sum, file) => sum + statSync(join(dist, file)).size, 0);
}

/** Scripts, workers, styles, fonts and wasm of `dist` that are not fetched ahead. */
export function notPrecached(dist: string, precached: readonly string[]): string[] {
  const known = new Set([...precached, SERVICE_WORKER]);
  return listFiles(dist)
    .map((file) => relative(dist, file).split(sep).join('/'))
    .filter((file) => NEEDED.test(file) && !known.has(file));
}

function listFiles(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    return entry.isDirectory() ? listFiles(path) : [path];
  });
}
