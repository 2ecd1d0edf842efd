import { render, screen } from '@testing-library/react';
import i18next from 'i18next';
import { describe, expect, it } from 'vitest';
import { incremental } from '../../../../../shared/analysis/incremental.ts';
import { draftBrief } from '../../../../../shared/export/brief/draft.ts';
import type { BriefReader } from '../../../../../src/i18n/brief-words.ts';
import { partsOf } from '../../../../../src/routes/appraisal/brief/parts.ts';
import { Sheet } from '../../../../../src/routes/appraisal/brief/sheet.tsx';
import { chances, given } from '../../../../export/brief/given.ts';
import { withWords } from '../../../setup.ts';

withWords();

const { document, base } = given({ a: [100, 1], b: [200, 1.1], c: [350, 1.05] });
const rows = incremental(
  base.strategies.map(({ id, cost, outcome }) => ({ id, cost, health: outcome })),
);
const brief = draftBrief(document, base, chances({ a: 0.2, b: 0.7, c: 0.1 }), 1_200);
const outcome = { plural: 'QALYs', gained: 'QALYs gained', lost: 'QALYs given up', per: 'QALY' };

function show(reasons: readonly string[] = [], draftedBy = '') {
  const reader: BriefReader = { t: i18next.t, language: 'en', symbol: 'KM', outcome };
  const drafted = { document, brief, rows };
  const parts = partsOf(brief, new Map(), reader);
  const given = { drafted, parts, reader, reasons, draftedBy, paper: 'a4', date: '1 May' } as const;
  return render(<Sheet {...given} />).container;
}

const cells = (row: string) =>
  [...(screen.getByRole('row', { name: new RegExp(row) }).children ?? [])].map(
    ({ textContent }) => textContent,
  );

describe('the table of options', () => {
  it('gives ratios where there are any and words where not', () => {
    show();
    expect(cells('^A')).toEqual(['A (comparator)', '100', '1.000', 'starting point', '20 of 100']);
    expect(cells('^B')).toEqual(['B', '200', '1.100', '1,000', '70 of 100']);
    expect(cells('^C')[3]).toBe('no better than “B”, for no less');
  });
});

describe('a page that is not up to date', () => {
  it('says so and why, and bears a watermark', () => {
    const sheet = show(['The draws are not done.']);
    expect(sheet.querySelector('.sheet-watermark')?.textContent).toBe('Provisional');
    expect(sheet.querySelector('header')?.textContent).toContain('The draws are not done.');
  });

  it('is the only one that does', () => {
    expect(show().querySelector('.sheet-watermark')).toBeNull();
  });
});

it('shows who drafted it, or room to sign', () => {
  expect(show([], 'A. Analyst').querySelector('footer')?.textContent).toContain('A. Analyst');
  expect(show().querySelector('.sheet-signature')).not.toBeNull();
});

it('can be checked by its digests', () => {
  const footer = show().querySelector('footer');
  expect(footer?.dataset.document).toBe(brief.digests.document);
  expect(footer?.textContent).toContain(brief.digests.results.slice(0, 4));
});
