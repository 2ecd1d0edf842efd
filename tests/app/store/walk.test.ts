/** A seeded walk of edits, undos, redos, versions and reloads; `FUZZ_SEED` takes another. */
import { expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { Dice, randomEdit } from '../../model/edit/random-edits.ts';
import { freshName, madeAppraisal, openTab, sessionOf } from './support.ts';

const SEED = Number(process.env.FUZZ_SEED ?? 20_261_201);

it(`is there whole after every reload, and undoing all gives the first digest (${SEED})`, async () => {
  const dice = new Dice(SEED);
  const name = freshName();
  const id = await madeAppraisal(openTab(name));
  let session = await sessionOf(openTab(name), id);
  const did = { edits: 0, undos: 0, redos: 0, versions: 0, reloads: 0 };
  for (let turn = 0; turn < 400; turn++) {
    const chance = dice.next();
    if (chance < 0.6) {
      const group = dice.next() < 0.3 ? { group: 'field' } : {};
      const edits = [randomEdit(session.getState().document, dice)];
      const writing = session.edit(edits, `edit ${turn}`, group);
      if (dice.next() < 0.5) expect(await writing).toBe(true);
      did.edits += 1;
    } else if (chance < 0.8) did.undos += (await session.undo()) ? 1 : 0;
    else if (chance < 0.93) did.redos += (await session.redo()) ? 1 : 0;
    else if (chance < 0.96) {
      await session.saveVersion(`version ${turn}`);
      did.versions += 1;
    } else {
      const before = session.getState();
      await session.close();
      session = await sessionOf(openTab(name), id);
      const { document, undo, redo } = session.getState();
      expect(digestOf(document)).toBe(digestOf(before.document));
      expect([undo, redo]).toEqual([before.undo, before.redo]);
      did.reloads += 1;
    }
  }
  expect(Math.min(...Object.values(did))).toBeGreaterThan(3);
  while (session.getState().undo) expect(await session.undo()).toBe(true);
  expect(digestOf(session.getState().document)).toBe(digestOf(tinyDocument()));
  expect(session.getState().notices).toEqual([]);
});
