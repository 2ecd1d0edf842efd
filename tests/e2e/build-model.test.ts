/**
 * A model of three states and two strategies, built in the browser from nothing by keyboard
 * and mouse. Its numbers are those of tests/golden/cohort_model1.json (R 4.2.2, its own
 * recursion; see tests/golden/README.md): strategies Usual and DrugA, trapezoid.
 */
import { readFileSync } from 'node:fs';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it, onTestFinished } from 'vitest';
import { en } from '../../src/i18n/en.ts';
import { launchBrowser } from './support/browser.ts';
import { type Site, startSite } from './support/site.ts';
import { visit } from './support/visit.ts';

interface Golden {
  readonly incremental: {
    readonly trapezoid: { readonly cost: readonly number[]; readonly effect: readonly number[] };
  };
}
const golden = JSON.parse(
  readFileSync(new URL('../golden/cohort_model1.json', import.meta.url), 'utf8'),
) as Golden;

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

/** Writes over what a field holds, key by key. */
async function write(page: Page, label: string, text: string, index = 0): Promise<void> {
  const field = page.getByLabel(label, { exact: true }).nth(index);
  await field.click();
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.type(text);
  await page.keyboard.press('Tab');
}

const press = (page: Page, name: string, index = 0) =>
  page.getByRole('button', { name, exact: true }).nth(index).click();

async function step(page: Page, name: string): Promise<void> {
  await page.getByRole('navigation', { name: en.rail.label }).getByText(name).click();
}

const part = (page: Page, name: string) =>
  page.getByRole('navigation', { name: en.model.parts }).getByText(name, { exact: true }).click();

async function frame(page: Page): Promise<void> {
  await write(page, en.question.horizon, '40');
  await write(page, en.framing.discountCosts, '3.5');
  await write(page, en.framing.discountOutcomes, '3.5');
  await press(page, en.framing.addStrategy);
  await write(page, 'Name of strategy 2', 'Drug A');
}

async function states(page: Page): Promise<void> {
  await press(page, en.model.states.add);
  await press(page, en.model.states.add);
  for (const [index, name] of ['Well', 'Sick', 'Dead'].entries()) {
    await write(page, en.editing.label, name, index);
  }
  await page.getByLabel(en.model.states.type).nth(2).selectOption('absorbing');
  await page.getByLabel(en.model.states.dead, { exact: true }).nth(2).check();
}

async function variable(page: Page, index: number, symbol: string, formula: string) {
  await press(page, en.model.variables.add);
  await write(page, en.editing.symbol, symbol, index);
  await write(page, en.model.formula, formula, -1);
}

/** Makes the last variable differ, and writes it for each strategy. */
async function byStrategy(page: Page, texts: readonly (readonly [string, string])[]) {
  await page.getByLabel(en.editing.differs).last().check();
  for (const [strategy, text] of texts) {
    const field = page.getByLabel(strategy, { exact: true }).last();
    await field.click();
    await page.keyboard.press('ControlOrMeta+a');
    await page.keyboard.type(text);
  }
}

async function variables(page: Page): Promise<void> {
  const hazard = '2.5e-5 / 0.098 * (exp(0.098 * (age + 1)) - exp(0.098 * age))';
  await variable(page, 0, 'die_well', `1 - exp(-(${hazard}))`);
  await variable(page, 1, 'die_sick', '1 - (1 - die_well) ^ 2.2');
  await variable(page, 2, 'hr', '1');
  await byStrategy(page, [['Drug A', '0.72']]);
  await variable(page, 3, 'drug', '0');
  await byStrategy(page, [['Drug A', '310']]);
}

async function movements(page: Page): Promise<void> {
  const cell = async (from: string, to: string, formula: string) => {
    const row = page.locator('section').filter({
      has: page.getByRole('heading', { name: `From ${from}`, exact: true }),
    });
    await row.getByRole('button', { name: new RegExp(`→ ${to}`) }).click();
    await row.getByLabel(`To ${to}`, { exact: true }).click();
    await page.keyboard.press('ControlOrMeta+a');
    await page.keyboard.type(formula);
  };
  await cell('Well', 'Sick', '(1 - die_well) * chance(incidence_rate * hr, cycle_length)');
  // The name is completed: its beginning, the arrow keys, Enter.
  await cell('Well', 'Dead', 'die_w');
  await page.keyboard.press('Enter');
  await cell('Sick', 'Well', '(1 - die_sick) * 0.04');
  await cell('Sick', 'Dead', 'die_sick');
}

async function payoffs(page: Page): Promise<void> {
  await press(page, en.model.payoffs.addCost);
  await write(page, 'Well', '450 + drug');
  await write(page, 'Sick', '3900');
  await press(page, en.model.payoffs.addOutcome);
  await write(page, 'Well', '0.86', 1);
  await write(page, 'Sick', '0.61', 1);
}

it('is built from nothing, and gives the numbers of the reference', async () => {
  const { page, context, problems } = await visit(browser, { reducedMotion: 'reduce' });
  onTestFinished(() => context.close());
  await page.goto(site.origin);
  await page.getByRole('button', { name: new RegExp(en.begin.templates.empty.body) }).click();
  await frame(page);

  await step(page, en.steps.evidence);
  await press(page, en.register.add);
  await write(page, en.editing.label, 'Incidence');
  await write(page, en.editing.symbol, 'incidence_rate');
  await page.getByLabel(en.editing.kind, { exact: true }).selectOption('rate');
  await write(page, en.evidence.value, '0.06');

  await step(page, en.steps.model);
  await states(page);
  await part(page, en.model.sections.covariates);
  await press(page, en.model.covariates.addAge);
  await write(page, 'In Everybody', '60');
  await part(page, en.model.sections.variables);
  await variables(page);
  await part(page, en.model.sections.movements);
  await movements(page);
  await part(page, en.model.sections.payoffs);
  await payoffs(page);

  await step(page, en.steps.results);
  const figures = (name: string) => page.locator(`[data-figure="${name}"]`);
  await figures('cost').nth(1).waitFor();
  const read = async (name: string) =>
    Promise.all([0, 1].map(async (n) => Number(await figures(name).nth(n).getAttribute('value'))));
  const { cost, effect } = golden.incremental.trapezoid;
  const [costs, effects] = [await read('cost'), await read('outcome')];
  for (const n of [0, 1]) {
    expect((costs[n] ?? 0) / (cost[n] ?? 1)).toBeCloseTo(1, 10);
    expect((effects[n] ?? 0) / (effect[n] ?? 1)).toBeCloseTo(1, 10);
  }
  expect(problems).toEqual([]);
});
