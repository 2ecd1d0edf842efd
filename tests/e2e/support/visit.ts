import type { Browser, BrowserContext, BrowserContextOptions, Page } from 'playwright-core';

/** A tab, and what went wrong or went out while it was open. */
export interface Visit {
  readonly page: Page;
  readonly context: BrowserContext;
  /** Console errors and warnings, uncaught errors, answers of 400 or more. */
  readonly problems: string[];
  /** Addresses asked for, by the page, its workers or its service worker. */
  readonly requests: string[];
}

/** A browser profile of its own with one tab, watched from its first request on. */
export async function visit(browser: Browser, options: BrowserContextOptions = {}): Promise<Visit> {
  const context = await browser.newContext({ locale: 'en-GB', ...options });
  const problems: string[] = [];
  const requests: string[] = [];
  context.on('console', (message) => {
    const type = message.type();
    if (type === 'error' || type === 'warning') problems.push(`${type}: ${message.text()}`);
  });
  context.on('weberror', (error) => problems.push(`uncaught: ${error.error().message}`));
  context.on('request', (request) => requests.push(request.url()));
  context.on('response', (response) => {
    if (response.status() >= 400) problems.push(`${response.status()}: ${response.url()}`);
  });
  return { page: await context.newPage(), context, problems, requests };
}

/** Addresses that are not the site's own; what the page makes itself (data:, blob:) is. */
export function strangers(requests: readonly string[], origin: string): string[] {
  return requests.filter((url) => !/^(data|blob):/.test(url) && new URL(url).origin !== origin);
}

/** Waits until the service worker has fetched everything and answers for this page. */
export async function readyOffline(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const { active } = await navigator.serviceWorker.ready;
    if (active?.state !== 'activated') {
      await new Promise<void>((resolve) =>
        active?.addEventListener('statechange', () => active.state === 'activated' && resolve()),
      );
    }
  });
  await page.reload();
  await page.waitForFunction(() => navigator.serviceWorker.controller !== null);
}
