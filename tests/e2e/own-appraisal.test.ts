/**
 * Work of one's own in a real browser: begun, edited and found again with no network,
 * beside another tab, and after the tab was killed in the middle of typing.
 */
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it, onTestFinished } from 'vitest';
import example from '../../shared/examples/keeping-hearts-well.json' with { type: 'json' };
import { en } from '../../src/i18n/en.ts';
import { answerStrip, readAnswer } from './support/answer.ts';
import { launchBrowser } from './support/browser.ts';
import { startSite } from './support/site.ts';
import { readyOffline, visit } from './support/visit.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(async () => {
  await browser?.close();
});

const box = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true });
const saved = (page: Page) => page.getByText(en.shell.saved).waitFor();

/** A first visit, then no network; the list is open. */
async function offline() {
  const site = await startSite();
  const { page, context, problems } = await visit(browser);
  onTestFinished(async () => {
    await context.close();
    await site.close();
  });
  await page.goto(site.origin);
  await readyOffline(page);
  await context.setOffline(true);
  return { page, context, problems };
}

async function beginFromTemplate(page: Page): Promise<void> {
  await page.getByRole('button', { name: en.begin.templates['two-state'].name }).click();
  await box(page, en.framing.title).waitFor();
}

/** A tab of the same profile, at the same address. */
async function secondTab(context: BrowserContext, page: Page): Promise<Page> {
  const second = await context.newPage();
  await second.goto(page.url());
  await box(second, en.framing.title).waitFor();
  return second;
}

it('is begun from a template, edited, and all there after a reload, with no network', async () => {
  const { page, problems } = await offline();
  await beginFromTemplate(page);
  const first = await readAnswer(page);

  await box(page, en.framing.title).fill('Which water filter?');
  await box(page, en.question.horizon).fill('10');
  await page.getByRole('button', { name: en.framing.addStrategy }).click();
  await box(page, en.framing.strategyName.replace('{{number}}', '3')).fill('A third way');
  await saved(page);
  const address = page.url();
  const edited = await readAnswer(page);
  expect(edited.values.evpi).not.toBe(first.values.evpi);

  await page.reload();
  expect(page.url()).toBe(address);
  expect(await box(page, en.framing.title).inputValue()).toBe('Which water filter?');
  expect(await box(page, en.question.horizon).inputValue()).toBe('10');
  expect(await readAnswer(page)).toEqual(edited);

  // The name, the strategy, the horizon, the title: one step each, across the reload.
  for (let step = 0; step < 4; step++) await page.keyboard.press('Control+z');
  await expect.poll(() => box(page, en.question.horizon).inputValue()).toBe('20');
  expect(await readAnswer(page)).toEqual(first);

  await page.getByRole('link', { name: en.rail.all }).click();
  await page.getByRole('heading', { name: en.own.title }).waitFor();
  expect(problems).toEqual([]);
});

it('says what is broken, and shows no number until it is mended', async () => {
  const { page } = await offline();
  await beginFromTemplate(page);
  await readAnswer(page);
  await box(page, en.framing.share).fill('40');
  await page.getByText(en.strip.broken).waitFor();
  expect(await answerStrip(page).count()).toBe(0);
  await page.getByRole('button', { name: en.framing.scale }).click();
  await readAnswer(page);
});

it('makes an example one’s own at the first edit, and goes back to its first version', async () => {
  const { page, problems } = await offline();
  const { title } = example.question;
  await page.getByRole('link', { name: title }).click();
  await page.getByRole('link', { name: en.steps.question }).click();
  const first = await readAnswer(page);
  await box(page, en.framing.title).focus();
  await page.keyboard.press('End');
  await page.keyboard.type(', again');
  expect(await box(page, en.framing.title).inputValue()).toBe(`${title}, again`);
  await box(page, en.question.horizon).fill('15');
  await saved(page);
  expect(page.url()).not.toContain('keeping-hearts-well');
  expect((await readAnswer(page)).values).not.toEqual(first.values);

  await page.getByRole('link', { name: en.steps.history }).click();
  await box(page, en.history.message).fill('A shorter horizon');
  await page.getByRole('button', { name: en.history.save, exact: true }).click();
  await page.getByText(en.history.saved).waitFor();
  await page.getByRole('button', { name: `${en.history.compare}: ${en.history.first}` }).click();
  await page.getByText(en.history.fields.horizon, { exact: true }).waitFor();
  await page.getByRole('button', { name: `${en.history.goBack}: ${en.history.first}` }).click();
  await expect.poll(() => readAnswer(page)).toEqual(first);
  expect(problems).toEqual([]);
});

it('keeps what two tabs write, and loses the work of neither', async () => {
  const { page, context } = await offline();
  await beginFromTemplate(page);
  await saved(page);
  const second = await secondTab(context, page);

  await box(page, en.question.population).fill('Written in the first tab');
  await box(second, en.question.setting).fill('Written in the second tab');
  await Promise.all([saved(page), saved(second)]);
  for (const tab of [page, second]) {
    const shown = (name: string) => box(tab, name).inputValue();
    await expect.poll(() => shown(en.question.population)).toBe('Written in the first tab');
    await expect.poll(() => shown(en.question.setting)).toBe('Written in the second tab');
  }
});

const TEXT = 'How should fever be treated where no doctor is?';
/** Keystrokes after which the tab is killed: seeded once, spread over the text. */
const MOMENTS = [1, 7, 18, 29, 46];
/** Milliseconds between keystrokes at 100 words a minute. */
const PACE = 120;

it('loses at most the last keystroke when the tab is killed in the middle of typing', async () => {
  const { page: list, context } = await offline();
  const home = list.url();
  for (const count of MOMENTS) {
    const page = await context.newPage();
    await page.goto(home);
    await beginFromTemplate(page);
    await box(page, en.framing.decision).focus();
    for (const character of TEXT.slice(0, count)) {
      await page.keyboard.type(character);
      await page.waitForTimeout(PACE);
    }
    await page.keyboard.type(TEXT.charAt(count));
    const address = page.url();
    await crash(page);

    const again = await context.newPage();
    await again.goto(address);
    const kept = await box(again, en.framing.decision).inputValue();
    expect(TEXT.startsWith(kept)).toBe(true);
    expect(kept.length).toBeGreaterThanOrEqual(count);
    await again.close();
  }
});

/** The renderer is gone at once: nothing of the page runs any more. */
async function crash(page: Page): Promise<void> {
  const gone = new Promise((resolve) => page.once('crash', resolve));
  const session = await page.context().newCDPSession(page);
  void session.send('Page.crash').catch(() => {});
  await gone;
  await page.close();
}
