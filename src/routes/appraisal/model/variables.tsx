import { useTranslation } from 'react-i18next';
import { addVariable } from '../../../../shared/formula/edit/add-variable.ts';
import type { Variable } from '../../../../shared/model/document.ts';
import type { Place } from '../../../../shared/model/edit/edit.ts';
import { TextField } from '../../../components/form/text-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { FormulaAt } from '../editing/formula-at.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { KindSelect } from '../editing/kind-select.tsx';
import { SymbolField } from '../editing/symbol-field.tsx';
import { placeOf } from '../use-sought.ts';
import { SectionHead } from './section-head.tsx';

/** Named formulas, for what is used in more places than one. */
export function Variables() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const add = () => {
    const label = t('model.variables.newLabel');
    edit(addVariable(document, { label }).edits, t('editing.acts.added', { what: label }));
  };
  return (
    <>
      <SectionHead
        title={t('model.variables.title', { count: document.variables.length })}
        lead={t('model.variables.lead')}
      >
        <button type="button" className="control-primary" onClick={add}>
          {t('model.variables.add')}
        </button>
      </SectionHead>
      <ul className="mt-5 border-t border-ink">
        {document.variables.map((variable, index) => (
          <li
            key={variable.id}
            id={placeOf(variable.id)}
            tabIndex={-1}
            className="border-b border-rule py-4"
          >
            <VariableEditor variable={variable} index={index} />
          </li>
        ))}
      </ul>
    </>
  );
}

function VariableEditor({ variable, index }: { variable: Variable; index: number }) {
  const { t } = useTranslation();
  const { change, issuesAt } = useEditing();
  const { id, label, symbol, unit, kind, formula, notes } = variable;
  const at: Place = ['variables', { id }];
  const path = ['variables', index];
  const optional = (field: string) => (text: string) =>
    change([...at, field], text === '' ? undefined : text, label);
  const own = issuesAt(path).filter((issue) => issue.path[2] !== 'formula');
  return (
    <div className="grid gap-x-6 gap-y-3 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.4fr)]">
      <div className="grid content-start gap-3 sm:grid-cols-2 lg:grid-cols-1 xl:grid-cols-2">
        <TextField
          label={t('editing.label')}
          required
          maxLength={300}
          value={label}
          onValue={(text) => change([...at, 'label'], text, label)}
        />
        <SymbolField named={{ what: 'variable', id }} symbol={symbol} />
        <KindSelect
          optional
          value={kind}
          onValue={(next) => change([...at, 'kind'], next, label)}
        />
        <TextField
          label={t('editing.unit')}
          maxLength={60}
          value={unit ?? ''}
          onValue={optional('unit')}
        />
      </div>
      <div className="grid content-start gap-3">
        <FormulaAt
          label={t('model.formula')}
          formula={formula}
          at={[...at, 'formula']}
          path={[...path, 'formula']}
          what={label}
        />
        <TextField
          label={t('editing.notes')}
          lines={1}
          value={notes ?? ''}
          onValue={optional('notes')}
        />
        <IssueLines issues={own} />
        <ItemActions target={{ what: 'variable', id }} label={label} />
      </div>
    </div>
  );
}
