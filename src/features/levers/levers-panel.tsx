/** What if: a few values slid within what they may be; the model stays as it is. */
import { useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { formatPercent, formatValue } from '../../i18n/format.ts';
import { type Levers, moved, type Override, targetOf } from '../../store/levers.ts';
import type { Language } from '../../store/settings.ts';
import { rangeOf, rounded } from './range.ts';

export interface LeversPanelProps {
  /** The model as it is. */
  readonly document: ModelDocument;
  readonly levers: Levers;
  /** Keeps them in the model as a scenario; null where nothing can be kept. */
  readonly onKeep: ((label: string) => void) | null;
  readonly language: Language;
}

const FIELD = 'min-h-11 max-w-full rounded-md border border-rule-strong bg-raised px-2 text-ink';
const SETTINGS = ['discountCosts', 'discountOutcomes', 'horizon'] as const;

export function LeversPanel(props: LeversPanelProps) {
  const { levers, document } = props;
  const { t } = useTranslation();
  return (
    <div className="mt-3">
      <p className="max-w-[62em] text-sm text-mute">{t('levers.lead')}</p>
      <div className="mt-3 flex flex-wrap gap-x-5 gap-y-2">
        <Chooser {...props} />
        {document.scenarios.length > 0 && <Scenarios {...props} />}
      </div>
      {levers.overrides.length > 0 && (
        <>
          <ul className="mt-3 grid gap-x-10 md:grid-cols-2">
            {levers.overrides.map((override) => (
              <Lever key={targetOf(override)} {...props} override={override} />
            ))}
          </ul>
          <Ending {...props} />
        </>
      )}
    </div>
  );
}

/** Chooses what to slide. */
function Chooser({ document, levers }: LeversPanelProps) {
  const { t } = useTranslation();
  const field = useId();
  const taken = new Set(levers.overrides.map(targetOf));
  const free = (override: Override) =>
    !taken.has(targetOf(override)) && rangeOf(document, override) !== null;
  const parameters = document.parameters
    .map(({ id, value, label }) => ({ label, override: parameterLever(id, value) }))
    .filter(({ override }) => free(override));
  const settings = SETTINGS.map((setting) => ({
    label: t(`levers.settings.${setting}`),
    override: settingLever(document, setting),
  })).filter(({ override }) => free(override));
  const choose = (target: string) => {
    const found = [...settings, ...parameters].find((each) => targetOf(each.override) === target);
    if (found) levers.set([...levers.overrides, found.override]);
  };
  const options = (list: typeof parameters) =>
    list.map(({ label, override }) => (
      <option key={targetOf(override)} value={targetOf(override)}>
        {label}
      </option>
    ));
  return (
    <label htmlFor={field} className="grid max-w-full gap-1">
      <span className="text-sm text-mute">{t('levers.choose')}</span>
      <select
        id={field}
        className={`${FIELD} w-80`}
        value=""
        onChange={(event) => choose(event.target.value)}
      >
        <option value="">{t('levers.none')}</option>
        <optgroup label={t('levers.settingsGroup')}>{options(settings)}</optgroup>
        <optgroup label={t('levers.parametersGroup')}>{options(parameters)}</optgroup>
      </select>
    </label>
  );
}

/** Starts from a scenario of the model. */
function Scenarios({ document, levers }: LeversPanelProps) {
  const { t } = useTranslation();
  const field = useId();
  const start = (id: string) => {
    const found = document.scenarios.find((scenario) => scenario.id === id);
    if (found) levers.set(found.overrides);
  };
  return (
    <label htmlFor={field} className="grid max-w-full gap-1">
      <span className="text-sm text-mute">{t('levers.scenario')}</span>
      <select
        id={field}
        className={`${FIELD} w-64`}
        value=""
        onChange={(event) => start(event.target.value)}
      >
        <option value="">{t('levers.noScenario')}</option>
        {document.scenarios.map(({ id, label }) => (
          <option key={id} value={id}>
            {label}
          </option>
        ))}
      </select>
    </label>
  );
}

function Lever(props: LeversPanelProps & { override: Override }) {
  const { document, levers, override, language } = props;
  const { t } = useTranslation();
  const field = useId();
  const range = rangeOf(document, override);
  const { name, unit } = namesOf(document, override, t('levers.years'));
  const label = override.type === 'setting' ? t(`levers.settings.${override.setting}`) : name;
  const write = (value: number) =>
    override.type === 'setting' && override.setting !== 'horizon'
      ? formatPercent(value, language)
      : `${formatValue(value, language)} ${unit}`.trim();
  const ends = (value: number) =>
    unit === '' || override.type === 'setting' ? write(value) : formatValue(value, language);
  const drop = () =>
    levers.set(levers.overrides.filter((each) => targetOf(each) !== targetOf(override)));
  const value = override.type === 'variable' ? override.formula : override.value;
  return (
    <li className="border-b border-rule py-2">
      <div className="flex items-baseline gap-3">
        <label htmlFor={field} className="min-w-0 font-bold break-words">
          {label}
        </label>
        <button
          type="button"
          className="ml-auto min-h-8 text-sm underline underline-offset-4"
          aria-label={t('levers.dropNamed', { what: label })}
          onClick={drop}
        >
          {t('levers.dropOne')}
        </button>
      </div>
      {range && typeof value === 'number' ? (
        <>
          <input
            id={field}
            type="range"
            className="block h-8 w-full accent-brass"
            min={range.low}
            max={range.high}
            step={range.step}
            value={value}
            aria-valuetext={write(value)}
            onChange={(event) =>
              levers.set(
                moved(levers.overrides, withValue(override, rounded(Number(event.target.value)))),
              )
            }
          />
          <p className="flex flex-wrap justify-between gap-x-3 text-sm text-mute">
            <span>{ends(range.low)}</span>
            <output htmlFor={field} className="font-bold text-ink">
              {write(value)}{' '}
              <span className="font-normal text-brass">
                {value !== range.base && t('strip.was', { before: write(range.base) })}
              </span>
            </output>
            <span>{ends(range.high)}</span>
          </p>
        </>
      ) : (
        <output id={field} className="block text-sm break-words">
          {typeof value === 'object' ? JSON.stringify(value) : String(value)}
        </output>
      )}
    </li>
  );
}

/** Keep them as a scenario, or drop them. */
function Ending({ document, levers, onKeep }: LeversPanelProps) {
  const { t } = useTranslation();
  const field = useId();
  const [label, setLabel] = useState('');
  const [kept, setKept] = useState<string | null>(null);
  const suggested = t('levers.suggested', {
    names: levers.overrides
      .map((override) =>
        override.type === 'setting'
          ? t(`levers.settings.${override.setting}`)
          : namesOf(document, override, '').name,
      )
      .join(', '),
  }).slice(0, LONGEST_LABEL);
  const keep = () => {
    const name = label.trim() || suggested;
    onKeep?.(name);
    setKept(name);
    setLabel('');
  };
  return (
    <div className="mt-3 flex flex-wrap items-end gap-3">
      {onKeep && (
        <>
          <label htmlFor={field} className="grid max-w-full gap-1">
            <span className="text-sm text-mute">{t('levers.name')}</span>
            <input
              id={field}
              className={`${FIELD} w-80`}
              value={label}
              maxLength={LONGEST_LABEL}
              placeholder={suggested}
              onChange={(event) => setLabel(event.target.value)}
            />
          </label>
          <button type="button" className="control-primary" onClick={keep}>
            {t('levers.keep')}
          </button>
        </>
      )}
      <button type="button" className="control" onClick={() => levers.set([])}>
        {t('levers.drop')}
      </button>
      <p role="status" className="text-sm text-mute">
        {kept !== null && t('levers.kept', { label: kept })}
      </p>
    </div>
  );
}

/** As the document allows. */
const LONGEST_LABEL = 300;

function parameterLever(parameter: string, value: number): Override {
  return { type: 'parameter', parameter, value };
}

function settingLever({ question }: ModelDocument, setting: (typeof SETTINGS)[number]): Override {
  const { costs, outcomes } = question.discounting;
  const rate = { horizon: question.horizon, discountCosts: costs, discountOutcomes: outcomes };
  const value = rate[setting];
  // Rates by year do not slide: `rangeOf` leaves them out.
  return { type: 'setting', setting, value: typeof value === 'number' ? value : 0 };
}

function withValue(override: Override, value: number): Override {
  return override.type === 'variable' ? override : { ...override, value };
}

function namesOf(document: ModelDocument, override: Override, years: string) {
  if (override.type === 'setting') return { name: override.setting, unit: years };
  const found =
    override.type === 'parameter'
      ? document.parameters.find(({ id }) => id === override.parameter)
      : document.variables.find(({ id }) => id === override.variable);
  return { name: found?.label ?? '', unit: found?.unit ?? '' };
}
