import i18next from 'i18next';
import { expect, it } from 'vitest';
import { draftBrief } from '../../../../../shared/export/brief/draft.ts';
import type { BriefReader } from '../../../../../src/i18n/brief-words.ts';
import { partsOf, textOf } from '../../../../../src/routes/appraisal/brief/parts.ts';
import { given } from '../../../../export/brief/given.ts';
import { withWords } from '../../../setup.ts';

withWords();

const { document, base } = given({ a: [100, 1], b: [200, 1.1], c: [350, 1.2] });
const brief = draftBrief(document, base, null, 1_200);
const outcome = { plural: 'QALYs', gained: 'QALYs gained', lost: 'QALYs given up', per: 'QALY' };
const reader = (): BriefReader => ({ t: i18next.t, language: 'en', symbol: 'KM', outcome });

it('words the drafted sentences, part by part', () => {
  const parts = partsOf(brief, new Map(), reader());
  expect([...parts.keys()]).toEqual([
    ...['answer', 'howSure', 'whatWouldChange', 'research', 'restsOn'],
  ]);
  // 100 more for 0.1 more is 1,000 a unit; 150 more for 0.1 more is 1,500.
  expect(parts.get('answer')?.map(textOf)[0]).toBe(
    'B: the best choice at KM\u00A01,200 per QALY, and wherever from KM\u00A01,000 per QALY to KM\u00A01,500 per QALY may be paid.',
  );
  expect(parts.get('research')).toEqual([]);
});

it('puts a person’s own words in place of the sentence of that key, and of no other', () => {
  const written = { text: 'Yes.', writtenFor: 'f'.repeat(64) };
  const parts = partsOf(brief, new Map([['answer.worthBetween', written]]), reader());
  const plain = partsOf(brief, new Map(), reader());
  expect(parts.get('answer')?.map(textOf)).toEqual([
    'Yes.',
    ...(plain.get('answer')?.map(textOf).slice(1) ?? []),
  ]);
  expect(parts.get('howSure')).toEqual(plain.get('howSure'));
});
