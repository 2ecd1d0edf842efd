import { useTranslation } from 'react-i18next';
import type { Group } from '../../../../shared/model/document.ts';
import type { Json, Place } from '../../../../shared/model/edit/edit.ts';
import { leaveGroups } from '../../../../shared/model/edit/ungroup.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { numberText } from '../../../i18n/parse-number.ts';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { gridFrom } from '../editing/pasted-grid.ts';
import { setMirrored, ungrouped, withMember } from './group-edits.ts';

interface GroupProps<T extends Group['type'] = Group['type']> {
  readonly group: Extract<Group, { type: T }>;
}

export function GroupEditor({ group, index }: GroupProps & { readonly index: number }) {
  const { t } = useTranslation();
  const { change, issuesAt } = useEditing();
  const at: Place = ['groups', { id: group.id }];
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <div className="flex flex-wrap items-end gap-3">
        <TextField
          label={t('editing.label')}
          className="w-80 max-w-full"
          required
          value={group.label}
          onValue={(text) => change([...at, 'label'], text, group.label)}
        />
        <p className="flex min-h-11 items-center text-mute">{t(`groups.types.${group.type}`)}</p>
        <ItemActions target={{ what: 'group', id: group.id }} label={group.label} />
      </div>
      <IssueLines issues={issuesAt(['groups', index])} />
      <GroupNumbers group={group} />
      <MoreMembers group={group} />
    </div>
  );
}

function GroupNumbers({ group }: GroupProps) {
  switch (group.type) {
    case 'dirichlet':
      return <Counts group={group} />;
    case 'multivariateNormal':
      return <Normal group={group} />;
    case 'rankCorrelation':
      return <Matrix group={group} field="correlation" matrix={group.correlation} isUnit />;
    case 'jointRows':
      return <Rows group={group} />;
  }
}

function useMemberNames(group: Group): string[] {
  const { document } = useEditing();
  return group.members.map((id) => document.parameters.find((each) => each.id === id)?.label ?? id);
}

function MemberName({ group, at, name }: GroupProps & { at: number; name: string }) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const id = group.members[at] ?? '';
  return (
    <span className="inline-flex items-center gap-2">
      {name}
      <button
        type="button"
        className="min-h-8 text-sm text-mute underline hover:text-ink"
        onClick={() => edit(leaveGroups(document, id), t('register.left', { what: name }))}
      >
        {t('groups.takeOut')}
        <span className="sr-only"> {name}</span>
      </button>
    </span>
  );
}

function Counts({ group }: GroupProps<'dirichlet'>) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const names = useMemberNames(group);
  return (
    <ul className="grid gap-2">
      {names.map((name, index) => (
        <li key={group.members[index]} className="flex flex-wrap items-center gap-x-4">
          <NumberField
            quiet
            label={t('groups.countOf', { name })}
            className="w-32"
            above={0}
            value={group.counts[index] ?? 1}
            onValue={(count) =>
              change(
                ['groups', { id: group.id }, 'counts'],
                group.counts.with(index, count),
                group.label,
              )
            }
          />
          <MemberName group={group} at={index} name={name} />
        </li>
      ))}
    </ul>
  );
}

function Normal({ group }: GroupProps<'multivariateNormal'>) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const names = useMemberNames(group);
  const at: Place = ['groups', { id: group.id }];
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <SelectField<'identity' | 'log'>
        label={t('groups.scale')}
        className="max-w-72"
        value={group.scale}
        options={[
          { value: 'identity', name: t('groups.scales.identity') },
          { value: 'log', name: t('groups.scales.log') },
        ]}
        onValue={(scale) => change([...at, 'scale'], scale, group.label)}
      />
      <ul className="grid gap-2">
        {names.map((name, index) => (
          <li key={group.members[index]} className="flex flex-wrap items-center gap-x-4">
            <NumberField
              quiet
              label={t('groups.meanOf', { name })}
              className="w-32"
              value={group.means[index] ?? 0}
              onValue={(mean) =>
                change([...at, 'means'], group.means.with(index, mean), group.label)
              }
            />
            {name}
          </li>
        ))}
      </ul>
      <Matrix group={group} field="covariance" matrix={group.covariance} />
    </div>
  );
}

interface MatrixProps extends GroupProps {
  readonly field: 'covariance' | 'correlation';
  readonly matrix: readonly (readonly number[])[];
  /** The diagonal is 1 and not written. */
  readonly isUnit?: boolean;
}

/** The lower half of a symmetric matrix; the upper follows. */
function Matrix({ group, field, matrix, isUnit = false }: MatrixProps) {
  const { t } = useTranslation();
  const { change } = useEditing();
  const names = useMemberNames(group);
  const put = (row: number, column: number, value: number) =>
    change(
      ['groups', { id: group.id }, field],
      setMirrored(matrix, row, column, value) as Json,
      group.label,
    );
  return (
    <section
      className="relative min-w-0 overflow-x-auto"
      aria-label={`${group.label}: ${t(`groups.${field}`)}`}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls sideways is reached by keyboard
      tabIndex={0}
    >
      <p className="mb-1 text-sm text-mute">{t(`groups.${field}`)}</p>
      <table>
        <tbody>
          {names.map((name, row) => (
            <tr key={group.members[row]}>
              <th scope="row" className="pr-3 text-left font-normal">
                <MemberName group={group} at={row} name={name} />
              </th>
              {names.slice(0, row + 1).map((other, column) => (
                <td key={group.members[column]} className="min-w-28 p-1 align-top">
                  {isUnit && row === column ? (
                    <span className="block pt-2 text-right text-mute">1</span>
                  ) : (
                    <NumberField
                      quiet
                      label={t('groups.pair', { name, other })}
                      value={matrix[row]?.[column] ?? 0}
                      {...(isUnit ? { min: -1, max: 1 } : {})}
                      onValue={(value) => put(row, column, value)}
                    />
                  )}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

/** Joint draws, pasted from a spreadsheet: a column a member, a row a draw. */
function Rows({ group }: GroupProps<'jointRows'>) {
  const { t } = useTranslation();
  const { change, language } = useEditing();
  const names = useMemberNames(group);
  const read = (text: string) => gridFrom(text, language);
  const problem = (text: string) => {
    const grid = read(text);
    if (!grid.ok) return t('groups.rowsWrong');
    return grid.rows.some((row) => row.length !== group.members.length)
      ? t('groups.rowsWidth', { count: group.members.length })
      : null;
  };
  return (
    <div>
      <p className="mb-1 text-sm text-mute">{t('groups.columns', { names: names.join(' · ') })}</p>
      <TextField
        label={t('groups.rows', { count: group.rows.length })}
        lines={6}
        required
        value={group.rows
          .map((row) => row.map((value) => numberText(value, language)).join('\t'))
          .join('\n')}
        check={problem}
        onValue={(text) => {
          const grid = read(text);
          if (grid.ok) change(['groups', { id: group.id }, 'rows'], grid.rows as Json, group.label);
        }}
      />
    </div>
  );
}

function MoreMembers({ group }: GroupProps) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const free = ungrouped(document);
  if (free.length === 0) return null;
  const add = (id: string) => {
    const parameter = free.find((each) => each.id === id);
    if (!parameter) return;
    const what = parameter.label;
    edit(withMember(document, group, parameter), t('editing.acts.added', { what }));
  };
  return (
    <SelectField
      label={t('groups.addMember')}
      className="max-w-80"
      value=""
      options={[
        { value: '', name: t('editing.choose') },
        ...free.map(({ id, label }) => ({ value: id, name: label })),
      ]}
      onValue={add}
    />
  );
}
