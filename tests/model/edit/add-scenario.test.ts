import { expect, test } from 'vitest';
import {
  addScenario,
  type Override,
  overrideEdit,
  withoutOverride,
} from '../../../shared/model/edit/add-scenario.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { soundAfter } from './after.ts';

const tiny = tinyDocument();
const value = (number: number): Override => ({
  type: 'parameter',
  parameter: 'rr_die',
  value: number,
});
const horizon: Override = { type: 'setting', setting: 'horizon', value: 5 };

test('a scenario is kept with what it overrides', () => {
  const fields = { label: 'Better drug', description: 'As hoped', overrides: [value(0.5)] };
  const { id, edits } = addScenario(tiny, fields);
  expect(soundAfter(tiny, edits).scenarios).toEqual([{ id, ...fields }]);
  expect(
    soundAfter(tiny, addScenario(tiny, { label: 'None' }).edits).scenarios[0]?.overrides,
  ).toEqual([]);
});

test('each thing is overridden once, in its place', () => {
  const overrides = [value(0.5), horizon];
  let document = soundAfter(tiny, addScenario(tiny, { label: 'S', overrides }).edits);
  const now = () => document.scenarios[0]!;
  document = soundAfter(document, [overrideEdit(now(), value(0.6))]);
  expect(now().overrides).toEqual([value(0.6), horizon]);
  const formula: Override = { type: 'variable', variable: 'v_die', formula: '0.1' };
  document = soundAfter(document, [overrideEdit(now(), formula)]);
  expect(now().overrides).toEqual([value(0.6), horizon, formula]);
  document = soundAfter(document, [withoutOverride(now(), horizon)]);
  expect(now().overrides).toEqual([value(0.6), formula]);
});
