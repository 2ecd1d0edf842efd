import i18next from 'i18next';
import { describe, expect, it } from 'vitest';
import { error } from '../../../shared/model/issue.ts';
import { issueExcerpt, issuePlace, issueWords } from '../../../src/i18n/issue-words.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { withWords } from '../setup.ts';

withWords();

const document = tinyDocument();
const reader = () => ({ t: i18next.t, language: 'en' as const, document });

describe('an issue', () => {
  it('is worded with its values: ids by label, kinds in words, numbers as written', () => {
    const missing = error('movements.missingRow', [], { state: 'alive', strategy: 'treatment' });
    expect(issueWords(missing, reader())).toBe(
      'Nothing says where people in Alive go under Treatment.',
    );
    const outside = error('values.outsideKind', [], { kind: 'perCycle', value: -1_234.5 });
    expect(issueWords(outside, reader())).toBe(
      '\u22121,234.5 is not a value that the kind “events a cycle” can take.',
    );
  });

  it('passes a suggestion on', () => {
    const unknown = error('formula.unknownName', [], { name: 'p_dye', suggestion: 'p_die' });
    expect(issueWords(unknown, reader())).toBe('Nothing is called p_dye. Did you mean p_die?');
  });

  it('says its code where it has no words', () => {
    expect(issueWords(error('future.code'), reader())).toContain('future.code');
  });
});

describe('a place', () => {
  it('goes by labels where the document is known', () => {
    expect(issuePlace(['parameters', 0, 'value'], document)).toBe(
      'parameters › Probability of dying in a year › value',
    );
  });

  it('goes by numbers, counted from 1, where it is not', () => {
    expect(issuePlace(['parameters', 0, 'value'], null)).toBe('parameters › #1 › value');
  });

  it('within a formula is shown with what stands around it', () => {
    const path = ['variables', 0, 'formula', 'byStrategy', 'treatment'];
    const issue = error('formula.unknownName', path, { name: 'rr_die' }, { start: 8, end: 14 });
    expect(issueExcerpt(issue, document)).toEqual({
      before: 'p_die * ',
      part: 'rr_die',
      after: '',
    });
    expect(issueExcerpt(issue, null)).toBeNull();
  });
});
