/**
 * The printed page in a real browser: for every example, in both languages and on both
 * papers, one page with everything on it, and the numbers of the command line.
 */
import { readFileSync } from 'node:fs';
import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it, onTestFinished } from 'vitest';
import { type Appraisal, appraise } from '../../shared/analysis/appraise.ts';
import { prepare } from '../../shared/engine/engine.ts';
import { EXAMPLE_SLUGS } from '../../shared/examples/slugs.ts';
import { naturalFrequency } from '../../shared/export/brief/frequency.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { readDocument } from '../../shared/model/read.ts';
import { thresholdInForce } from '../../shared/model/threshold.ts';
import { en } from '../../src/i18n/en.ts';
import { answerStrip, says } from './support/answer.ts';
import { launchBrowser } from './support/browser.ts';
import { type Site, startSite } from './support/site.ts';
import { visit } from './support/visit.ts';

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

/** Opens the step and waits until the page is whole: draws and words are there. */
async function opened(slug: string, options: Parameters<typeof visit>[1] = {}) {
  const visited = await visit(browser, {
    reducedMotion: 'reduce',
    viewport: { width: 1440, height: 900 },
    ...options,
  });
  onTestFinished(() => visited.context.close());
  const { page } = visited;
  await page.goto(`${site.origin}/appraisals/${slug}/brief`);
  await page.locator('.sheet [data-figure="best"]').first().waitFor({ timeout: 90_000 });
  await page.evaluate(() => document.fonts.ready);
  return visited;
}

async function chosen(page: Page, language: string, paper: string): Promise<void> {
  await page.getByLabel(en.brief.language).selectOption(language);
  await page.getByLabel(en.brief.paper, { exact: true }).selectOption(paper);
  await page.locator(`.sheet[lang="${language}"][data-paper="${paper}"]`).waitFor();
}

/** Size of the paper in points, and how many pages there are. */
async function printed(page: Page) {
  const pdf = (await page.pdf({ preferCSSPageSize: true })).toString('latin1');
  const [, width, height] = /\/MediaBox\s*\[\s*0 0 ([\d.]+) ([\d.]+)/.exec(pdf) ?? [];
  return {
    pages: pdf.match(/\/Type\s*\/Page\b/g)?.length,
    width: Math.round(Number(width)),
    height: Math.round(Number(height)),
  };
}

/** How far anything reaches beyond the sheet or into its margins of 12 mm, in px. */
function overflow(page: Page): Promise<number> {
  return page.locator('.sheet').evaluate((sheet) => {
    const margin = (12 / 25.4) * 96;
    const box = sheet.getBoundingClientRect();
    const beyond = [...sheet.querySelectorAll('*:not(svg *)')].map((element) => {
      if (element.closest('.sheet-watermark')) return 0;
      const { left, right, top, bottom, width } = element.getBoundingClientRect();
      if (width === 0) return 0;
      return Math.max(
        box.left + margin - left,
        right - (box.right - margin),
        box.top + margin - top,
        bottom - (box.bottom - margin),
      );
    });
    return Math.max(
      sheet.scrollHeight - sheet.clientHeight,
      sheet.scrollWidth - sheet.clientWidth,
      ...beyond,
    );
  });
}

/** What a cell of the table holds: its value and its text; null where it holds words. */
async function figure(page: Page, strategy: string, name: string) {
  const cell = page.locator(`.sheet tr[data-strategy="${strategy}"] [data-figure="${name}"]`);
  if ((await cell.count()) === 0) return null;
  return { value: Number(await cell.getAttribute('value')), text: await cell.textContent() };
}

async function expectNumbers(page: Page, said: Appraisal, isEnglish: boolean): Promise<void> {
  for (const { id, cost, outcome, icer } of said.strategies) {
    for (const [name, value] of Object.entries({ cost, outcome, icer })) {
      const shown = await figure(page, id, name);
      if (value === null) expect([id, name, shown]).toEqual([id, name, null]);
      else {
        expect(Math.abs((shown?.value ?? Number.NaN) - value)).toBeLessThan(1e-9 * Math.abs(value));
        if (isEnglish) expect(says(shown?.text ?? '', value)).toBe(true);
      }
    }
    const chance = said.psa?.strategies.find((each) => each.id === id)?.probabilityBest;
    const best = await figure(page, id, 'best');
    expect(best?.value).toBe(naturalFrequency(chance ?? Number.NaN).count);
  }
}

function exampleDocument(slug: string): ModelDocument {
  const file = new URL(`../../shared/examples/${slug}.json`, import.meta.url);
  const { document } = readDocument(readFileSync(file, 'utf8'));
  if (!document) throw new Error(`${slug} cannot be read`);
  return document;
}

// Points of each paper: ISO 216 (210 x 297 mm); ANSI/ASME Y14.1 (8.5 x 11 in).
const PAPERS = { a4: [595, 842], letter: [612, 792] } as const;

describe.each(EXAMPLE_SLUGS)('%s', (slug) => {
  const document = exampleDocument(slug);
  const threshold = thresholdInForce(document.question);
  const settings = { ...document.analysis, threshold };

  it('is one page in each language on each paper, with the command line’s numbers', async () => {
    const engine = prepare(document);
    const said = appraise(document, engine, settings);
    const base = appraise(document, engine, { ...settings, samples: 0 });
    const { page, problems } = await opened(slug);
    for (const language of ['en', 'fr']) {
      for (const [paper, [width, height]] of Object.entries(PAPERS)) {
        await chosen(page, language, paper);
        const sheet = page.locator('.sheet');
        expect([language, paper, await sheet.getAttribute('data-fits')]).toEqual([
          ...[language, paper, 'true'],
        ]);
        expect(await overflow(page)).toBeLessThanOrEqual(1);
        const pdf = await printed(page);
        expect(pdf.pages).toBe(1);
        expect(Math.abs(pdf.width - width)).toBeLessThanOrEqual(1);
        expect(Math.abs(pdf.height - height)).toBeLessThanOrEqual(1);
      }
      await expectNumbers(page, said, language === 'en');
    }
    const foot = page.locator('.sheet footer');
    expect(await foot.getAttribute('data-document')).toBe(said.document);
    expect(await foot.getAttribute('data-results')).toBe(base.digest);
    expect(await page.locator('.sheet-watermark').count()).toBe(0);
    expect(problems).toEqual([]);
  });
});

const SLUG = 'keeping-hearts-well';

it('prints the page and nothing else', async () => {
  const { page } = await opened(SLUG);
  await page.emulateMedia({ media: 'print' });
  // What cannot be seen has no role.
  expect(await answerStrip(page).count()).toBe(0);
  expect(await page.getByRole('navigation').count()).toBe(0);
  expect(await page.locator('.sheet').isVisible()).toBe(true);
  expect(await page.getByRole('button', { name: en.brief.print }).isVisible()).toBe(false);
  expect(await page.locator('.sheet').textContent()).toContain(en.brief.head.invented);
});

it('carries a sentence in a person’s own words, and takes the draft again', async () => {
  const { page } = await opened(SLUG);
  const answer = page.locator('.sheet-answer p').first();
  const drafted = (await answer.textContent()) ?? '';
  const field = page.getByRole('textbox', { name: /^Sentence 1 of “The answer”$/ });
  await field.fill('Yes, where nurses can be found.');
  await field.blur();
  await page.locator('.sheet-answer', { hasText: 'where nurses can be found' }).waitFor();
  // The draft is journalled: it stands after a reload, at the appraisal's own address.
  await page.waitForURL((url) => !url.pathname.includes(SLUG));
  await page.reload();
  await page.locator('.sheet-answer', { hasText: 'where nurses can be found' }).waitFor();
  await page.getByRole('button', { name: en.brief.edit.again }).click();
  await page.locator('.sheet-answer', { hasText: drafted }).waitFor();
});

it.each(['light', 'dark'] as const)('axe finds nothing in the %s theme', async (colorScheme) => {
  const { page, problems } = await opened(SLUG, { colorScheme });
  const { violations } = await new AxeBuilder({ page }).analyze();
  const told = violations.map(({ id, nodes }) => `${id}: ${nodes.map((one) => one.html).join()}`);
  expect(told).toEqual([]);
  expect(problems).toEqual([]);
});

it('does not scroll sideways on a phone of 360 px', async () => {
  const { page } = await opened(SLUG, { viewport: { width: 360, height: 740 } });
  const wide = await page.evaluate(() => document.documentElement.scrollWidth);
  expect(wide).toBeLessThanOrEqual(360);
});
