import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { keepResults } from '../../../src/store/results-cache.ts';
import { answerOfVersion } from '../../../src/store/version-answer.ts';
import { answerDraft } from '../../../src/workers/answer-draft.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { openTab } from './support.ts';

const document = tinyDocument();
const version = { document, documentDigest: digestOf(document) };

describe('the answer of a version', () => {
  it('is run where nothing is kept, and says what is broken', async () => {
    const db = openTab();
    const answerer = { answer: async () => answerDraft(document) };
    const { comparison, draws } = await answerOfVersion(version, answerer, db);
    expect(comparison?.options.map(({ id }) => id)).toEqual(['usual', 'treatment']);
    expect(draws).toBeNull();
    const broken = { answer: async () => answerDraft({ ...document, strategies: [] }) };
    const answer = await answerOfVersion(version, broken, db);
    expect(answer.comparison).toBeNull();
    expect(answer.issues).not.toEqual([]);
  });

  it('is taken from what is kept, with its draws', async () => {
    const db = openTab();
    const { base } = answerDraft(document);
    const draws = { strategies: ['usual', 'treatment'], cost: [], health: [] };
    if (base) {
      const results = { base, draws, problems: [] };
      await keepResults(version.documentDigest, document.analysis, results, db);
    }
    const answerer = { answer: () => Promise.reject(new Error('not asked')) };
    expect((await answerOfVersion(version, answerer, db)).draws).toEqual(draws);
  });
});
