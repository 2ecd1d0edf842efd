import { describe, expect, it } from 'vitest';
import {
  afterStep,
  type History,
  joins,
  NO_HISTORY,
  type Step,
} from '../../../src/store/history.ts';
import { setValue } from './support.ts';

const step = (seq: number, more: Partial<Step> = {}): Step => ({
  seq,
  label: `step ${seq}`,
  inverse: setValue('a', seq - 1),
  ...more,
});

function stackOf(stack: History['undo']): number[] {
  return stack ? [stack.top.seq, ...stackOf(stack.rest)] : [];
}

function seen({ undo, redo }: History): [number[], number[]] {
  return [stackOf(undo), stackOf(redo)];
}

const historyOf = (...steps: Step[]) => steps.reduce(afterStep, NO_HISTORY);

describe('the history', () => {
  it('holds the last step on top, and undone ones for redo', () => {
    expect(seen(historyOf(step(1), step(2)))).toEqual([[2, 1], []]);
    const undone = historyOf(step(1), step(2), step(3, { undoOf: 2 }), step(4, { undoOf: 1 }));
    expect(seen(undone)).toEqual([[], [4, 3]]);
    expect(seen(afterStep(undone, step(5, { redoOf: 4 })))).toEqual([[5], [3]]);
    expect(seen(afterStep(undone, step(5)))).toEqual([[5], []]);
  });

  it('takes a group as one step, the last of its edits taken back first', () => {
    const group = 'field';
    const grouped = historyOf(step(1), step(2, { group }), step(3, { group }));
    expect(seen(grouped)).toEqual([[2, 1], []]);
    expect(grouped.undo?.top.edits).toEqual([...setValue('a', 2), ...setValue('a', 1)]);
    expect(joins(grouped, group)).toBe(true);
    expect(joins(grouped, 'another')).toBe(false);
    expect(joins(grouped, undefined)).toBe(false);
    // Once undone and redone it is whole: the next keystroke is a step of its own.
    const redone = [step(4, { undoOf: 2 }), step(5, { redoOf: 4 })].reduce(afterStep, grouped);
    expect(joins(redone, group)).toBe(false);
  });

  it('undoes a step beneath another, where a second tab wrote in between', () => {
    expect(seen(historyOf(step(1), step(2), step(3), step(4, { undoOf: 2 })))).toEqual([
      [3, 1],
      [4],
    ]);
    expect(seen(historyOf(step(1), step(2, { undoOf: 9 })))).toEqual([[1], [2]]);
  });
});
