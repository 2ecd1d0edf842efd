import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument, Row, State } from '../../../../shared/model/document.ts';
import type { Edit, Json } from '../../../../shared/model/edit/edit.ts';
import { freshId } from '../../../../shared/model/edit/fresh-id.ts';
import { rowFor } from '../../../../shared/model/edit/rows.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { Diagram } from './diagram.tsx';
import { RowEditor } from './row-editor.tsx';
import { SectionHead } from './section-head.tsx';
import { Survival } from './survival.tsx';

/** Who goes where: rows of a matrix, or survival curves. */
export function Movements() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const { type } = document.movements;
  const choose = (next: 'rows' | 'survival') => {
    if (next === type) return;
    const value = next === 'rows' ? emptyRows(document) : emptyCurves(document);
    const edits: Edit[] = [{ type: 'set', at: ['movements'], value: value as unknown as Json }];
    edit(edits, t('editing.acts.changed', { what: t('model.movements.title') }));
  };
  return (
    <>
      <SectionHead title={t('model.movements.title')} lead={t(`model.movements.leads.${type}`)}>
        <SelectField<'rows' | 'survival'>
          label={t('model.movements.by')}
          className="w-64"
          value={type}
          options={[
            { value: 'rows', name: t('model.movements.bys.rows') },
            { value: 'survival', name: t('model.movements.bys.survival') },
          ]}
          onValue={choose}
        />
      </SectionHead>
      {type === 'rows' ? <RowsOfMatrix /> : <Survival />}
    </>
  );
}

/** Everybody stays where they are. */
function emptyRows({ states }: ModelDocument): ModelDocument['movements'] {
  const taken: string[] = [];
  const rows = states
    .filter(({ type }) => type !== 'absorbing')
    .map(({ id: from, label }): Row => {
      const id = freshId(taken, `from ${label}`);
      taken.push(id);
      return { id, from, basis: 'probabilities', remainder: from, cells: [] };
    });
  return { type: 'rows', rows };
}

/** Everybody is in the first state; the last takes those beyond the curves. */
function emptyCurves({ states }: ModelDocument): ModelDocument['movements'] {
  const last = (states.find(({ dead }) => dead) ?? states.at(-1))?.id ?? '';
  const curves = states
    .filter(({ id }) => id !== last)
    .map(({ id: state }) => ({ id: state, state, formula: '1' }));
  return { type: 'survival', curves, last };
}

function RowsOfMatrix() {
  const { t } = useTranslation();
  const { document, issuesAt } = useEditing();
  const [strategy, setStrategy] = useState('');
  const { strategies, states, movements } = document;
  if (movements.type !== 'rows') return null;
  const chosen = strategies.some(({ id }) => id === strategy) ? strategy : null;
  const from = states.filter(({ type }) => type !== 'absorbing');
  const whole = issuesAt(['movements']).filter(({ path }) => path.length < 3);
  return (
    <>
      {strategies.length > 1 && (
        <SelectField
          label={t('model.movements.show')}
          className="mt-4 max-w-72"
          value={chosen ?? ''}
          options={[
            { value: '', name: t('model.movements.everyStrategy') },
            ...strategies.map(({ id, label }) => ({ value: id, name: label })),
          ]}
          onValue={setStrategy}
        />
      )}
      <IssueLines issues={whole} />
      <div className="mt-4 grid border-t border-ink">
        {from.map((state) => (
          <StateRows key={state.id} state={state} strategy={chosen} />
        ))}
      </div>
      <div className="mt-6 max-w-xl">
        <Diagram strategy={chosen} />
      </div>
    </>
  );
}

/** The rows out of one state: one for a strategy chosen, else each that there is. */
function StateRows({ state, strategy }: { state: State; strategy: string | null }) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const { movements } = document;
  const all = movements.type === 'rows' ? movements.rows : [];
  const held = strategy === null ? null : rowFor(document, state.id, strategy);
  const rows = held ? [held] : strategy === null ? all.filter((row) => row.from === state.id) : [];
  const add = () => {
    const taken = all.map(({ id }) => id);
    const item = {
      id: freshId(taken, `from ${state.label}`),
      from: state.id,
      basis: 'probabilities',
      remainder: state.id,
      cells: [],
      ...(strategy === null ? {} : { strategies: [strategy] }),
    };
    edit(
      [{ type: 'insert', at: ['movements', 'rows'], item, before: null }],
      t('editing.acts.added', { what: t('model.movements.from', { state: state.label }) }),
    );
  };
  return (
    <section className="border-b border-rule py-4">
      <h2 className="text-lg">{t('model.movements.from', { state: state.label })}</h2>
      {rows.length === 0 && (
        <p className="mt-1 flex flex-wrap items-center gap-3 text-clay">
          {t('model.movements.noRow')}
          <button type="button" className="control text-ink" onClick={add}>
            {t('model.movements.addRow')}
          </button>
        </p>
      )}
      {rows.map((row) => (
        <RowEditor key={row.id} row={row} index={all.indexOf(row)} strategy={strategy} />
      ))}
    </section>
  );
}
