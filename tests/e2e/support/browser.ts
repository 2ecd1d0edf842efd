import { existsSync } from 'node:fs';
import { type Browser, chromium } from 'playwright-core';

const CHROMIUM = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium';

/** Nothing that the browser does by itself may look like something the page does. */
const ARGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-quic',
];

/** Starts a real Chromium; fails with what to install when there is none. */
export async function launchBrowser(): Promise<Browser> {
  if (!existsSync(CHROMIUM)) {
    throw new Error(
      `No Chromium at ${CHROMIUM}: install it (sudo apt-get install chromium) or set CHROMIUM_PATH.`,
    );
  }
  return chromium.launch({ executablePath: CHROMIUM, args: ARGS });
}
