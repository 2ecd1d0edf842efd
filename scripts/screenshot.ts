/**
 * `npm run screenshot`: the pictures in docs/pictures, of the built app as it runs.
 */
import { mkdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Browser, BrowserContextOptions } from 'playwright-core';
import { readAnswer } from '../tests/e2e/support/answer.ts';
import { launchBrowser } from '../tests/e2e/support/browser.ts';
import { startSite } from '../tests/e2e/support/site.ts';

const PICTURES = fileURLToPath(new URL('../docs/pictures/', import.meta.url));
const ADDRESS = '/appraisals/keeping-hearts-well/results';

const SHOTS: Readonly<Record<string, BrowserContextOptions>> = {
  'results.png': { colorScheme: 'light', viewport: { width: 1440, height: 1000 } },
  'results-phone-dark.png': {
    colorScheme: 'dark',
    viewport: { width: 390, height: 844 },
    deviceScaleFactor: 2,
    isMobile: true,
    hasTouch: true,
  },
};

mkdirSync(PICTURES, { recursive: true });
const site = await startSite();
const browser = await launchBrowser();
try {
  for (const [name, options] of Object.entries(SHOTS)) await take(browser, name, options);
} finally {
  await browser.close();
  await site.close();
}

async function take(browser: Browser, name: string, options: BrowserContextOptions) {
  // Without the service worker, whose first word would lie over the page.
  const context = await browser.newContext({
    locale: 'en-GB',
    reducedMotion: 'reduce',
    serviceWorkers: 'block',
    ...options,
  });
  const page = await context.newPage();
  await page.goto(site.origin + ADDRESS);
  await readAnswer(page);
  await page.screenshot({ path: PICTURES + name });
  await context.close();
  console.log(`docs/pictures/${name}`);
}
