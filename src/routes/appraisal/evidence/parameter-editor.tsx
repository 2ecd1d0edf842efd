import { useTranslation } from 'react-i18next';
import type { Parameter } from '../../../../shared/model/document.ts';
import type { Json, Place } from '../../../../shared/model/edit/edit.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { KindSelect } from '../editing/kind-select.tsx';
import { SymbolField } from '../editing/symbol-field.tsx';
import { DistributionEditor } from './distribution-editor.tsx';

interface PartProps {
  readonly parameter: Parameter;
}

/** Everything that is known of one parameter, to be changed. */
export function ParameterEditor({ parameter, index }: PartProps & { readonly index: number }) {
  const { issuesAt } = useEditing();
  return (
    <div className="grid gap-5 border-l-2 border-brass py-2 pl-4">
      <IssueLines issues={issuesAt(['parameters', index])} />
      <Naming parameter={parameter} />
      <DistributionEditor parameter={parameter} />
      <Source parameter={parameter} />
      <Grade parameter={parameter} />
    </div>
  );
}

function Naming({ parameter }: PartProps) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const { id, label, symbol, unit, kind, value } = parameter;
  const at: Place = ['parameters', { id }];
  return (
    <div className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
      <TextField
        label={t('editing.label')}
        className="sm:col-span-2"
        required
        maxLength={300}
        value={label}
        onValue={(text) => change([...at, 'label'], text, label)}
      />
      <SymbolField named={{ what: 'parameter', id }} symbol={symbol} />
      <NumberField
        label={t('evidence.value')}
        value={value}
        onValue={(number) => change([...at, 'value'], number, label)}
      />
      <TextField
        label={t('editing.unit')}
        maxLength={60}
        value={unit}
        onValue={(text) => change([...at, 'unit'], text, label)}
      />
      <KindSelect value={kind} onValue={(next) => change([...at, 'kind'], next, label)} />
    </div>
  );
}

function Source({ parameter }: PartProps) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const { id, label, source, notes } = parameter;
  const at: Place = ['parameters', { id }, 'source'];
  const optional = (field: string) => (text: string) =>
    change([...at, field], text === '' ? undefined : text, label);
  return (
    <div className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
      <TextField
        label={t('evidence.source')}
        className="sm:col-span-2 lg:col-span-3"
        lines={2}
        value={source.citation}
        onValue={(text) => change([...at, 'citation'], text, label)}
      />
      <TextField
        label={t('register.page')}
        maxLength={60}
        value={source.page ?? ''}
        onValue={optional('page')}
      />
      <TextField
        label={t('register.url')}
        className="lg:col-span-2"
        maxLength={2000}
        value={source.url ?? ''}
        onValue={optional('url')}
      />
      <label className="flex min-h-11 items-center gap-2">
        <input
          type="checkbox"
          className="size-4 accent-brass"
          checked={source.invented ?? false}
          onChange={({ target }) =>
            change([...at, 'invented'], target.checked ? true : undefined, label)
          }
        />
        {t('register.invented')}
      </label>
      <TextField
        label={t('editing.notes')}
        className="sm:col-span-2 lg:col-span-3"
        lines={2}
        value={notes ?? ''}
        onValue={(text) =>
          change(['parameters', { id }, 'notes'], text === '' ? undefined : text, label)
        }
      />
    </div>
  );
}

const LEVELS = ['high', 'moderate', 'low', 'veryLow', 'notGraded'] as const;
type Level = (typeof LEVELS)[number];

function Grade({ parameter }: PartProps) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const { id, label, grade } = parameter;
  const at: Place = ['parameters', { id }, 'grade'];
  const put = (fields: Partial<NonNullable<Parameter['grade']>>) => {
    const next = { ...(grade ?? { level: 'notGraded' as const }), ...fields };
    const filled = Object.entries(next).filter(([, value]) => value !== '');
    change(at, Object.fromEntries(filled) as Json, label);
  };
  return (
    <div className="grid gap-3 sm:grid-cols-3">
      <SelectField<Level>
        label={t('register.grade')}
        value={grade?.level ?? 'notGraded'}
        options={LEVELS.map((level) => ({ value: level, name: t(`register.levels.${level}`) }))}
        onValue={(level) => put({ level })}
      />
      <TextField
        label={t('register.gradedBy')}
        maxLength={200}
        value={grade?.by ?? ''}
        onValue={(by) => put({ by })}
      />
      <TextField
        label={t('register.gradedHow')}
        maxLength={200}
        value={grade?.method ?? ''}
        onValue={(method) => put({ method })}
      />
    </div>
  );
}
