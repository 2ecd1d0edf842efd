import { expect, it } from 'vitest';
import { optionsOf } from '../../../shared/analysis/breakdown/options-of.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

it('turns outcomes of which fewer is better', () => {
  const tiny = tinyDocument();
  const results = [{ id: 'usual', cost: 5, outcome: 2 }];
  expect(optionsOf(tiny, results)).toEqual([{ id: 'usual', cost: 5, health: 2 }]);
  const outcome = { ...tiny.question.outcome, direction: 'fewerIsBetter' as const };
  const dalys = tinyDocument({ question: { ...tiny.question, outcome } });
  expect(optionsOf(dalys, results)).toEqual([{ id: 'usual', cost: 5, health: -2 }]);
});
