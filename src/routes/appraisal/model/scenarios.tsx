import { useTranslation } from 'react-i18next';
import type { Scenario } from '../../../../shared/model/document.ts';
import {
  addScenario,
  type Override,
  overrideEdit,
  withoutOverride,
} from '../../../../shared/model/edit/add-scenario.ts';
import type { Place } from '../../../../shared/model/edit/edit.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { FormulaField } from '../../../features/formula-field/formula-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { Act, ItemActions } from '../editing/item-actions.tsx';
import { SectionHead } from './section-head.tsx';

const SETTINGS = ['horizon', 'discountCosts', 'discountOutcomes', 'counting'] as const;
type Setting = (typeof SETTINGS)[number];
const COUNTINGS = ['start', 'end', 'trapezoid', 'simpson'] as const;

/** Named what-ifs: what is different in each, and nothing else. */
export function Scenarios() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const add = () => {
    const label = t('model.scenarios.newLabel');
    edit(addScenario(document, { label }).edits, t('editing.acts.added', { what: label }));
  };
  return (
    <>
      <SectionHead
        title={t('model.scenarios.title', { count: document.scenarios.length })}
        lead={t('model.scenarios.lead')}
      >
        <button type="button" className="control-primary" onClick={add}>
          {t('model.scenarios.add')}
        </button>
      </SectionHead>
      <ul className="mt-5 border-t border-ink">
        {document.scenarios.map((scenario, index) => (
          <li key={scenario.id} className="border-b border-rule py-4">
            <ScenarioEditor scenario={scenario} index={index} />
          </li>
        ))}
      </ul>
    </>
  );
}

interface ScenarioProps {
  readonly scenario: Scenario;
  readonly index: number;
}

function ScenarioEditor({ scenario, index }: ScenarioProps) {
  const { t } = useTranslation();
  const { change, issuesAt } = useEditing();
  const { id, label, description, overrides } = scenario;
  const at: Place = ['scenarios', { id }];
  const own = issuesAt(['scenarios', index]).filter(({ path }) => !path.includes('formula'));
  return (
    <div className="grid gap-3">
      <div className="grid gap-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)]">
        <TextField
          label={t('editing.label')}
          required
          maxLength={300}
          value={label}
          onValue={(text) => change([...at, 'label'], text, label)}
        />
        <TextField
          label={t('model.scenarios.description')}
          value={description ?? ''}
          onValue={(text) => change([...at, 'description'], text === '' ? undefined : text, label)}
        />
      </div>
      <IssueLines issues={own} />
      <ul className="grid gap-3">
        {overrides.map((override, place) => (
          <li key={keyOf(override)} className="flex items-start gap-1 border-l-2 border-rule pl-3">
            <div className="min-w-0 flex-1">
              <OverrideEditor scenario={scenario} index={index} override={override} place={place} />
            </div>
            <Drop scenario={scenario} override={override} />
          </li>
        ))}
      </ul>
      <AddOverride scenario={scenario} />
      <ItemActions target={{ what: 'scenario', id }} label={label} />
    </div>
  );
}

function keyOf(override: Override): string {
  switch (override.type) {
    case 'parameter':
      return `parameter ${override.parameter}`;
    case 'variable':
      return `variable ${override.variable}`;
    case 'setting':
      return `setting ${override.setting}`;
  }
}

function useOverrideName(): (override: Override) => string {
  const { t } = useTranslation();
  const { document } = useEditing();
  return (override) => {
    switch (override.type) {
      case 'parameter': {
        const { parameter } = override;
        return document.parameters.find(({ id }) => id === parameter)?.label ?? parameter;
      }
      case 'variable': {
        const { variable } = override;
        return document.variables.find(({ id }) => id === variable)?.label ?? variable;
      }
      case 'setting':
        return t(`model.scenarios.settings.${override.setting}`);
    }
  };
}

function Drop({ scenario, override }: { scenario: Scenario; override: Override }) {
  const { t } = useTranslation();
  const { edit } = useEditing();
  const what = useOverrideName()(override);
  return (
    <Act
      name={t('editing.remove', { label: what })}
      onClick={() =>
        edit(
          [withoutOverride(scenario, override)],
          t('editing.acts.changed', { what: scenario.label }),
        )
      }
    >
      <path d="M4 4 L12 12 M12 4 L4 12" />
    </Act>
  );
}

interface OverrideProps extends ScenarioProps {
  readonly override: Override;
  readonly place: number;
}

function OverrideEditor(props: OverrideProps) {
  const { scenario, override } = props;
  const { t } = useTranslation();
  const { edit } = useEditing();
  const label = useOverrideName()(override);
  const put = (next: Override) =>
    edit(
      [overrideEdit(scenario, next)],
      t('editing.acts.changed', { what: scenario.label }),
      `override ${scenario.id} ${keyOf(next)}`,
    );
  switch (override.type) {
    case 'parameter':
      return (
        <NumberField
          label={label}
          value={override.value}
          onValue={(value) => put({ ...override, value })}
        />
      );
    case 'variable':
      return <VariableOverride {...props} label={label} override={override} put={put} />;
    case 'setting':
      return override.setting === 'counting' ? (
        <SelectField
          label={label}
          className="max-w-72"
          value={String(override.value)}
          options={COUNTINGS.map((each) => ({
            value: each,
            name: t(`question.countings.${each}`),
          }))}
          onValue={(value) => put({ ...override, value })}
        />
      ) : (
        <NumberField
          label={label}
          percent={override.setting !== 'horizon'}
          unit={override.setting === 'horizon' ? t('model.scenarios.years') : '%'}
          value={Number(override.value)}
          onValue={(value) => put({ ...override, value })}
        />
      );
  }
}

interface VariableOverrideProps extends OverrideProps {
  readonly override: Extract<Override, { type: 'variable' }>;
  readonly label: string;
  readonly put: (override: Override) => void;
}

/** Overrides have no ids: the formula is set with its list. */
function VariableOverride(props: VariableOverrideProps) {
  const { index, place, override, label, put } = props;
  const { document, names, issuesAt } = useEditing();
  const path = ['scenarios', index, 'overrides', place, 'formula'];
  const { formula } = override;
  const texts =
    typeof formula === 'string'
      ? [{ name: label, text: formula, at: path, set: (text: string) => text }]
      : Object.entries(formula.byStrategy).map(([id, text]) => ({
          name: `${label}: ${document.strategies.find((each) => each.id === id)?.label ?? id}`,
          text,
          at: [...path, 'byStrategy', id],
          set: (typed: string) => ({
            ...formula,
            byStrategy: { ...formula.byStrategy, [id]: typed },
          }),
        }));
  return (
    <div className="grid gap-2">
      {texts.map(({ name, text, at, set }) => (
        <FormulaField
          key={name}
          label={name}
          value={text}
          names={names}
          document={document}
          issues={issuesAt(at)}
          onChange={(typed) => put({ ...override, formula: set(typed) })}
        />
      ))}
    </div>
  );
}

function AddOverride({ scenario }: { scenario: Scenario }) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const { overrides } = scenario;
  const taken = new Set(overrides.map(keyOf));
  const options = [
    ...document.parameters.map(({ id, label }) => ({ value: `parameter ${id}`, name: label })),
    ...document.variables.map(({ id, label }) => ({ value: `variable ${id}`, name: label })),
    ...SETTINGS.map((setting) => ({
      value: `setting ${setting}`,
      name: t(`model.scenarios.settings.${setting}`),
    })),
  ].filter(({ value }) => !taken.has(value));
  const add = (key: string) => {
    const override = newOverride(document, key);
    if (!override) return;
    const what = scenario.label;
    edit([overrideEdit(scenario, override)], t('editing.acts.changed', { what }));
  };
  return (
    <SelectField
      label={t('model.scenarios.addOverride')}
      className="max-w-80"
      value=""
      options={[{ value: '', name: t('editing.choose') }, ...options]}
      onValue={add}
    />
  );
}

/** It begins as what the model says. */
function newOverride(
  { parameters, variables, question }: ReturnType<typeof useEditing>['document'],
  key: string,
): Override | null {
  const [type = '', id = ''] = key.split(' ');
  if (type === 'parameter') {
    const value = parameters.find((each) => each.id === id)?.value;
    return value === undefined ? null : { type, parameter: id, value };
  }
  if (type === 'variable') {
    const formula = variables.find((each) => each.id === id)?.formula;
    return formula === undefined ? null : { type, variable: id, formula };
  }
  const setting = SETTINGS.find((each) => each === id);
  return setting ? { type: 'setting', setting, value: settingValue(question, setting) } : null;
}

function settingValue(
  { horizon, discounting, counting }: ReturnType<typeof useEditing>['document']['question'],
  setting: Setting,
): number | string {
  const rate = (of: typeof discounting.costs) =>
    typeof of === 'number' ? of : (of.byYear[0] ?? 0);
  switch (setting) {
    case 'horizon':
      return horizon;
    case 'discountCosts':
      return rate(discounting.costs);
    case 'discountOutcomes':
      return rate(discounting.outcomes);
    case 'counting':
      return counting;
  }
}
