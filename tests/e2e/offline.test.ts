/**
 * The main job in a real browser: first visit, network off, and the whole way from the
 * list to an answer, whose numbers must be the command line's.
 */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it, onTestFinished } from 'vitest';
import example from '../../shared/examples/keeping-hearts-well.json' with { type: 'json' };
import { answerOf, poise, readAnswer, says } from './support/answer.ts';
import { launchBrowser } from './support/browser.ts';
import { appraise } from './support/command-line.ts';
import { startSite } from './support/site.ts';
import { readyOffline, strangers, visit } from './support/visit.ts';

const SLUG = 'keeping-hearts-well';
const { question } = example;

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
});

/** Where the poise stands, as assistive technology is told. */
async function thresholdOn(page: Page): Promise<number> {
  return Number(await poise(page).getAttribute('aria-valuenow'));
}

/** The same numbers to the last bits, and the text that says them, rounded. */
async function expectCommandLinesAnswer(page: Page): Promise<void> {
  const { values, texts } = await readAnswer(page);
  const said = answerOf(await appraise(SLUG, await thresholdOn(page)), question.comparator);
  expect(values.best).toBe(said.best);
  for (const figure of ['netBenefit', 'probabilityBest', 'evpi'] as const) {
    expect(Math.abs(values[figure] - said[figure])).toBeLessThanOrEqual(
      1e-9 * Math.abs(said[figure]),
    );
    expect(texts[figure]).toSatisfy((text: string) => says(text, said[figure]));
  }
}

it('answers with no network after the first visit, as the command line does', async () => {
  const site = await startSite();
  const { page, context, problems, requests } = await visit(browser);
  onTestFinished(async () => {
    await context.close();
    await site.close();
  });
  await page.goto(site.origin);
  await readyOffline(page);

  await context.setOffline(true);
  await site.close();
  await page.reload();
  await page.getByRole('link', { name: question.title }).click();
  await readAnswer(page);

  const first = await thresholdOn(page);
  await expectCommandLinesAnswer(page);

  await poise(page).focus();
  for (const key of ['ArrowRight', 'ArrowRight', 'PageUp']) await page.keyboard.press(key);
  const byKey = await thresholdOn(page);
  expect(byKey).toBeGreaterThan(first);
  await expectCommandLinesAnswer(page);

  await dragPoise(page, -80);
  const byMouse = await thresholdOn(page);
  expect(byMouse).toBeLessThan(byKey);
  await expectCommandLinesAnswer(page);

  expect(strangers(requests, site.origin)).toEqual([]);
  expect(problems).toEqual([]);
});

async function dragPoise(page: Page, pixels: number): Promise<void> {
  const box = await poise(page).boundingBox();
  if (!box) throw new Error('the poise is not on the page');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + pixels, y, { steps: 8 });
  await page.mouse.up();
}
