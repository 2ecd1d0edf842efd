import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Group } from '../../../../shared/model/document.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { GroupEditor } from './group-editor.tsx';
import { newGroup, ungrouped } from './group-edits.ts';

const TYPES = ['dirichlet', 'multivariateNormal', 'rankCorrelation', 'jointRows'] as const;

/** Parameters that are uncertain together: probabilities of one row, correlated ones, joint draws. */
export function Groups() {
  const { t } = useTranslation();
  const { document } = useEditing();
  return (
    <section className="mt-10">
      <h2 className="text-lg">{t('groups.title')}</h2>
      <p className="mt-1 max-w-prose text-mute">{t('groups.lead')}</p>
      <ul className="mt-3">
        {document.groups.map((group, index) => (
          <li key={group.id} className="border-t border-rule py-4">
            <GroupEditor group={group} index={index} />
          </li>
        ))}
      </ul>
      <NewGroup />
    </section>
  );
}

function NewGroup() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const [type, setType] = useState<Group['type']>('dirichlet');
  const [chosen, setChosen] = useState<readonly string[]>([]);
  const free = ungrouped(document);
  const members = free.filter(({ id }) => chosen.includes(id));
  const turn = (id: string) =>
    setChosen(chosen.includes(id) ? chosen.filter((each) => each !== id) : [...chosen, id]);
  const make = () => {
    const label = t(`groups.types.${type}`);
    edit(newGroup(document, type, members, label), t('editing.acts.added', { what: label }));
    setChosen([]);
  };
  if (free.length < 2) return null;
  return (
    <details className="mt-2 rounded-md border border-rule px-3 py-1">
      <summary className="flex min-h-11 items-center text-brass">{t('groups.add')}</summary>
      <div className="grid gap-3 pb-3">
        <SelectField<Group['type']>
          label={t('groups.type')}
          className="max-w-80"
          value={type}
          options={TYPES.map((each) => ({ value: each, name: t(`groups.types.${each}`) }))}
          onValue={setType}
        />
        <fieldset>
          <legend className="mb-1 text-sm text-mute">{t('groups.members')}</legend>
          <div className="grid gap-x-4 sm:grid-cols-2 lg:grid-cols-3">
            {free.map(({ id, label }) => (
              <label key={id} className="flex min-h-10 items-center gap-2">
                <input
                  type="checkbox"
                  className="size-4 shrink-0 accent-brass"
                  checked={chosen.includes(id)}
                  onChange={() => turn(id)}
                />
                {label}
              </label>
            ))}
          </div>
        </fieldset>
        <button
          type="button"
          className="control justify-self-start"
          disabled={members.length < 2}
          onClick={make}
        >
          {t('groups.make')}
        </button>
      </div>
    </details>
  );
}
