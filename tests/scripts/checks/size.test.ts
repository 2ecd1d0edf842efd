import { expect, it } from 'vitest';
import {
  gzippedBytes,
  notPrecached,
  plainBytes,
  precachedFiles,
  scriptsOf,
} from '../../../scripts/checks/size.ts';
import { folderWith } from '../../setup/hub.ts';

const MANIFEST = {
  'index.html': { file: 'assets/index.js', imports: ['_react.js'] },
  '_react.js': { file: 'assets/react.js' },
  'src/routes/list.tsx': { file: 'assets/list.js', imports: ['_react.js', '_table.js'] },
  '_table.js': { file: 'assets/table.js', imports: ['_react.js'] },
  'src/routes/charts.tsx': { file: 'assets/charts.js' },
};

it('counts each script of the first route once, with all that it imports', () => {
  expect(scriptsOf(MANIFEST, ['index.html', 'src/routes/list.tsx'])).toEqual([
    'assets/index.js',
    'assets/react.js',
    'assets/list.js',
    'assets/table.js',
  ]);
});

it('fails on a route that the build does not know', () => {
  expect(() => scriptsOf(MANIFEST, ['src/routes/renamed.tsx'])).toThrow('renamed');
});

it.each([
  'precacheAndRoute([{url:"index.html",revision:"a"},{url:"assets/b.js",revision:null}],{})',
  `precacheAndRoute([{'revision':'a','url':'/index.html'},{"url":"assets/b.js"}])`,
])('reads the addresses of a precache manifest: %s', (text) => {
  expect(precachedFiles(text)).toEqual(['index.html', 'assets/b.js']);
});

it('names a worker, a font or wasm that is not fetched ahead', () => {
  const dist = folderWith({
    'index.html': '',
    'sw.js': '',
    'assets/index.js': '',
    'assets/worker.js': '',
    'assets/text.woff2': '',
    'assets/kernels.wasm': '',
  });
  const missing = notPrecached(dist, ['index.html', 'assets/index.js']);
  expect(missing.sort()).toEqual(['assets/kernels.wasm', 'assets/text.woff2', 'assets/worker.js']);
});

it('weighs files as they lie and as they travel', () => {
  const dist = folderWith({ 'a.js': 'x'.repeat(10_000), 'b.js': 'y' });
  expect(plainBytes(dist, ['a.js', 'b.js'])).toBe(10_001);
  expect(gzippedBytes(dist, ['a.js', 'b.js'])).toBeLessThan(200);
});
