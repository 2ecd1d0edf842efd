import { describe, expect, it } from 'vitest';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import type { DrawsState } from '../../../src/store/draws.ts';
import { LiveAnswer } from '../../../src/store/live-answer.ts';
import { answerDraft } from '../../../src/workers/answer-draft.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { setValue, until } from './support.ts';

const DRAWS = { strategies: ['usual', 'treatment'], cost: [], health: [] };
const DONE: DrawsState = { status: 'done', draws: DRAWS, problems: [] };

/** A live answer whose base cases and draws come when the test lets them. */
function live() {
  const waiting: (() => void)[] = [];
  const asked: ModelDocument[] = [];
  const drawn: { signal: AbortSignal; tell: (state: DrawsState) => void; end: () => void }[] = [];
  const kept = new Map<string, unknown>();
  const answerer = {
    answer: async (draft: ModelDocument) => {
      asked.push(draft);
      await new Promise<void>((go) => waiting.push(go));
      return answerDraft(draft);
    },
    digest: async (document: ModelDocument) => JSON.stringify(document),
  };
  const draw = (_: ModelDocument, signal: AbortSignal, tell: (state: DrawsState) => void) =>
    new Promise<DrawsState>((done) => drawn.push({ signal, tell, end: () => done(DONE) }));
  const cache = {
    kept: async (digest: string) => (kept.get(digest) as never) ?? null,
    keep: async (digest: string, _: unknown, results: unknown) => {
      kept.set(digest, results);
    },
  };
  const answer = new LiveAnswer(answerer, draw, cache);
  const go = async () => {
    await until(() => waiting.length > 0);
    waiting.shift()?.();
    await until(() => !answer.getState().working || waiting.length > 0);
  };
  return { answer, asked, drawn, kept, go };
}

function edited(document: ModelDocument, ...edits: Edit[]): ModelDocument {
  return applyEdits(document, edits).document;
}

const costOf = (answered: { comparison: { options: readonly { cost: number }[] } } | null) =>
  answered?.comparison.options[1]?.cost ?? null;

const TINY = tinyDocument();
const DEARER = edited(TINY, ...setValue('c_year', 200));
const BROKEN = edited(TINY, {
  type: 'set',
  at: ['variables', { id: 'v_die' }, 'formula'],
  value: 'p_die * nobody',
});

describe('the live answer', () => {
  it('gives the base case, then the draws with their progress', async () => {
    const { answer, drawn, go } = live();
    answer.ask(TINY, 0);
    expect(answer.getState()).toMatchObject({ now: null, was: null, working: true });
    await go();
    const { now } = answer.getState();
    expect(costOf(now)).toBe(answerDraft(TINY).base?.strategies[1]?.cost);
    expect(now?.draws).toEqual({ status: 'running', done: 0, total: 100 });
    await until(() => drawn.length === 1);
    drawn[0]?.tell({ status: 'running', done: 50, total: 100 });
    expect(answer.getState().now?.draws).toMatchObject({ done: 50 });
    drawn[0]?.end();
    await until(() => answer.getState().now?.draws.status === 'done');
  });

  it('keeps what was before the step, for all the keystrokes of the step', async () => {
    const { answer, go } = live();
    answer.ask(TINY, 0);
    await go();
    const first = costOf(answer.getState().now);
    for (const [price, step] of [
      [2, 1],
      [20, 1],
      [200, 1],
    ] as const) {
      answer.ask(edited(TINY, ...setValue('c_year', price)), step);
      await go();
      expect(costOf(answer.getState().was)).toBe(first);
    }
    const second = costOf(answer.getState().now);
    expect(second).toBeCloseTo(2 * (first ?? 0), 8);
    answer.ask(TINY, 2);
    await go();
    expect(costOf(answer.getState().was)).toBe(second);
  });

  it('lets the latest draft win, and stops the draws of the one before', async () => {
    const { answer, asked, drawn, go } = live();
    answer.ask(TINY, 0);
    await go();
    await until(() => drawn.length === 1);
    const drafts = [3, 4, 5].map((price) => edited(TINY, ...setValue('c_year', price)));
    drafts.forEach((draft, index) => {
      answer.ask(draft, index + 1);
    });
    expect(drawn[0]?.signal.aborted).toBe(true);
    drawn[0]?.end();
    await go();
    await go();
    // The one in between was never looked into, and nobody saw the first one's answer.
    expect(asked).toEqual([TINY, drafts[0], drafts[2]]);
    expect(answer.getState().now?.document.parameters).toEqual(drafts[2]?.parameters);
  });

  it('of a broken model is its issues, and no number', async () => {
    const { answer, go } = live();
    answer.ask(TINY, 0);
    await go();
    const first = costOf(answer.getState().now);
    answer.ask(BROKEN, 1);
    await go();
    const { now, was, issues } = answer.getState();
    expect(now).toBeNull();
    expect(costOf(was)).toBe(first);
    expect(issues.map(({ code }) => code)).toContain('formula.unknownName');
    answer.ask(DEARER, 2);
    await go();
    expect(costOf(answer.getState().was)).toBe(first);
    // Whole again: a warning of the price far from its distribution is no error.
    expect(answer.getState().issues.map(({ code }) => code)).toEqual(['distribution.valueFar']);
  });

  it('tells of a draft whose very shape is unsound', async () => {
    const { answer, go } = live();
    answer.ask(edited(TINY, { type: 'unset', at: ['strategies'] }), 0);
    await go();
    expect(answer.getState().issues[0]?.path).toEqual(['strategies']);
  });

  it('takes draws that were made before', async () => {
    const { answer, drawn, kept, go } = live();
    answer.ask(TINY, 0);
    await go();
    await until(() => drawn.length === 1);
    drawn[0]?.end();
    await until(() => kept.size === 1);
    answer.ask(DEARER, 1);
    await go();
    answer.ask(edited(DEARER, ...setValue('c_year', 100)), 2);
    await go();
    await until(() => answer.getState().now?.draws.status === 'done');
    expect(drawn.length).toBeLessThanOrEqual(2);
  });

  it('stops and runs its draws when told, and gives up what nobody waits for', async () => {
    const { answer, drawn, go } = live();
    answer.ask(TINY, 0);
    await go();
    await until(() => drawn.length === 1);
    answer.stop();
    expect(drawn[0]?.signal.aborted).toBe(true);
    expect(answer.getState().now?.draws).toMatchObject({ status: 'stopped', total: 100 });
    answer.run();
    await until(() => drawn.length === 2);
    answer.leave();
    expect(drawn[1]?.signal.aborted).toBe(true);
    answer.ask(TINY, 0);
    await go();
    await until(() => drawn.length === 3);
  });

  it('says so where the simulator breaks down', async () => {
    const fails = async () => Promise.reject(new Error('out of memory'));
    const answer = new LiveAnswer({ answer: fails, digest: fails });
    answer.ask(TINY, 0);
    await until(() => !answer.getState().working);
    expect(answer.getState().issues.map(({ code }) => code)).toEqual(['run.brokeDown']);
  });
});
