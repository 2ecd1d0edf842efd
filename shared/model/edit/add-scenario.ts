/**
 *   addScenario(document, { label, description?, overrides? }): Added
 *   overrideEdit(scenario, override): Edit      sets it, in place of one of the same target
 *   withoutOverride(scenario, override): Edit   drops it
 */
import type { ModelDocument, Scenario } from '../document.ts';
import { type Added, adding, newId } from './add.ts';
import type { Edit, Json } from './edit.ts';

export type Override = Scenario['overrides'][number];

export interface NewScenario {
  readonly label: string;
  readonly description?: string;
  readonly overrides?: readonly Override[];
}

export function addScenario(document: ModelDocument, fields: NewScenario): Added {
  const { overrides = [], ...words } = fields;
  const id = newId(document, 'scenario', fields.label);
  return { id, edits: [adding('scenario', { id, ...words, overrides } as Scenario)] };
}

export function overrideEdit(scenario: Scenario, override: Override): Edit {
  const { overrides } = scenario;
  const index = overrides.findIndex((each) => targetOf(each) === targetOf(override));
  return setOverrides(
    scenario,
    index < 0 ? [...overrides, override] : overrides.with(index, override),
  );
}

export function withoutOverride(scenario: Scenario, override: Override): Edit {
  const target = targetOf(override);
  return setOverrides(
    scenario,
    scenario.overrides.filter((each) => targetOf(each) !== target),
  );
}

function setOverrides({ id }: Scenario, overrides: readonly Override[]): Edit {
  return { type: 'set', at: ['scenarios', { id }, 'overrides'], value: overrides as Json };
}

/** What an override changes; a scenario overrides nothing twice. */
function targetOf(override: Override): string {
  switch (override.type) {
    case 'parameter':
      return `parameter ${override.parameter}`;
    case 'variable':
      return `variable ${override.variable}`;
    case 'setting':
      return `setting ${override.setting}`;
  }
}
