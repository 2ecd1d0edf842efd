/** The Uncertainty step with the network off: its table is the command line's. */
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it, onTestFinished } from 'vitest';
import example from '../../shared/examples/keeping-hearts-well.json' with { type: 'json' };
import { en } from '../../src/i18n/en.ts';
import { readAnswer, says } from './support/answer.ts';
import { launchBrowser } from './support/browser.ts';
import { appraise } from './support/command-line.ts';
import { startSite } from './support/site.ts';
import { readyOffline, visit } from './support/visit.ts';

const SLUG = 'keeping-hearts-well';
const THRESHOLD = 1_500;

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
});

it('opens with no network, and its acceptability table says what the command line does', async () => {
  const site = await startSite();
  const { page, context, problems } = await visit(browser, { reducedMotion: 'reduce' });
  onTestFinished(async () => {
    await context.close();
    await site.close();
  });
  await page.goto(site.origin);
  await readyOffline(page);
  await context.setOffline(true);
  await site.close();
  await page.reload();
  await page.getByRole('link', { name: example.question.title }).click();
  await readAnswer(page);
  await page.getByRole('link', { name: en.steps.uncertainty }).click();

  const figure = page
    .locator('section')
    .filter({ has: page.getByRole('heading', { name: /highest chance of being best/ }) });
  await figure.locator('svg').first().waitFor();
  await figure.getByRole('button', { name: en.frontier.table }).click();
  const row = figure.getByRole('row').filter({
    has: page.getByRole('rowheader', { name: THRESHOLD.toLocaleString('en'), exact: true }),
  });
  const cells = await row.getByRole('cell').allTextContents();
  const { psa } = await appraise(SLUG, THRESHOLD);
  psa.strategies.forEach(({ probabilityBest }, index) => {
    expect(cells[index]).toSatisfy((text: string) => says(text, probabilityBest));
  });
  expect(problems).toEqual([]);
});
