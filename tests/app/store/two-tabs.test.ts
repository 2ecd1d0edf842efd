/** Two tabs on one appraisal: nothing is overwritten in silence. */
import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import type { Session } from '../../../src/store/session.ts';
import { listVersions } from '../../../src/store/versions.ts';
import {
  freshName,
  madeAppraisal,
  openTab,
  sessionOf,
  setTitle,
  setValue,
  until,
  valueIn,
} from './support.ts';

async function twoTabs(): Promise<{ id: string; name: string; a: Session; b: Session }> {
  const name = freshName();
  const db = openTab(name);
  const id = await madeAppraisal(db);
  const a = await sessionOf(db, id);
  const b = await sessionOf(openTab(name), id);
  return { id, name, a, b };
}

const digest = (session: Session) => digestOf(session.getState().document);

/** Both have heard all there is to hear. */
async function agreed(a: Session, b: Session): Promise<void> {
  await until(() => digest(a) === digest(b));
}

describe('two tabs', () => {
  it('hear of each other’s edits', async () => {
    const { a, b } = await twoTabs();
    await a.edit(setValue('p_die', 0.2), 'Value');
    await until(() => valueIn(b.getState().document, 'p_die') === 0.2);
    expect(b.getState().undo?.label).toBe('Value');
    await b.undo();
    await until(() => valueIn(a.getState().document, 'p_die') === 0.1);
    expect(a.getState().redo?.label).toBe('Value');
  });

  it('writing at the same moment keep both edits, in one order', async () => {
    const { id, name, a, b } = await twoTabs();
    const written = await Promise.all([
      a.edit(setValue('p_die', 0.2), 'Value'),
      b.edit(setTitle('By b'), 'Title'),
      a.edit(setValue('u_alive', 0.7), 'Utility'),
      b.edit(setValue('rr_die', 0.5), 'Ratio'),
    ]);
    expect(written).toEqual([true, true, true, true]);
    await agreed(a, b);
    const { document } = (await sessionOf(openTab(name), id)).getState();
    expect(document.question.title).toBe('By b');
    expect(['p_die', 'u_alive', 'rr_die'].map((p) => valueIn(document, p))).toEqual([
      0.2, 0.7, 0.5,
    ]);
    expect([...a.getState().notices, ...b.getState().notices]).toEqual([]);
    for (let steps = 0; steps < 4; steps++) await a.undo();
    expect(a.getState().undo).toBeNull();
    expect(valueIn(a.getState().document, 'p_die')).toBe(0.1);
  });

  it('changing the same field are told, and the edit that is covered comes back by undo', async () => {
    const { a, b } = await twoTabs();
    await Promise.all([
      a.edit(setValue('p_die', 0.2), 'By a'),
      b.edit(setValue('p_die', 0.3), 'By b'),
    ]);
    await agreed(a, b);
    const notices = [...a.getState().notices, ...b.getState().notices];
    expect(notices.map(({ code }) => code)).toEqual(['draft.covered']);
    const last = valueIn(a.getState().document, 'p_die');
    await a.undo();
    expect(valueIn(a.getState().document, 'p_die')).toBe(last === 0.3 ? 0.2 : 0.3);
  });

  it('an edit of what the other deleted is left out, and told', async () => {
    const { a, b } = await twoTabs();
    const removal: Edit[] = [{ type: 'remove', at: ['parameters'], id: 'c_year' }];
    // The other has not heard of it: it is written beneath both.
    const first = a.edit(removal, 'Delete');
    const second = b.edit(setValue('c_year', 200), 'Price');
    const [removed, changed] = await Promise.all([first, second]);
    await agreed(a, b);
    expect(removed).toBe(true);
    if (changed) {
      // b was first: then a's deletion covers it.
      expect(a.getState().notices).toMatchObject([{ code: 'draft.covered', label: 'Delete' }]);
    } else {
      expect(b.getState().notices).toMatchObject([{ code: 'draft.dropped', label: 'Price' }]);
    }
    expect(valueIn(a.getState().document, 'c_year')).toBeUndefined();
  });

  it('an undo does not take back what the other built upon', async () => {
    const { a, b } = await twoTabs();
    await a.edit(setValue('p_die', 0.2), 'First');
    await until(() => valueIn(b.getState().document, 'p_die') === 0.2);
    await Promise.all([b.edit(setValue('p_die', 0.3), 'Second'), a.undo()]);
    await agreed(a, b);
    const codes = [...a.getState().notices, ...b.getState().notices].map(({ code }) => code);
    expect(codes).toHaveLength(1);
    // Whoever came second was told: an undo gives way, an edit covers.
    expect(valueIn(a.getState().document, 'p_die')).toBe(0.3);
  });

  it('make versions one upon the other', async () => {
    const { id, name, a, b } = await twoTabs();
    await Promise.all([a.edit(setValue('p_die', 0.2), 'Value'), b.edit(setTitle('By b'), 'Title')]);
    const [one, two] = await Promise.all([a.saveVersion('a'), b.saveVersion('b')]);
    const versions = await listVersions(id, openTab(name));
    // Both asked for the same document, so there is one version of it besides the first.
    expect(one.digest).toBe(two.digest);
    expect(versions.map(({ digest: each }) => each)).toEqual([one.digest, one.parents[0]]);
  });

  it('typing at random end with one document', async () => {
    const { id, name, a, b } = await twoTabs();
    const written: Promise<boolean>[] = [];
    for (let i = 0; i < 40; i++) {
      const session = i % 3 === 0 ? a : b;
      if (i % 7 === 6) written.push(session.undo());
      else written.push(session.edit(setValue(['p_die', 'u_alive'][i % 2]!, i / 100), `${i}`));
      if (i % 5 === 0) await new Promise((done) => setTimeout(done, 3));
    }
    await Promise.all(written);
    await agreed(a, b);
    expect(digest(await sessionOf(openTab(name), id))).toBe(digest(a));
  });
});
