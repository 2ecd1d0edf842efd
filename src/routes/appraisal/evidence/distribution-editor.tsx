import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { checkDistribution } from '../../../../shared/engine/distributions/check.ts';
import {
  distributionOf,
  type OwnDistribution,
} from '../../../../shared/engine/distributions/distribution.ts';
import type { Univariate } from '../../../../shared/engine/distributions/univariate.ts';
import type { Parameter } from '../../../../shared/model/document.ts';
import type { Json, Place } from '../../../../shared/model/edit/edit.ts';
import { leaveGroups } from '../../../../shared/model/edit/ungroup.ts';
import { hasErrors } from '../../../../shared/model/issue.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { numberText, parseNumber } from '../../../i18n/parse-number.ts';
import { useEditing } from '../editing/context.tsx';
import { Density } from './density.tsx';
import { distributionTypes, type OwnType, startingAt } from './distribution-choice.ts';
import { FitForm } from './fit-form.tsx';

/** How sure a value is: family, its numbers, ways to find them, and what they look like. */
export function DistributionEditor({ parameter }: { parameter: Parameter }) {
  const { distribution } = parameter;
  if (distribution.type === 'inGroup') {
    return <InGroup parameter={parameter} group={distribution.group} />;
  }
  return <OwnEditor parameter={parameter} distribution={distribution} />;
}

function InGroup({ parameter, group }: { parameter: Parameter; group: string }) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const label = document.groups.find(({ id }) => id === group)?.label ?? group;
  return (
    <div>
      <p>{t('register.inGroup', { group: label })}</p>
      <button
        type="button"
        className="control mt-2"
        onClick={() =>
          edit(leaveGroups(document, parameter.id), t('register.left', { what: parameter.label }))
        }
      >
        {t('register.leave')}
      </button>
    </div>
  );
}

interface OwnEditorProps {
  readonly parameter: Parameter;
  readonly distribution: OwnDistribution;
}

function OwnEditor({ parameter, distribution }: OwnEditorProps) {
  const { t } = useTranslation();
  const { language, change } = useEditing();
  const { id, label, kind, value, unit } = parameter;
  const at: Place = ['parameters', { id }, 'distribution'];
  const law = useLaw(parameter, distribution);
  const choose = (type: OwnType) => {
    const spread = law ? Math.sqrt(law.variance) : 0;
    change(at, startingAt(type, value, spread, kind) as unknown as Json, label);
  };
  return (
    <div className="grid gap-x-8 gap-y-3 md:grid-cols-[1fr_minmax(0,22rem)]">
      <div className="grid content-start gap-3">
        <SelectField<OwnType>
          label={t('evidence.distribution')}
          className="max-w-72"
          value={distribution.type}
          options={distributionTypes(kind).map((type) => ({
            value: type,
            name: t(`distributions.${type}`),
          }))}
          onValue={choose}
        />
        <Numbers parameter={parameter} distribution={distribution} at={at} />
        <FitForm key={distribution.type} parameter={parameter} type={distribution.type} />
      </div>
      {law && distribution.type !== 'fixed' && (
        <Density law={law} value={value} unit={unit} language={language} />
      )}
    </div>
  );
}

/** Null while the numbers make no distribution. */
function useLaw(parameter: Parameter, distribution: OwnDistribution): Univariate | null {
  return useMemo(() => {
    const own = checkDistribution({ ...parameter, distribution }, []);
    const broken = own.filter(({ code }) => code !== 'distribution.valueOutside');
    return hasErrors(broken) ? null : distributionOf(distribution, parameter.value);
  }, [parameter, distribution]);
}

interface NumbersProps extends OwnEditorProps {
  readonly at: Place;
}

const NAMES = {
  mean: true,
  sd: true,
  meanlog: true,
  sdlog: true,
  alpha: true,
  beta: true,
  shape: true,
  scale: true,
  rate: true,
  low: true,
  mode: true,
  high: true,
  weight: true,
  mu: true,
  sigma: true,
  q: true,
} as const;
type NumberName = keyof typeof NAMES;

/** Must be above 0, whatever the family. */
const ABOVE_0: readonly string[] = [
  'sd',
  'sdlog',
  'alpha',
  'beta',
  'scale',
  'rate',
  'weight',
  'sigma',
];

function Numbers({ parameter, distribution, at }: NumbersProps) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const { label } = parameter;
  if (distribution.type === 'empirical') {
    return <Values at={at} values={distribution.values} label={label} />;
  }
  if (distribution.type === 'fixed') {
    return (
      <TextField
        label={t('register.reason')}
        value={distribution.reason ?? ''}
        onValue={(text) => change([...at, 'reason'], text === '' ? undefined : text, label)}
      />
    );
  }
  const numbers = Object.entries(distribution).filter((entry): entry is [NumberName, number] =>
    Object.hasOwn(NAMES, entry[0]),
  );
  return (
    <div className="flex flex-wrap gap-3">
      {numbers.map(([name, number]) => (
        <NumberField
          key={name}
          className="w-36"
          label={t(`register.numbers.${name}`)}
          value={number}
          {...(needsAbove0(distribution.type, name) ? { above: 0 } : {})}
          onValue={(typed) => change([...at, name], typed, label)}
        />
      ))}
    </div>
  );
}

function needsAbove0(type: OwnType, name: string): boolean {
  return ABOVE_0.includes(name) || (name === 'shape' && type !== 'gompertz');
}

/** Draws pasted from elsewhere, one a line or parted by blanks, tabs or semicolons. */
function Values(props: { at: Place; values: readonly number[]; label: string }) {
  const { t } = useTranslation();
  const { language, change } = useEditing();
  const { at, values, label } = props;
  const read = (text: string) =>
    text
      .split(/[\s;]+/)
      .filter((piece) => piece !== '')
      .map((piece) => parseNumber(piece, language));
  return (
    <TextField
      label={t('register.values')}
      help={t('register.valuesCount', { count: values.length })}
      lines={5}
      required
      value={values.map((value) => numberText(value, language)).join('\n')}
      check={(text) => (read(text).includes(null) ? t('form.noNumber') : null)}
      onValue={(text) => {
        const numbers = read(text).filter((number) => number !== null);
        if (numbers.length > 0) change([...at, 'values'], numbers, label);
      }}
    />
  );
}
