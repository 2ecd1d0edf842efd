import { type ReactNode, useDeferredValue, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';
import { addParameter } from '../../../../shared/formula/edit/add-parameter.ts';
import type { Parameter } from '../../../../shared/model/document.ts';
import { Field, INPUT } from '../../../components/form/field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { ExplainButton } from '../../../features/explain/explain-button.tsx';
import { distributionWords } from '../../../i18n/distribution-words.ts';
import { formatNumber, formatValue } from '../../../i18n/format.ts';
import { useEditing } from '../editing/context.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { placeOf } from '../use-sought.ts';
import { FILTERS, type Filter, sought } from './filter.ts';
import { ParameterEditor } from './parameter-editor.tsx';

/** The parameter opened is in the address, so that other places can lead here. */
function useOpened() {
  const [search, setSearch] = useSearchParams();
  const open = (id: string | null) =>
    setSearch(id === null ? {} : { parameter: id }, { replace: true, preventScrollReset: true });
  return [search.get('parameter'), open] as const;
}

export function Register() {
  const { t } = useTranslation();
  const { document, issues, language, edit } = useEditing();
  const [opened, open] = useOpened();
  const [text, setText] = useState('');
  const [filter, setFilter] = useState<Filter>('all');
  const { parameters } = document;
  const key = useDeferredValue(text);
  const found = sought(parameters, issues, key, filter, language);
  // The one that is open stays, whatever is sought: it is being worked on, or was led to.
  const shown = parameters.filter((one) => one.id === opened || found.includes(one));
  const uncertain = parameters.filter(({ distribution }) => distribution.type !== 'fixed').length;
  const add = () => {
    const { edits, id } = addParameter(document, { label: t('register.newLabel') });
    edit(edits, t('editing.acts.added', { what: t('register.newLabel') }));
    setText('');
    setFilter('all');
    open(id);
  };
  return (
    <>
      <h1 className="mt-7 text-2xl">
        {t('evidence.title', {
          count: parameters.length,
          uncertain: formatNumber(uncertain, language),
        })}
      </h1>
      <div className="mt-4 flex flex-wrap items-end gap-x-4 gap-y-2">
        <Field label={t('evidence.find')} className="w-64 max-w-full">
          {(parts) => (
            <input
              {...parts}
              type="search"
              className={INPUT}
              value={text}
              onChange={(event) => setText(event.target.value)}
            />
          )}
        </Field>
        <SelectField<Filter>
          label={t('register.filter')}
          className="w-56 max-w-full"
          value={filter}
          options={FILTERS.map((each) => ({ value: each, name: t(`register.filters.${each}`) }))}
          onValue={setFilter}
        />
        <button type="button" className="control-primary" onClick={add}>
          {t('register.add')}
        </button>
        <p role="status" className="text-sm text-mute">
          {(key !== '' || filter !== 'all') && t('evidence.found', { count: found.length })}
        </p>
      </div>
      {parameters.length === 0 && (
        <p className="mt-6 max-w-prose text-mute">{t('register.empty')}</p>
      )}
      <div
        aria-hidden="true"
        className="mt-5 grid border-b border-ink pb-1.5 text-sm text-mute max-md:hidden md:grid-cols-[1.5fr_6.5rem_1fr_1.2fr_11rem] md:gap-x-5"
      >
        <span>{t('evidence.parameter')}</span>
        <span className="text-right">{t('evidence.value')}</span>
        <span>{t('evidence.distribution')}</span>
        <span>{t('evidence.source')}</span>
      </div>
      <ul className="max-md:mt-3 max-md:border-t max-md:border-ink">
        {shown.map((parameter) => (
          <Entry
            key={parameter.id}
            parameter={parameter}
            index={parameters.indexOf(parameter)}
            isOpen={parameter.id === opened}
            onOpen={open}
          />
        ))}
      </ul>
    </>
  );
}

interface EntryProps {
  readonly parameter: Parameter;
  readonly index: number;
  readonly isOpen: boolean;
  readonly onOpen: (id: string | null) => void;
}

function Entry({ parameter, index, isOpen, onOpen }: EntryProps) {
  const { t } = useTranslation();
  const { document, language, issuesAt } = useEditing();
  const { id, symbol, label, unit, value, source, distribution, notes } = parameter;
  const wrong = issuesAt(['parameters', index]);
  const isBroken = wrong.some(({ severity }) => severity === 'error');
  return (
    <li className="border-b border-rule py-3">
      <div className="md:grid md:grid-cols-[1.5fr_6.5rem_1fr_1.2fr_11rem] md:gap-x-5">
        <div className="min-w-0">
          <button
            id={placeOf(id)}
            type="button"
            aria-expanded={isOpen}
            onClick={() => onOpen(isOpen ? null : id)}
            className="inline-flex min-h-7 items-start gap-2 text-left font-bold hover:text-brass"
          >
            <span aria-hidden="true" className="text-brass">
              {isOpen ? '▾' : '▸'}
            </span>
            {label === '' ? symbol : label}
          </button>
          <p className="text-sm break-words text-mute">
            <code className="font-sans">{symbol}</code> · {t(`kinds.${parameter.kind}`)}
            {isBroken && <span className="text-clay"> · {t('register.broken')}</span>}
          </p>
          {notes && !isOpen && <p className="mt-1 text-sm text-mute">{notes}</p>}
        </div>
        <Part name={t('evidence.value')} numeric>
          {formatValue(value, language)}
          <span className="text-sm text-mute md:block"> {unit}</span>
        </Part>
        <Part name={t('evidence.distribution')}>
          {distributionWords(distribution, document, t, language)}
          {distribution.type === 'fixed' && distribution.reason && (
            <span className="block text-sm text-mute">{distribution.reason}</span>
          )}
        </Part>
        <Part name={t('evidence.source')}>
          <span className="text-sm">
            {source.citation === '' ? t('register.noSource') : source.citation}
          </span>
          {source.page && <span className="text-sm">, {source.page}</span>}
          {source.invented && (
            <span className="block text-sm text-brass">{t('appraisals.invented')}</span>
          )}
        </Part>
        <div className="max-md:mt-1">
          <ItemActions target={{ what: 'parameter', id }} label={label} onCopy={onOpen} />
          <ExplainButton subject={{ what: 'parameter', parameter: id }} of={label} />
        </div>
      </div>
      {isOpen && (
        <div className="mt-3">
          <ParameterEditor parameter={parameter} index={index} />
        </div>
      )}
    </li>
  );
}

function Part(props: { name: string; numeric?: boolean; children: ReactNode }) {
  return (
    <div className={`mt-1.5 min-w-0 break-words md:mt-0 ${props.numeric ? 'md:text-right' : ''}`}>
      <span className="mr-2 text-sm text-mute md:hidden">{props.name}</span>
      {props.children}
    </div>
  );
}
