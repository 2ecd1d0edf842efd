import { useTranslation } from 'react-i18next';
import type { State } from '../../../../shared/model/document.ts';
import { addState } from '../../../../shared/model/edit/add-state.ts';
import type { Edit, Place } from '../../../../shared/model/edit/edit.ts';
import { freshId } from '../../../../shared/model/edit/fresh-id.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { placeOf } from '../use-sought.ts';
import { Diagram } from './diagram.tsx';
import { SectionHead } from './section-head.tsx';

export function States() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const add = () => {
    const label = t('model.states.newLabel');
    edit(addState(document, { label }).edits, t('editing.acts.added', { what: label }));
  };
  return (
    <>
      <SectionHead
        title={t('model.states.title', { count: document.states.length })}
        lead={t('model.states.lead')}
      >
        <button type="button" className="control-primary" onClick={add}>
          {t('model.states.add')}
        </button>
      </SectionHead>
      <div className="mt-5 grid gap-x-10 gap-y-6 xl:grid-cols-[minmax(0,1fr)_minmax(0,25rem)]">
        <ul className="border-t border-ink">
          {document.states.map((state, index) => (
            <li
              key={state.id}
              id={placeOf(state.id)}
              tabIndex={-1}
              className="border-b border-rule py-3"
            >
              <StateEditor state={state} index={index} />
            </li>
          ))}
        </ul>
        <Diagram />
      </div>
    </>
  );
}

const TYPES = ['ordinary', 'timed', 'absorbing'] as const;

function StateEditor({ state, index }: { state: State; index: number }) {
  const { t } = useTranslation();
  const { document, change, edit, issuesAt } = useEditing();
  const { id, label, type, cycles, dead, description } = state;
  const at: Place = ['states', { id }];
  const choose = (next: State['type']) =>
    edit(typeEdits(document, state, next), t('editing.acts.changed', { what: label }));
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap items-end gap-x-3 gap-y-2">
        <TextField
          label={t('editing.label')}
          className="flex-1 basis-52"
          required
          maxLength={300}
          value={label}
          onValue={(text) => change([...at, 'label'], text, label)}
        />
        <SelectField<State['type']>
          label={t('model.states.type')}
          className="w-52"
          value={type}
          options={TYPES.map((each) => ({ value: each, name: t(`model.states.types.${each}`) }))}
          onValue={choose}
        />
        {type === 'timed' && (
          <NumberField
            label={t('model.states.cycles')}
            className="w-28"
            whole
            min={1}
            value={cycles ?? 2}
            onValue={(number) => change([...at, 'cycles'], number, label)}
          />
        )}
        <label className="flex min-h-11 items-center gap-2">
          <input
            type="checkbox"
            className="size-4 accent-brass"
            checked={dead}
            onChange={({ target }) => change([...at, 'dead'], target.checked, label)}
          />
          {t('model.states.dead')}
        </label>
        <ItemActions target={{ what: 'state', id }} label={label} />
      </div>
      <TextField
        label={t('model.states.description')}
        value={description ?? ''}
        onValue={(text) => change([...at, 'description'], text === '' ? undefined : text, label)}
      />
      <IssueLines issues={issuesAt(['states', index])} />
    </div>
  );
}

/** A state that can be left needs a row out of it, one that cannot has none. */
function typeEdits(
  { movements }: ReturnType<typeof useEditing>['document'],
  { id, label, type: before, cycles }: State,
  type: State['type'],
): Edit[] {
  const at: Place = ['states', { id }];
  const edits: Edit[] = [{ type: 'set', at: [...at, 'type'], value: type }];
  if (type === 'timed') edits.push({ type: 'set', at: [...at, 'cycles'], value: cycles ?? 2 });
  else if (cycles !== undefined) edits.push({ type: 'unset', at: [...at, 'cycles'] });
  if (movements.type !== 'rows' || (before === 'absorbing') === (type === 'absorbing'))
    return edits;
  const own = movements.rows.filter((row) => row.from === id);
  const rows: Place = ['movements', 'rows'];
  if (type === 'absorbing') {
    return [...edits, ...own.map((row): Edit => ({ type: 'remove', at: rows, id: row.id }))];
  }
  if (own.length > 0) return edits;
  const taken = movements.rows.map((row) => row.id);
  const item = {
    id: freshId(taken, `from ${label}`),
    from: id,
    basis: 'probabilities',
    remainder: id,
    cells: [],
  };
  return [...edits, { type: 'insert', at: rows, item, before: null }];
}
