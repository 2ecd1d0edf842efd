import { useTranslation } from 'react-i18next';
import { addCovariate } from '../../../../shared/formula/edit/add-covariate.ts';
import type { Place } from '../../../../shared/model/edit/edit.ts';
import { START_AGE } from '../../../../shared/model/names.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { type Editing, useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { SymbolField } from '../editing/symbol-field.tsx';
import { SectionHead } from './section-head.tsx';

/** What tells the profiles apart, such as age and sex, with its value in each. */
export function Covariates() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const add = (fields: { label: string; symbol?: string; unit?: string; value?: number }) =>
    edit(addCovariate(document, fields).edits, t('editing.acts.added', { what: fields.label }));
  const hasAge = document.covariates.some(({ symbol }) => symbol === START_AGE);
  const age = { label: t('model.covariates.age'), unit: t('model.covariates.ageUnit') };
  return (
    <>
      <SectionHead
        title={t('model.covariates.title', { count: document.covariates.length })}
        lead={t('model.covariates.lead')}
      >
        <div className="flex flex-wrap gap-3">
          {!hasAge && (
            <button
              type="button"
              className="control"
              onClick={() => add({ ...age, symbol: START_AGE, value: 40 })}
            >
              {t('model.covariates.addAge')}
            </button>
          )}
          <button
            type="button"
            className="control-primary"
            onClick={() => add({ label: t('model.covariates.newLabel') })}
          >
            {t('model.covariates.add')}
          </button>
        </div>
      </SectionHead>
      <ul className="mt-5 border-t border-ink">
        {document.covariates.map((covariate, index) => (
          <li key={covariate.id} className="border-b border-rule py-4">
            <CovariateEditor covariate={covariate} index={index} />
          </li>
        ))}
      </ul>
    </>
  );
}

interface CovariateProps {
  readonly covariate: Editing['document']['covariates'][number];
  readonly index: number;
}

function CovariateEditor({ covariate, index }: CovariateProps) {
  const { t } = useTranslation();
  const { document, change, issuesAt } = useEditing();
  const { id, label, symbol, unit } = covariate;
  const at: Place = ['covariates', { id }];
  return (
    <div className="grid gap-3">
      <div className="grid gap-3 sm:grid-cols-3">
        <TextField
          label={t('editing.label')}
          required
          maxLength={300}
          value={label}
          onValue={(text) => change([...at, 'label'], text, label)}
        />
        <SymbolField named={{ what: 'covariate', id }} symbol={symbol} />
        <TextField
          label={t('editing.unit')}
          maxLength={60}
          value={unit ?? ''}
          onValue={(text) => change([...at, 'unit'], text === '' ? undefined : text, label)}
        />
      </div>
      <div className="flex flex-wrap gap-3">
        {document.profiles.map((profile) => (
          <NumberField
            key={profile.id}
            className="w-44"
            label={t('model.covariates.in', { profile: profile.label })}
            value={profile.covariates[id] ?? 0}
            onValue={(value) =>
              change(['profiles', { id: profile.id }, 'covariates', id], value, label)
            }
          />
        ))}
      </div>
      <IssueLines issues={issuesAt(['covariates', index])} />
      <ItemActions target={{ what: 'covariate', id }} label={label} />
    </div>
  );
}
