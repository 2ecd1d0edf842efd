import { expect, test } from 'vitest';
import type { Place } from '../../../shared/model/edit/edit.ts';
import { labelAt } from '../../../shared/model/edit/label-at.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const id = (name: string) => ({ id: name });

test.each<[Place, string]>([
  [['strategies', id('usual')], 'Usual care'],
  [['parameters', id('rr_die'), 'distribution', 'sdlog'], 'Relative risk of dying on treatment'],
  [['movements', 'rows', id('from_alive')], 'Alive'],
  [['movements', 'rows', id('from_alive'), 'cells', id('alive_dead'), 'formula'], 'Alive → Dead'],
  [['payoffs', id('drug'), 'amounts', id('drug_alive')], 'Treatment: Alive'],
  [['question', 'horizon'], ''],
  [['states', id('gone'), 'label'], ''],
  [['question', 'title', 'nowhere', id('x')], ''],
])('at %j it is called %j', (place, label) => {
  expect(labelAt(tinyDocument(), place)).toBe(label);
});
