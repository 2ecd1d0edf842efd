/**
 * A tab that was open when a new version was put on the hub, whose files of the former
 * version are gone: it goes on working, starts a worker too, and is asked, not swapped.
 */
import { cpSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { expect, it, onTestFinished } from 'vitest';
import { en } from '../../src/i18n/en.ts';
import { temporaryFolder } from '../setup/hub.ts';
import { readAnswer } from './support/answer.ts';
import { launchBrowser } from './support/browser.ts';
import { DIST, startSite } from './support/site.ts';
import { readyOffline, visit } from './support/visit.ts';

/** The same build under other names, as if every file had changed. */
function nextBuild(): string {
  const next = temporaryFolder();
  cpSync(DIST, next, { recursive: true });
  const assets = join(next, 'assets');
  const names = readdirSync(assets).map((name) => [name, name.replace(/(\.\w+)$/, 'next$1')]);
  for (const [name = '', renamed = ''] of names)
    renameSync(join(assets, name), join(assets, renamed));
  const rename = (text: string) =>
    names.reduce((now, [name = '', renamed = '']) => now.replaceAll(name, renamed), text);
  const texts = readdirSync(assets).filter((name) => /\.(js|css)$/.test(name));
  for (const file of ['index.html', 'sw.js', ...texts.map((name) => join('assets', name))]) {
    const path = join(next, file);
    writeFileSync(path, rename(readFileSync(path, 'utf8')));
  }
  const worker = join(next, 'sw.js');
  const written = readFileSync(worker, 'utf8').replaceAll(/revision:"(\w+)"/g, 'revision:"next$1"');
  writeFileSync(worker, written);
  return next;
}

it('lets an open tab finish its work with its own version, and asks', async () => {
  const site = await startSite();
  const browser = await launchBrowser();
  onTestFinished(async () => {
    await browser.close();
    await site.close();
  });
  const { page, problems } = await visit(browser);
  await page.goto(site.origin);
  await readyOffline(page);
  const before = await scriptsOf(page);

  site.deploy(nextBuild());
  await page.evaluate(async () => (await navigator.serviceWorker.ready).update());
  const take = page.getByRole('button', { name: en.update.take });
  await take.waitFor();
  await page.getByRole('link').filter({ hasText: 'Keeping hearts well' }).click();
  await readAnswer(page);
  expect(await scriptsOf(page)).toEqual(before);

  await take.click();
  await page.waitForFunction(() =>
    [...document.scripts].some((script) => /next\.js$/.test(script.src)),
  );
  await readAnswer(page);
  expect(problems).toEqual([]);
});

function scriptsOf(page: Page): Promise<string[]> {
  return page.evaluate(() => [...document.scripts].map((script) => script.src));
}
