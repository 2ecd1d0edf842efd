import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { answerDraft } from '../../../src/workers/answer-draft.ts';
import { createAnswerer } from '../../../src/workers/answerer.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const never = new Promise<never>(() => {});

describe('the simulator of the draft in hand', () => {
  it('is started once, with the first draft', async () => {
    let started = 0;
    const answerer = createAnswerer(() => {
      started += 1;
      const answer = async () => answerDraft(tinyDocument());
      const digest = async () => digestOf(tinyDocument());
      return { remote: { answer, digest }, failed: never, stop: () => {} };
    });
    expect(started).toBe(0);
    const { base } = await answerer.answer(tinyDocument());
    expect(base?.strategies.map(({ id }) => id)).toEqual(['usual', 'treatment']);
    expect(await answerer.digest(tinyDocument())).toBe(digestOf(tinyDocument()));
    expect(started).toBe(1);
  });

  it('that breaks down is stopped, and the next call starts another', async () => {
    let started = 0;
    let stopped = 0;
    const answerer = createAnswerer(() => {
      started += 1;
      const failed = started === 1 ? Promise.reject(new Error('broke down')) : never;
      failed.catch(() => {});
      const answer = () => (started === 1 ? never : Promise.resolve(answerDraft(tinyDocument())));
      const stop = () => {
        stopped += 1;
      };
      return { remote: { answer, digest: () => never }, failed, stop };
    });
    await expect(answerer.answer(tinyDocument())).rejects.toThrow('broke down');
    expect((await answerer.answer(tinyDocument())).issues).toEqual([]);
    expect([started, stopped]).toEqual([2, 1]);
  });
});
