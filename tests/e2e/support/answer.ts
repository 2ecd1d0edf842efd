import type { Page } from 'playwright-core';
import { en } from '../../../src/i18n/en.ts';
import { formatMoney, formatProbability } from '../../../src/i18n/format.ts';
import type { CommandLineAnswer } from './command-line.ts';

/** What the answer strip shows, as the reader sees it. */
export interface ShownAnswer {
  readonly best: string;
  readonly netBenefit: string;
  readonly probabilityBest: string;
  readonly evpi: string;
}

export function answerStrip(page: Page) {
  return page.getByRole('region', { name: en.strip.label, exact: true });
}

export function poise(page: Page) {
  return page.getByRole('slider', { name: en.beam.slider });
}

/** Waits for the draws, then reads the strip. */
export async function readAnswer(page: Page): Promise<ShownAnswer> {
  const strip = answerStrip(page);
  const read = async (figure: string) =>
    (await strip.locator(`[data-figure="${figure}"]`).textContent({ timeout: 90_000 })) ?? '';
  return {
    evpi: await read('evpi'),
    best: await read('best'),
    netBenefit: await read('netBenefit'),
    probabilityBest: await read('probabilityBest'),
  };
}

/** The command line's answer, written as the page writes it. */
export function asShown(
  { strategies, psa }: CommandLineAnswer,
  comparator: string,
  symbol: string,
): ShownAnswer {
  const best = strategies.reduce((a, b) => (b.nmb > a.nmb ? b : a));
  const nmbOf = (id: string) => strategies.find((one) => one.id === id)?.nmb ?? Number.NaN;
  const chance = psa.strategies.find((one) => one.id === best.id)?.probabilityBest ?? Number.NaN;
  return {
    best: best.name,
    netBenefit: formatMoney(best.nmb - nmbOf(comparator), symbol, 'en', { signed: true }),
    probabilityBest: formatProbability(chance, 'en'),
    evpi: formatMoney(psa.evpi.perPerson, symbol, 'en'),
  };
}
