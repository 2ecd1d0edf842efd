import i18next from 'i18next';
import { expect, it } from 'vitest';
import { compareDocuments } from '../../../../../shared/model/compare/compare.ts';
import type { ModelDocument } from '../../../../../shared/model/document.ts';
import {
  changedValue,
  placeWords,
} from '../../../../../src/routes/appraisal/history/change-words.ts';
import { tinyDocument } from '../../../../fixtures/tiny-document.ts';
import { withWords } from '../../../setup.ts';

withWords();

/** The one change between the tiny document and what is made of it, in words. */
function said(change: (document: ModelDocument) => ModelDocument): (string | undefined)[] {
  const before = tinyDocument();
  const after = change(before);
  const reader = { document: after, t: i18next.t, language: 'en' } as const;
  return compareDocuments(before, after).flatMap((each) => [
    placeWords(each, reader),
    changedValue(each, each.before, reader),
    changedValue(each, each.after, reader),
  ]);
}

const first = tinyDocument().parameters[0];

it('names a parameter and its field', () => {
  const words = said((document) => ({
    ...document,
    parameters: document.parameters.map((each, i) => (i === 0 ? { ...each, value: 0.75 } : each)),
  }));
  expect(words[0]).toBe(`${first?.label}: value`);
  expect(words[2]).toBe('0.75');
});

it('leaves out that the question is the question’s', () => {
  const words = said((document) => ({
    ...document,
    question: { ...document.question, horizon: 12 },
  }));
  expect(words[0]).toBe('time horizon');
  expect(words[2]).toBe('12');
});

it('says nothing where a field came or went', () => {
  const words = said((document) => ({
    ...document,
    question: { ...document.question, decision: undefined },
  }));
  expect(words.at(-1)).toBe(tinyDocument().question.decision === undefined ? undefined : 'nothing');
});

it('says a distribution in the trade’s words', () => {
  const words = said((document) => ({
    ...document,
    parameters: document.parameters.map((each, i) =>
      i === 0 ? { ...each, distribution: { type: 'uniform', low: 0, high: 0.5 } } : each,
    ),
  }));
  expect(words[0]).toBe(`${first?.label}: uncertainty`);
  expect(words[2]).toBe('Uniform (0; 0.5)');
});
