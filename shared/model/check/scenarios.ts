import type { Question, Scenario } from '../document.ts';
import { error, type Issue, type Path } from '../issue.ts';
import { isSettingValue, withSetting } from '../setting.ts';
import type { Lookups } from './lookups.ts';
import { checkClock } from './question.ts';
import { checkStrategyFormula } from './references-of.ts';

type Override = Scenario['overrides'][number];

/** Overrides change things that exist, each once, to values that can be run. */
export function checkScenarios(lookups: Lookups): Issue[] {
  const variables = new Set(lookups.document.variables.map(({ id }) => id));
  return lookups.document.scenarios.flatMap((scenario, index) => {
    const path = ['scenarios', index, 'overrides'];
    return [
      ...scenario.overrides.flatMap((override, at) =>
        checkOverride(lookups, variables, override, [...path, at]),
      ),
      ...checkTargets(scenario.overrides, path),
      ...checkScenarioClock(lookups.document.question, scenario, path),
    ];
  });
}

function checkOverride(
  lookups: Lookups,
  variables: ReadonlySet<string>,
  override: Override,
  path: Path,
): Issue[] {
  switch (override.type) {
    case 'parameter':
      if (lookups.parameters.has(override.parameter)) return [];
      return [error('parameters.unknown', [...path, 'parameter'], { id: override.parameter })];
    case 'variable':
      return [
        ...(variables.has(override.variable)
          ? []
          : [error('variables.unknown', [...path, 'variable'], { id: override.variable })]),
        ...checkStrategyFormula(lookups, override.formula, [...path, 'formula']),
      ];
    case 'setting': {
      const { setting, value } = override;
      if (isSettingValue(setting, value)) return [];
      return [error('scenarios.badSetting', [...path, 'value'], { setting, got: value })];
    }
  }
}

function targetOf(override: Override): string {
  if (override.type === 'parameter') return override.parameter;
  return override.type === 'variable' ? override.variable : override.setting;
}

function checkTargets(overrides: readonly Override[], path: Path): Issue[] {
  const seen = new Set<string>();
  return overrides.flatMap((override, index) => {
    const target = targetOf(override);
    const key = `${override.type} ${target}`;
    if (seen.has(key)) return [error('scenarios.overriddenTwice', [...path, index], { target })];
    seen.add(key);
    return [];
  });
}

/** A scenario that changes the clock leaves one that can be run. */
function checkScenarioClock(question: Question, { overrides }: Scenario, path: Path): Issue[] {
  let changed = question;
  for (const override of overrides) {
    if (override.type !== 'setting' || !isSettingValue(override.setting, override.value)) continue;
    changed = withSetting(changed, override.setting, override.value);
  }
  const sameClock = changed.horizon === question.horizon && changed.counting === question.counting;
  return sameClock ? [] : checkClock(changed, path);
}
