/**
 * A scenario put in force: the same document with other values. A parameter that a
 * scenario sets is chosen, not uncertain: its distribution becomes `fixed`, with the
 * scenario's label as the reason.
 */
import type { ModelDocument, Parameter, Scenario } from './document.ts';
import { DocumentError, error } from './issue.ts';
import { withoutFixed } from './scenario-groups.ts';
import { withSetting } from './setting.ts';

type Override = Scenario['overrides'][number];

/** Pure. Throws a DocumentError (`scenarios.unknown`) where no scenario has this id. */
export function applyScenario(document: ModelDocument, scenarioId: string): ModelDocument {
  const scenario = document.scenarios.find(({ id }) => id === scenarioId);
  if (!scenario) throw new DocumentError([error('scenarios.unknown', [], { id: scenarioId })]);
  const fixed = new Map<string, number>();
  const overridden = scenario.overrides.reduce(
    (current, override) => applyOverride(current, override, fixed),
    document,
  );
  return fixParameters(overridden, fixed, scenario.label);
}

function applyOverride(
  document: ModelDocument,
  override: Override,
  fixed: Map<string, number>,
): ModelDocument {
  switch (override.type) {
    case 'parameter':
      fixed.set(override.parameter, override.value);
      return document;
    case 'variable': {
      const { variable, formula } = override;
      const variables = document.variables.map((each) =>
        each.id === variable ? { ...each, formula } : each,
      );
      return { ...document, variables };
    }
    case 'setting': {
      const { setting, value } = override;
      return { ...document, question: withSetting(document.question, setting, value) };
    }
  }
}

function fixParameters(
  document: ModelDocument,
  fixed: ReadonlyMap<string, number>,
  reason: string,
): ModelDocument {
  if (fixed.size === 0) return document;
  const { groups, alone } = withoutFixed(document.groups, new Set(fixed.keys()));
  const parameters = document.parameters.map((parameter): Parameter => {
    const value = fixed.get(parameter.id);
    if (value !== undefined)
      return { ...parameter, value, distribution: { type: 'fixed', reason } };
    const distribution = alone.get(parameter.id);
    return distribution ? { ...parameter, distribution } : parameter;
  });
  return { ...document, groups, parameters };
}
