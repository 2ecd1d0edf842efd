import { useTranslation } from 'react-i18next';
import type { Place } from '../../../../shared/model/edit/edit.ts';
import { freshId } from '../../../../shared/model/edit/fresh-id.ts';
import { stepEdits } from '../../../../shared/model/edit/reorder.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { FormulaAt } from '../editing/formula-at.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { Act } from '../editing/item-actions.tsx';
import { useStateName } from './names.ts';

const CURVES: Place = ['movements', 'curves'];

/** Partitioned survival: each curve is the share that has not yet gone beyond its state. */
export function Survival() {
  const { t } = useTranslation();
  const { document, edit, change, issuesAt } = useEditing();
  const nameOf = useStateName();
  const { movements, states } = document;
  if (movements.type !== 'survival') return null;
  const { curves, last } = movements;
  const what = (state: string) => t('model.survival.curve', { state: nameOf(state) });
  const free = states.filter(({ id }) => id !== last && !curves.some(({ state }) => state === id));
  const add = (state: string) => {
    const taken = curves.map(({ id }) => id);
    const item = { id: freshId(taken, state), state, formula: '1' };
    edit(
      [{ type: 'insert', at: CURVES, item, before: null }],
      t('editing.acts.added', { what: what(state) }),
    );
  };
  const step = (id: string, state: string, by: -1 | 1) =>
    edit(stepEdits(curves, CURVES, id, by), t('editing.acts.moved', { what: what(state) }));
  return (
    <div className="mt-5 grid max-w-3xl gap-4">
      <IssueLines issues={issuesAt(['movements']).filter(({ path }) => path.length < 4)} />
      <ol className="grid gap-3 border-t border-ink">
        {curves.map(({ id, state, formula }, index) => (
          <li key={id} className="flex items-start gap-1 border-b border-rule py-3">
            <div className="min-w-0 flex-1">
              <FormulaAt
                label={t('model.survival.upTo', {
                  states: curves
                    .slice(0, index + 1)
                    .map((curve) => nameOf(curve.state))
                    .join(' + '),
                })}
                formula={formula}
                at={[...CURVES, { id }, 'formula']}
                path={['movements', 'curves', index, 'formula']}
                what={what(state)}
              />
            </div>
            <Act
              name={t('editing.up', { label: what(state) })}
              disabled={index === 0}
              onClick={() => step(id, state, -1)}
            >
              <path d="M3 9 L8 4 L13 9 M8 4 V13" />
            </Act>
            <Act
              name={t('editing.down', { label: what(state) })}
              disabled={index === curves.length - 1}
              onClick={() => step(id, state, 1)}
            >
              <path d="M3 8 L8 13 L13 8 M8 13 V4" />
            </Act>
            <Act
              name={t('editing.remove', { label: what(state) })}
              disabled={curves.length === 1}
              onClick={() =>
                edit(
                  [{ type: 'remove', at: CURVES, id }],
                  t('editing.acts.removed', { what: what(state) }),
                )
              }
            >
              <path d="M4 4 L12 12 M12 4 L4 12" />
            </Act>
          </li>
        ))}
      </ol>
      <div className="flex flex-wrap gap-3">
        <SelectField
          label={t('model.survival.last')}
          className="w-64"
          value={last}
          options={states
            .filter(({ id }) => !curves.some(({ state }) => state === id))
            .map(({ id, label }) => ({ value: id, name: label }))}
          onValue={(id) => change(['movements', 'last'], id, t('model.survival.last'))}
        />
        {free.length > 0 && (
          <SelectField
            label={t('model.survival.add')}
            className="w-64"
            value=""
            options={[
              { value: '', name: t('editing.choose') },
              ...free.map(({ id, label }) => ({ value: id, name: label })),
            ]}
            onValue={(id) => id !== '' && add(id)}
          />
        )}
      </div>
    </div>
  );
}
