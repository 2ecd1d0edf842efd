/** What axe can find, and what a phone shows, on the list and in an opened appraisal. */
import { AxeBuilder } from '@axe-core/playwright';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it, onTestFinished } from 'vitest';
import { readAnswer } from './support/answer.ts';
import { launchBrowser } from './support/browser.ts';
import { type Site, startSite } from './support/site.ts';
import { strangers, visit } from './support/visit.ts';

const APPRAISAL = '/appraisals/keeping-hearts-well';
const PAGES = [
  '/',
  `${APPRAISAL}/results`,
  `${APPRAISAL}/uncertainty`,
  `${APPRAISAL}/question`,
  `${APPRAISAL}/evidence`,
  `${APPRAISAL}/model/states`,
  `${APPRAISAL}/model/movements`,
  `${APPRAISAL}/model/payoffs`,
];

let browser: Browser;
let site: Site;
beforeAll(async () => {
  browser = await launchBrowser();
  site = await startSite();
});
afterAll(async () => {
  await browser?.close();
  await site?.close();
});

/** Opens a page and waits until it shows all that it will. */
async function opened(path: string, options: Parameters<typeof visit>[1]) {
  const visited = await visit(browser, { reducedMotion: 'reduce', ...options });
  onTestFinished(() => visited.context.close());
  await visited.page.goto(site.origin + path);
  await visited.page.getByRole('heading', { level: 1 }).first().waitFor();
  if (path.startsWith(APPRAISAL)) await readAnswer(visited.page);
  return visited;
}

// The rules: WCAG 2.2 AA and axe's best practices, as axe-core tests them.
it.each(
  PAGES.flatMap((path) => (['light', 'dark'] as const).map((theme) => [path, theme] as const)),
)('axe finds nothing on %s in the %s theme', async (path, colorScheme) => {
  const { page, problems } = await opened(path, { colorScheme });
  const { violations } = await new AxeBuilder({ page }).analyze();
  const told = violations.map(({ id, nodes }) => `${id}: ${nodes.map((one) => one.html).join()}`);
  expect(told).toEqual([]);
  expect(problems).toEqual([]);
});

it.each(PAGES)('%s does not scroll sideways on a phone of 360 px', async (path) => {
  const { page } = await opened(path, { viewport: { width: 360, height: 740 } });
  const wide = await page.evaluate(() => document.documentElement.scrollWidth);
  expect(wide).toBeLessThanOrEqual(360);
});

it('asks nothing of anybody else, whichever page is opened', async () => {
  const { page, requests } = await opened('/', {});
  for (const path of PAGES) await page.goto(site.origin + path);
  expect(strangers(requests, site.origin)).toEqual([]);
});
