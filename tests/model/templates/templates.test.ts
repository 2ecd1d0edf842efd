import { describe, expect, test } from 'vitest';
import { checkModel } from '../../../shared/engine/check.ts';
import { prepare } from '../../../shared/engine/engine.ts';
import { digestOf } from '../../../shared/model/digest.ts';
import { checkDocument } from '../../../shared/model/read.ts';
import { TEMPLATE_SLUGS, TEMPLATES } from '../../../shared/model/templates/templates.ts';
import { discounting } from '../../examples/load.ts';
import { words } from './words.ts';

const setting = { id: 'mine', year: 2026, words };

describe.each(TEMPLATE_SLUGS)('%s', (slug) => {
  const template = TEMPLATES[slug](setting);

  test('is valid, with nothing to warn of', () => {
    const { document, issues } = checkDocument(template);
    expect(issues).toEqual([]);
    expect(document && checkModel(document)).toEqual([]);
    // Defaults are filled in: reading it changes nothing.
    expect(digestOf(document)).toBe(digestOf(template));
  });

  test('runs to finite numbers, and draws', () => {
    const engine = prepare(template);
    const { strategies, problems } = engine.base();
    expect(problems).toEqual([]);
    for (const { cost, outcome } of strategies) {
      expect(Number.isFinite(cost) && Number.isFinite(outcome)).toBe(true);
    }
    const draws = engine.draws({ samples: 200, seed: 1, plan: 'plain' }, 0, 200);
    expect(draws.problems).toEqual([]);
    expect(draws.outcome.every((column) => column.every(Number.isFinite))).toBe(true);
  });

  test('says of every number that it is a placeholder without a source', () => {
    for (const { notes, source } of template.parameters) {
      expect([notes, source]).toEqual([
        words.replaceMe,
        { citation: words.notYetGiven, invented: false },
      ]);
    }
    expect(template.about.invented).toBe(false);
    if (slug !== 'empty') expect(template.about.limits).toBe(words.allPlaceholders);
  });

  test('has no words but those it is given', () => {
    const texts: string[] = [];
    const read = (value: unknown, key: string): void => {
      if (typeof value === 'string') {
        if (
          [
            'label',
            'unit',
            'title',
            'category',
            'citation',
            'notes',
            'limits',
            'unitSingular',
          ].includes(key)
        )
          texts.push(value);
      } else if (typeof value === 'object' && value !== null) {
        for (const [name, part] of Object.entries(value)) read(part, name);
      }
    };
    read(template, '');
    expect(texts.length).toBeGreaterThan(5);
    expect(texts.filter((text) => !text.startsWith('word '))).toEqual([]);
  });
});

test('the new option gains and costs something in each model, for charts to show', () => {
  for (const slug of TEMPLATE_SLUGS.filter((each) => each !== 'empty')) {
    const [usual, other] = prepare(TEMPLATES[slug](setting)).base().strategies;
    expect(other!.outcome).toBeGreaterThan(usual!.outcome);
    expect(other!.cost).not.toBeCloseTo(usual!.cost, 0);
  }
});

// Alive at cycle t is (1 - p)^t, counted by the trapezoid rule: the mean of start and end.
test('the two-state model agrees with the closed form of its survival', () => {
  const template = TEMPLATES['two-state'](setting);
  const [usual] = prepare(discounting(template, { costs: 0, outcomes: 0 })).base().strategies;
  const years = Array.from({ length: 20 }, (_, t) => (0.95 ** t + 0.95 ** (t + 1)) / 2);
  const alive = years.reduce((sum, each) => sum + each, 0);
  expect(usual!.outcome).toBeCloseTo(0.8 * alive, 9);
  expect(usual!.cost).toBeCloseTo(100 * alive, 7);
});
