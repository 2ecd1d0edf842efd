import { expect, it } from 'vitest';
import { purityFindings } from '../../../scripts/checks/purity.ts';

function details(path: string, text: string): string[] {
  return purityFindings({ path, text }).map((one) => one.detail);
}

it.each([
  ['const x = Math.random();', 'Math.random'],
  ['const now = Date\n  .now();', 'Date.now'],
  ['const pick = Math.random;', 'Math.random'],
  ['const now = new Date();', 'Date()'],
])('finds chance or the clock in shared/: %s', (text, detail) => {
  expect(details('shared/engine/draw.ts', text)).toEqual([detail]);
});

it.each(['eval("1")', 'new Function("return 1")', 'Function("return 1")'])(
  'finds text run as code anywhere: %s',
  (text) => {
    expect(details('src/main.tsx', text)).toHaveLength(1);
  },
);

it('lets a date given, words in comments and the command line pass', () => {
  expect(details('shared/model/x.ts', '// never Math.random()\nnew Date(0);')).toEqual([]);
  expect(details('shared/cli/appraise.ts', 'Date.now();')).toEqual([]);
  expect(details('src/main.tsx', 'Math.random();')).toEqual([]);
});
