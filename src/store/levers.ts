/** What-ifs: the model with a few values set otherwise, while the model stays as it is. */
import type { ModelDocument, Scenario } from '../../shared/model/document.ts';
import { applyScenario } from '../../shared/model/scenario.ts';

export type Override = Scenario['overrides'][number];

export interface Levers {
  /** None: the model as it is. */
  readonly overrides: readonly Override[];
  readonly set: (overrides: readonly Override[]) => void;
}

/** No document has it: what a scenario of the document is called is left alone. */
const ID = 'levers-in-force';

/**
 * The document with levers in force: as a scenario of the same overrides would make it.
 * What it no longer holds is left out.
 * @param reason said of parameters that are chosen rather than uncertain
 */
export function withLevers(
  document: ModelDocument,
  overrides: readonly Override[],
  reason: string,
): ModelDocument {
  const known = overrides.filter((override) => holds(document, override));
  if (known.length === 0) return document;
  const scenario = { id: ID, label: reason, overrides: known };
  const changed = applyScenario({ ...document, scenarios: [scenario] }, ID);
  return { ...changed, scenarios: document.scenarios };
}

/** Puts one lever in place of the one of the same target, or adds it. */
export function moved(overrides: readonly Override[], override: Override): Override[] {
  const index = overrides.findIndex((each) => targetOf(each) === targetOf(override));
  return index < 0 ? [...overrides, override] : overrides.with(index, override);
}

export function targetOf(override: Override): string {
  switch (override.type) {
    case 'parameter':
      return `parameter ${override.parameter}`;
    case 'variable':
      return `variable ${override.variable}`;
    case 'setting':
      return `setting ${override.setting}`;
  }
}

function holds({ parameters, variables }: ModelDocument, override: Override): boolean {
  if (override.type === 'parameter') return parameters.some(({ id }) => id === override.parameter);
  if (override.type === 'variable') return variables.some(({ id }) => id === override.variable);
  return true;
}
