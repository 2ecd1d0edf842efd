import type { Page } from 'playwright-core';
import { en } from '../../../src/i18n/en.ts';
import type { CommandLineAnswer } from './command-line.ts';

const NUMBERS = ['netBenefit', 'probabilityBest', 'evpi'] as const;
type Numbers = Record<(typeof NUMBERS)[number], number>;

export interface Answer extends Numbers {
  readonly best: string;
}

/** What the answer strip shows: the values behind the text, and the text. */
export interface ShownAnswer {
  readonly values: Answer;
  readonly texts: Record<keyof Numbers, string>;
}

export function answerStrip(page: Page) {
  return page.getByRole('region', { name: en.strip.label, exact: true });
}

export function poise(page: Page) {
  return page.getByRole('slider', { name: en.beam.slider });
}

/** Waits for the draws, then reads the strip. */
export async function readAnswer(page: Page): Promise<ShownAnswer> {
  const figure = (name: string) => answerStrip(page).locator(`[data-figure="${name}"]`);
  await figure('evpi').waitFor({ timeout: 90_000 });
  const textOf = async (name: string) => (await figure(name).textContent()) ?? '';
  const numberOf = async (name: string) => Number(await figure(name).getAttribute('value'));
  const [netBenefit, probabilityBest, evpi] = NUMBERS;
  return {
    values: {
      best: await textOf('best'),
      netBenefit: await numberOf(netBenefit),
      probabilityBest: await numberOf(probabilityBest),
      evpi: await numberOf(evpi),
    },
    texts: {
      netBenefit: await textOf(netBenefit),
      probabilityBest: await textOf(probabilityBest),
      evpi: await textOf(evpi),
    },
  };
}

/** The command line's answer: the strategy best on the base case, against the comparator. */
export function answerOf({ strategies, psa }: CommandLineAnswer, comparator: string): Answer {
  const best = strategies.reduce((a, b) => (b.nmb > a.nmb ? b : a));
  const reference = strategies.find(({ id }) => id === comparator);
  const chance = psa.strategies.find(({ id }) => id === best.id);
  if (!reference || !chance) throw new Error('the command line left a strategy out');
  return {
    best: best.name,
    netBenefit: best.nmb - reference.nmb,
    probabilityBest: chance.probabilityBest,
    evpi: psa.evpi.perPerson,
  };
}

/**
 * True when English text such as "KM +107" or "< 0.01" says the value, to the decimals
 * that it shows.
 */
export function says(text: string, value: number): boolean {
  const written = /[-\u2212+]?[\d,]*\d(?:\.(\d+))?/.exec(text.replaceAll(/\s/g, ''));
  if (!written) return false;
  const number = Number(written[0].replaceAll(',', '').replace('\u2212', '-'));
  if (text.startsWith('<')) return value < number;
  if (text.startsWith('>')) return value > number;
  const half = 0.5 * 10 ** -(written[1]?.length ?? 0);
  return Math.abs(number - value) <= half * (1 + 1e-9);
}
