import { useTranslation } from 'react-i18next';
import type { Edit, Place } from '../../../../shared/model/edit/edit.ts';
import { freshId } from '../../../../shared/model/edit/fresh-id.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { FormulaAt } from '../editing/formula-at.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { Act } from '../editing/item-actions.tsx';
import { useStateName } from './names.ts';
import { SectionHead } from './section-head.tsx';

const SHARES: Place = ['start', 'shares'];

/** Where the cohort is at the start: a share by formula, and one state that takes the rest. */
export function Start() {
  const { t } = useTranslation();
  const { document, edit, issuesAt } = useEditing();
  const nameOf = useStateName();
  const { start, states } = document;
  const what = t('model.start.title');
  const put = (edits: readonly Edit[]) => edit(edits, t('editing.acts.changed', { what }));
  const free = states.filter(
    ({ id }) => id !== start.remainder && !start.shares.some(({ state }) => state === id),
  );
  const add = (state: string) => {
    const taken = start.shares.map(({ id }) => id);
    const item = { id: freshId(taken, state), state, formula: '0' };
    put([{ type: 'insert', at: SHARES, item, before: null }]);
  };
  const setRest = (state: string) => {
    const own = start.shares.filter((share) => share.state === state);
    put([
      ...own.map(({ id }): Edit => ({ type: 'remove', at: SHARES, id })),
      { type: 'set', at: ['start', 'remainder'], value: state },
    ]);
  };
  return (
    <>
      <SectionHead title={what} lead={t('model.start.lead')} />
      <IssueLines issues={issuesAt(['start', 'remainder'])} />
      <SelectField
        label={t('model.start.remainder')}
        className="mt-5 max-w-80"
        value={start.remainder}
        options={states.map(({ id, label }) => ({ value: id, name: label }))}
        onValue={setRest}
      />
      <ul className="mt-4 grid max-w-3xl gap-4">
        {start.shares.map(({ id, state, formula }, index) => (
          <li key={id} className="flex items-start gap-2 border-t border-rule pt-3">
            <div className="min-w-0 flex-1">
              <FormulaAt
                label={t('model.start.share', { state: nameOf(state) })}
                formula={formula}
                at={[...SHARES, { id }, 'formula']}
                path={['start', 'shares', index, 'formula']}
                what={t('model.start.share', { state: nameOf(state) })}
              />
            </div>
            <Act
              name={t('editing.remove', {
                label: t('model.start.share', { state: nameOf(state) }),
              })}
              onClick={() => put([{ type: 'remove', at: SHARES, id }])}
            >
              <path d="M4 4 L12 12 M12 4 L4 12" />
            </Act>
          </li>
        ))}
      </ul>
      {free.length > 0 && (
        <SelectField
          label={t('model.start.add')}
          className="mt-4 max-w-80"
          value=""
          options={[
            { value: '', name: t('editing.choose') },
            ...free.map(({ id, label }) => ({ value: id, name: label })),
          ]}
          onValue={(state) => state !== '' && add(state)}
        />
      )}
    </>
  );
}
