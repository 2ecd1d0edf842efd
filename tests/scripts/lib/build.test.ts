import { utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { digestOf } from '../../../scripts/lib/build.mjs';
import { folderWith } from '../../setup/hub.ts';

it('knows sources by their content, not by their time', () => {
  const folder = folderWith({ 'src/a.ts': '1', 'src/deep/b.ts': '2', 'index.html': '' });
  const sources = [join(folder, 'src'), join(folder, 'index.html'), join(folder, 'missing')];
  const before = digestOf(sources);
  utimesSync(join(folder, 'src/a.ts'), 1, 1);
  expect(digestOf(sources)).toBe(before);
  writeFileSync(join(folder, 'src/deep/b.ts'), '3');
  expect(digestOf(sources)).not.toBe(before);
});

it('sees a file that is new or gone', () => {
  const folder = folderWith({ 'src/a.ts': '1' });
  const before = digestOf([join(folder, 'src')]);
  writeFileSync(join(folder, 'src/c.ts'), '');
  expect(digestOf([join(folder, 'src')])).not.toBe(before);
});
