import { describe, expect, it } from 'vitest';
import { prepare } from '../../../shared/engine/engine.ts';
import { addScenario } from '../../../shared/model/edit/add-scenario.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import { applyScenario } from '../../../shared/model/scenario.ts';
import { moved, type Override, withLevers } from '../../../src/store/levers.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

const document = tinyDocument();
const [first] = document.parameters;
const parameter = first?.id ?? '';
const overrides: Override[] = [
  { type: 'parameter', parameter, value: 0.123 },
  { type: 'setting', setting: 'horizon', value: 5 },
];

describe('levers', () => {
  it('leave the model as it is', () => {
    const before = JSON.stringify(document);
    const changed = withLevers(document, overrides, 'what if');
    expect(JSON.stringify(document)).toBe(before);
    expect(changed.question.horizon).toBe(5);
    expect(changed.parameters[0]?.value).toBe(0.123);
    expect(changed.scenarios).toBe(document.scenarios);
  });

  it('are the model itself where there are none, or nothing that they move is left', () => {
    expect(withLevers(document, [], 'what if')).toBe(document);
    const gone: Override = { type: 'parameter', parameter: 'gone', value: 1 };
    expect(withLevers(document, [gone], 'what if')).toBe(document);
  });

  it('give the numbers of the scenario that they are kept as', () => {
    const { id, edits } = addScenario(document, { label: 'Kept', overrides });
    const kept = applyEdits(document, edits).document;
    const base = (of: typeof document) => prepare(of).base().strategies;
    expect(base(withLevers(document, overrides, 'what if'))).toEqual(base(applyScenario(kept, id)));
  });

  it('move one at a time', () => {
    const again: Override = { type: 'setting', setting: 'horizon', value: 7 };
    expect(moved(overrides, again)).toEqual([overrides[0], again]);
    const other: Override = { type: 'setting', setting: 'discountCosts', value: 0 };
    expect(moved(overrides, other)).toHaveLength(3);
  });
});
