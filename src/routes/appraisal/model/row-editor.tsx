import { useTranslation } from 'react-i18next';
import type { Row } from '../../../../shared/model/document.ts';
import type { Edit } from '../../../../shared/model/edit/edit.ts';
import { EditError } from '../../../../shared/model/edit/edit-error.ts';
import { changeBasis, setRest } from '../../../../shared/model/edit/row-rest.ts';
import {
  addCell,
  restOf,
  rowPlace,
  splitRow,
  uniteRows,
} from '../../../../shared/model/edit/rows.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { FormulaAt, FormulaFor } from '../editing/formula-at.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { Act } from '../editing/item-actions.tsx';
import { useStateName, useStrategyName } from './names.ts';

interface RowProps {
  readonly row: Row;
  readonly index: number;
  /** The strategy that is shown; null for all. */
  readonly strategy: string | null;
}

/** One row of the matrix: a cell for each state that one can go to. */
export function RowEditor({ row, index, strategy }: RowProps) {
  const { document, issuesAt } = useEditing();
  const own = issuesAt(['movements', 'rows', index]).filter(
    ({ path }) => path[3] !== 'cells' || path.length < 6,
  );
  return (
    <div className="mt-2 grid gap-3">
      <RowHead row={row} index={index} strategy={strategy} />
      <IssueLines issues={own} />
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,13rem),1fr))] gap-3">
        {document.states.map(({ id }) => (
          <li key={id} className="min-w-0">
            <Cell row={row} index={index} to={id} strategy={strategy} />
          </li>
        ))}
      </ul>
    </div>
  );
}

const BASES = ['probabilities', 'rates', 'logit'] as const;

function RowHead({ row, strategy }: RowProps) {
  const { t } = useTranslation();
  const { document, edit, change } = useEditing();
  const nameOf = useStateName();
  const strategyName = useStrategyName();
  const what = t('model.movements.from', { state: nameOf(row.from) });
  const put = (edits: readonly Edit[]) => edit(edits, t('editing.acts.changed', { what }));
  const holds = row.strategies?.map(strategyName).join(', ') ?? t('editing.allStrategies');
  const isShared = (row.strategies ?? document.strategies).length > 1;
  return (
    <div className="flex flex-wrap items-end gap-3">
      <SelectField<Row['basis']>
        label={t('model.movements.basis')}
        className="w-60 max-w-full"
        value={row.basis}
        options={BASES.map((each) => ({ value: each, name: t(`model.movements.bases.${each}`) }))}
        onValue={(basis) => put(changeBasis(document, row.id, basis))}
      />
      {row.basis === 'rates' ? (
        <SelectField<'generator' | 'byRow'>
          label={t('model.movements.method')}
          className="w-60 max-w-full"
          value={row.method}
          options={[
            { value: 'generator', name: t('model.movements.methods.generator') },
            { value: 'byRow', name: t('model.movements.methods.byRow') },
          ]}
          onValue={(method) => change([...rowPlace(row.id), 'method'], method, what)}
        />
      ) : (
        <SelectField
          label={t(`model.movements.rests.${row.basis}`)}
          className="w-60 max-w-full"
          value={restOf(row)}
          options={restOptions(row, document.states)}
          onValue={(to) => put(restEdits(document, row, to))}
        />
      )}
      <p className="flex min-h-11 items-center text-sm text-mute">
        {t('model.movements.holds', { strategies: holds })}
      </p>
      {isShared && document.strategies.length > 1 && (
        <OwnRow row={row} strategy={strategy} put={put} />
      )}
      {row.strategies && (
        <button type="button" className="control" onClick={() => put(uniteRows(document, row.id))}>
          {t('model.movements.unite')}
        </button>
      )}
    </div>
  );
}

interface OwnRowProps {
  readonly row: Row;
  readonly strategy: string | null;
  readonly put: (edits: readonly Edit[]) => void;
}

/** Gives a strategy a row of its own: the one shown, or one that is chosen. */
function OwnRow({ row, strategy, put }: OwnRowProps) {
  const { t } = useTranslation();
  const { document } = useEditing();
  const strategyName = useStrategyName();
  const split = (id: string) => put(splitRow(document, row.from, [id]).edits);
  if (strategy !== null) {
    return (
      <button type="button" className="control" onClick={() => split(strategy)}>
        {t('model.movements.own', { strategy: strategyName(strategy) })}
      </button>
    );
  }
  const held = row.strategies ?? document.strategies.map(({ id }) => id);
  return (
    <SelectField
      label={t('model.movements.ownFor')}
      className="w-52 max-w-full"
      value=""
      options={[
        { value: '', name: t('editing.choose') },
        ...held.map((id) => ({ value: id, name: strategyName(id) })),
      ]}
      onValue={(id) => id !== '' && split(id)}
    />
  );
}

/** Log odds can only be turned to a state whose own are given. */
function restOptions(row: Row, states: readonly { id: string; label: string }[]) {
  const isOpen = (id: string) =>
    row.basis !== 'logit' || id === restOf(row) || row.cells.some(({ to }) => to === id);
  return states.filter(({ id }) => isOpen(id)).map(({ id, label }) => ({ value: id, name: label }));
}

function restEdits(document: Parameters<typeof setRest>[0], row: Row, to: string): readonly Edit[] {
  try {
    return setRest(document, row.id, to);
  } catch (problem) {
    if (problem instanceof EditError) return [];
    throw problem;
  }
}

function Cell({ row, index, to, strategy }: RowProps & { readonly to: string }) {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const nameOf = useStateName();
  const label =
    to === row.from ? t('model.movements.stay') : t('model.movements.to', { state: nameOf(to) });
  const what = t('model.movements.move', { from: nameOf(row.from), to: nameOf(to) });
  const place = row.cells.findIndex((cell) => cell.to === to);
  const cell = row.cells[place];
  if (!cell && restOf(row) === to) {
    return (
      <>
        <p className="mb-1 text-sm text-mute">{label}</p>
        <p className="flex min-h-11 items-center rounded-md border border-dashed border-rule-strong px-2.5 text-mute">
          {t(`model.movements.takes.${row.basis}`)}
        </p>
      </>
    );
  }
  if (!cell) {
    // Who stays at a rate is who does not leave.
    if (row.basis === 'rates' && to === row.from) return null;
    return (
      <>
        <p className="mb-1 text-sm text-mute">{label}</p>
        <button
          type="button"
          className="min-h-11 w-full rounded-md border border-dashed border-rule px-2.5 text-left text-mute hover:border-ink hover:text-ink"
          onClick={() =>
            edit(addCell(document, row.id, { to }).edits, t('editing.acts.added', { what }))
          }
        >
          {t('model.movements.none')}
          <span className="sr-only"> {t('editing.acts.added', { what })}</span>
        </button>
      </>
    );
  }
  const shared = {
    label,
    formula: cell.formula,
    at: [...rowPlace(row.id), 'cells', { id: cell.id }, 'formula'],
    path: ['movements', 'rows', index, 'cells', place, 'formula'],
    what,
    strategies: row.strategies,
  };
  return (
    <div className="flex items-start">
      <div className="min-w-0 flex-1">
        {strategy === null ? (
          <FormulaAt {...shared} />
        ) : (
          <FormulaFor {...shared} strategy={strategy} />
        )}
      </div>
      <div className="-mr-1 pt-6">
        <Act
          name={t('editing.remove', { label: what })}
          onClick={() =>
            edit(
              [{ type: 'remove', at: [...rowPlace(row.id), 'cells'], id: cell.id }],
              t('editing.acts.removed', { what }),
            )
          }
        >
          <path d="M4 4 L12 12 M12 4 L4 12" />
        </Act>
      </div>
    </div>
  );
}
