/** Checks the built app against its size budget; run after the build. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import {
  FIRST_ROUTE_LIMIT,
  gzippedBytes,
  notPrecached,
  PRECACHE_LIMIT,
  plainBytes,
  precachedFiles,
  scriptsOf,
} from './checks/size.ts';

/** The page and the route that `/` shows. */
const FIRST_ROUTE = ['index.html', 'src/routes/appraisals/page.tsx'];

const dist = fileURLToPath(new URL('../dist', import.meta.url));
const manifest = JSON.parse(readFileSync(join(dist, '.vite/manifest.json'), 'utf8'));
const scripts = scriptsOf(manifest, FIRST_ROUTE);
const precached = precachedFiles(readFileSync(join(dist, 'sw.js'), 'utf8'));
const missing = notPrecached(dist, precached);

const within = [
  judge('first route, script gzipped', gzippedBytes(dist, scripts), FIRST_ROUTE_LIMIT),
  judge('precache', plainBytes(dist, precached), PRECACHE_LIMIT),
];
for (const file of missing) console.error(`not in the precache: ${file}`);
console.log(`${precached.length} files precached, ${missing.length} missing from it`);
const good = within.every(Boolean) && missing.length === 0 && precached.length > 0;
process.exitCode = good ? 0 : 1;

function judge(what: string, bytes: number, limit: number): boolean {
  const kilobytes = (size: number) => `${(size / 1024).toFixed(1)} KB`;
  console.log(`${what}: ${kilobytes(bytes)} of ${kilobytes(limit)}`);
  return bytes <= limit;
}
