import { type ReactNode, useDeferredValue, useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument, Parameter } from '../../../../shared/model/document.ts';
import { usePageTitle } from '../../../components/page-title.ts';
import { distributionWords } from '../../../i18n/distribution-words.ts';
import { formatNumber, formatValue } from '../../../i18n/format.ts';
import type { Language } from '../../../store/settings.ts';
import { useAppraisalContext } from '../context.ts';

/** The evidence register: every parameter, how sure it is, and where it comes from. */
export function Component() {
  const { t } = useTranslation();
  const { document, language } = useAppraisalContext();
  usePageTitle(t('steps.evidence'), document?.question.title ?? '');
  if (!document) {
    return (
      <>
        <h1 className="mt-7 text-2xl">{t('steps.evidence')}</h1>
        <p className="mt-2 text-mute">{t('broken.body')}</p>
      </>
    );
  }
  return <Register document={document} language={language} />;
}

interface RegisterProps {
  readonly document: ModelDocument;
  readonly language: Language;
}

function Register({ document, language }: RegisterProps) {
  const { t } = useTranslation();
  const field = useId();
  const [sought, setSought] = useState('');
  const { parameters } = document;
  const found = matching(parameters, useDeferredValue(sought), language);
  const uncertain = parameters.filter(({ distribution }) => distribution.type !== 'fixed').length;
  return (
    <>
      <h1 className="mt-7 text-2xl">
        {t('evidence.title', {
          count: parameters.length,
          uncertain: formatNumber(uncertain, language),
        })}
      </h1>
      <div className="mt-4 flex flex-wrap items-center gap-x-3 gap-y-2">
        <label htmlFor={field} className="text-mute">
          {t('evidence.find')}
        </label>
        <input
          id={field}
          type="search"
          value={sought}
          onChange={(event) => setSought(event.target.value)}
          className="min-h-11 w-64 max-w-full rounded-md border border-rule-strong bg-raised px-3"
        />
        <p role="status" className="text-sm text-mute">
          {sought !== '' && t('evidence.found', { count: found.length })}
        </p>
      </div>
      <div className="mt-4 grid border-b border-ink pb-1.5 text-sm text-mute max-md:hidden md:grid-cols-[1.5fr_6.5rem_1fr_1.4fr] md:gap-x-5">
        <span>{t('evidence.parameter')}</span>
        <span className="text-right">{t('evidence.value')}</span>
        <span>{t('evidence.distribution')}</span>
        <span>{t('evidence.source')}</span>
      </div>
      <ul className="max-md:mt-3 max-md:border-t max-md:border-ink">
        {found.map((parameter) => (
          <Entry key={parameter.id} parameter={parameter} document={document} language={language} />
        ))}
      </ul>
    </>
  );
}

function Entry({ parameter, document, language }: RegisterProps & { parameter: Parameter }) {
  const { t } = useTranslation();
  const { symbol, label, unit, value, source, distribution, notes } = parameter;
  return (
    <li className="border-b border-rule py-3 md:grid md:grid-cols-[1.5fr_6.5rem_1fr_1.4fr] md:gap-x-5">
      <div className="min-w-0">
        <p className="font-bold">{label}</p>
        <p className="text-sm break-words text-mute">
          <code className="font-sans">{symbol}</code> · {t(`kinds.${parameter.kind}`)}
        </p>
        {notes && <p className="mt-1 text-sm text-mute">{notes}</p>}
      </div>
      <Part name={t('evidence.value')} numeric>
        <Value value={value} unit={unit} language={language} />
      </Part>
      <Part name={t('evidence.distribution')}>
        {distributionWords(distribution, document, t, language)}
        {distribution.type === 'fixed' && distribution.reason && (
          <span className="block text-sm text-mute">{distribution.reason}</span>
        )}
      </Part>
      <Part name={t('evidence.source')}>
        <span className="text-sm">{source.citation}</span>
        {source.page && <span className="text-sm">, {source.page}</span>}
        {source.invented && (
          <span className="block text-sm text-brass">{t('appraisals.invented')}</span>
        )}
      </Part>
    </li>
  );
}

function Value({ value, unit, language }: { value: number; unit: string; language: Language }) {
  return (
    <>
      {formatValue(value, language)}
      <span className="text-sm text-mute md:block"> {unit}</span>
    </>
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

/** Parameters whose name, symbol or source holds what is sought, whatever the case. */
function matching(parameters: readonly Parameter[], sought: string, language: Language) {
  const plain = (text: string) => text.toLocaleLowerCase(language);
  const key = plain(sought.trim());
  if (key === '') return parameters;
  return parameters.filter(({ label, symbol, source }) =>
    [label, symbol, source.citation].some((text) => plain(text).includes(key)),
  );
}
