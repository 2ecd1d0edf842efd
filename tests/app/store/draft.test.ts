import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import { EditError } from '../../../shared/model/edit/edit-error.ts';
import {
  advance,
  attempt,
  fieldsBetween,
  type Pending,
  type Point,
  type Proposal,
  rebase,
  replay,
} from '../../../src/store/draft.ts';
import { NO_HISTORY } from '../../../src/store/history.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { setTitle, setValue, valueIn } from './support.ts';

const START: Point = { seq: 0, document: tinyDocument(), history: NO_HISTORY };

const proposal = (edits: Proposal['edits'], more: Partial<Proposal> = {}): Proposal => ({
  edits,
  label: 'step',
  time: 0,
  ...more,
});

function waiting(...proposals: Proposal[]): Pending[] {
  let here = START;
  return proposals.map((each) => {
    const next = advance(here, each);
    here = next.after;
    return { ...next, done: () => {} };
  });
}

describe('the draft', () => {
  it('moves on by rows, and comes to the same point when they are replayed', () => {
    const rows = waiting(proposal(setValue('p_die', 0.2)), proposal(setTitle('New')));
    const { point, unreadable } = replay(
      START,
      rows.map(({ row }) => row),
    );
    expect(unreadable).toBe(0);
    expect(point).toEqual(rows[1]?.after);
    expect(() => advance(START, proposal(setValue('nobody', 1)))).toThrow(EditError);
  });

  it('puts what waits on top of what another tab wrote, with new numbers', () => {
    const theirs = setTitle('Theirs');
    const point = advance(START, proposal(theirs)).after;
    const ours = waiting(proposal(setValue('p_die', 0.2)), proposal(setValue('u_alive', 0.5)));
    const { pending, dropped, covering } = rebase(point, ours, theirs);
    expect(pending.map(({ row }) => row.seq)).toEqual([2, 3]);
    expect([dropped, covering]).toEqual([[], []]);
    const last = pending[1]?.after.document;
    expect(last?.question.title).toBe('Theirs');
    expect(last && valueIn(last, 'p_die')).toBe(0.2);
  });

  it('drops what no longer fits, and what undoes it', () => {
    const theirs = [{ type: 'remove', at: ['parameters'], id: 'c_year' } as const];
    const point = advance(START, proposal(theirs)).after;
    const ours = waiting(
      proposal(setValue('c_year', 5)),
      proposal(setTitle('Ours')),
      proposal(setValue('c_year', 100), { undoOf: 1 }),
      proposal(setTitle(tinyDocument().question.title), { undoOf: 2 }),
    );
    const { pending, dropped } = rebase(point, ours, theirs);
    expect(dropped.map(({ row }) => row.seq)).toEqual([1, 3]);
    expect(pending.map(({ row }) => [row.seq, row.undoOf])).toEqual([
      [2, undefined],
      [3, 2],
    ]);
  });

  it('passes other errors on', () => {
    expect(() =>
      attempt(() => {
        throw new RangeError('ours to mend');
      }),
    ).toThrow(RangeError);
  });

  it('goes from one document to another field by field', () => {
    const to = {
      ...tinyDocument({ strategies: tinyDocument().strategies.slice(0, 1) }),
      note: 'of a newer application',
    };
    for (const [from, target] of [
      [tinyDocument(), to],
      [to, tinyDocument()],
    ] as const) {
      const { document } = applyEdits(from, fieldsBetween(from, target));
      expect(digestOf(document)).toBe(digestOf(target));
    }
    expect(fieldsBetween(to, to)).toEqual([]);
  });
});
