import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Distribution, Parameter } from '../../../../shared/model/document.ts';
import type { Edit, Json, Place } from '../../../../shared/model/edit/edit.ts';
import type { Issue } from '../../../../shared/model/issue.ts';
import { Field, INPUT } from '../../../components/form/field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { formatValue } from '../../../i18n/format.ts';
import { parseNumber } from '../../../i18n/parse-number.ts';
import { useEditing } from '../editing/context.tsx';
import {
  ASKED,
  type FitMethod,
  type FitNumber,
  type FitNumbers,
  fitBy,
  fitMethods,
  statedValue,
} from './fit-methods.ts';

interface FitFormProps {
  readonly parameter: Parameter;
  readonly type: Distribution['type'];
}

/** Finds a distribution's numbers from what a publication gives. */
export function FitForm({ parameter, type }: FitFormProps) {
  const { t } = useTranslation();
  const { language, edit } = useEditing();
  const methods = fitMethods(type);
  const [method, setMethod] = useState(methods[0] ?? 'meanSe');
  const [texts, setTexts] = useState<Partial<Record<FitNumber, string>>>({});
  if (methods.length === 0) return null;
  const read = (name: FitNumber) => parseNumber(texts[name] ?? '', language) ?? undefined;
  const numbers = Object.fromEntries(
    ASKED[method].flatMap((name) => {
      const number = read(name);
      return number === undefined ? [] : [[name, number]];
    }),
  ) as FitNumbers;
  const result = fitBy(type, method, numbers);
  const fill = () => {
    if (!result?.ok) return;
    const at: Place = ['parameters', { id: parameter.id }];
    const value = statedValue(method, numbers);
    const edits: Edit[] = [
      { type: 'set', at: [...at, 'distribution'], value: result.distribution as unknown as Json },
      ...(value === undefined ? [] : [{ type: 'set', at: [...at, 'value'], value } as const]),
    ];
    edit(edits, t('register.fitted', { what: parameter.label }));
  };
  return (
    <details className="rounded-md border border-rule px-3 py-1">
      <summary className="flex min-h-10 items-center text-brass">{t('register.fit')}</summary>
      <div className="grid gap-3 pb-3">
        <SelectField<FitMethod>
          label={t('register.fitFrom')}
          className="max-w-72"
          value={method}
          options={methods.map((each) => ({ value: each, name: t(`register.methods.${each}`) }))}
          onValue={setMethod}
        />
        <div className="flex flex-wrap gap-3">
          {ASKED[method].map((name) => (
            <Field key={name} className="w-32" label={t(`register.asked.${name}`)}>
              {(parts) => (
                <input
                  {...parts}
                  type="text"
                  inputMode="decimal"
                  autoComplete="off"
                  className={`${INPUT} text-right`}
                  value={texts[name] ?? ''}
                  onChange={(event) => setTexts({ ...texts, [name]: event.target.value })}
                />
              )}
            </Field>
          ))}
        </div>
        {result && !result.ok && <Refusal issue={result.issue} />}
        <button
          type="button"
          className="control justify-self-start"
          disabled={!result?.ok}
          onClick={fill}
        >
          {t('register.fill')}
        </button>
      </div>
    </details>
  );
}

const REFUSALS = [
  'counts',
  'improper',
  'meanOutside',
  'standardError',
  'tooWide',
  'interval',
  'noSolution',
  'pointOutside',
] as const;

function Refusal({ issue }: { issue: Issue }) {
  const { t } = useTranslation();
  const { language } = useEditing();
  const name = REFUSALS.find((each) => issue.code === `fit.${each}`) ?? 'noSolution';
  const { limit } = issue.params;
  const words = typeof limit === 'number' ? formatValue(limit, language) : '';
  return (
    <p role="status" className="text-sm text-clay">
      {t(`register.refused.${name}`, { limit: words })}
    </p>
  );
}
