/**
 * A tab killed at a seeded moment, twenty times: what the app called saved is there when
 * it is opened again, whole, and at most the keys pressed since the last pause are not.
 */
import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { breakWrites, freshName, madeAppraisal, openTab, sessionOf, setTitle } from './support.ts';

const TEXT = 'Is the treatment worth what it costs in Kesanda?';

/** Whole numbers from 0, by a linear congruential generator (from memory). */
function randomFrom(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return Math.floor((state / 2 ** 32) * below);
  };
}

describe.each(Array.from({ length: 20 }, (_, seed) => seed + 1))('seed %i', (seed) => {
  it('loses nothing that was saved, and at most what was just typed', async () => {
    const random = randomFrom(seed);
    const name = freshName();
    const id = await madeAppraisal(openTab(name));
    const tab = openTab(name);
    // Dies at this write, in the middle of its transaction, and writes nothing more.
    const last = 1 + random(2 * TEXT.length);
    let writes = 0;
    breakWrites(tab, () => (++writes > last ? new DOMException('killed', 'AbortError') : null));
    const session = await sessionOf(tab, id);
    const digests = [digestOf(session.getState().document)];
    let saved = 0;
    /** Keys pressed since the last pause. */
    let waiting = 0;
    for (let typed = 1; typed <= TEXT.length && writes <= last; typed++) {
      const group = `title:${Math.floor(typed / 10)}`;
      const back = random(10) === 0 && typed > 1;
      const writing = back
        ? session.undo()
        : session.edit(setTitle(TEXT.slice(0, typed)), 'Title', { group });
      digests.push(digestOf(session.getState().document));
      const count = typed;
      void writing.then((written) => {
        if (written) saved = Math.max(saved, count);
      });
      waiting += 1;
      // Most pauses are long enough for the write; some keys follow at once.
      if (random(4) === 0) continue;
      await writing;
      if (writes <= last) waiting = 0;
    }
    await session.close();
    const found = digestOf((await sessionOf(openTab(name), id)).getState().document);
    const typed = digests.length - 1;
    const kept = digests.lastIndexOf(found);
    expect(typed).toBeGreaterThan(0);
    expect(kept).toBeGreaterThanOrEqual(saved);
    expect(typed - kept).toBeLessThanOrEqual(waiting);
  });
});
