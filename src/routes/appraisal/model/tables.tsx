import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { addTable } from '../../../../shared/formula/edit/add-table.ts';
import type { Table } from '../../../../shared/model/document.ts';
import type { Edit, Json, Place } from '../../../../shared/model/edit/edit.ts';
import { Field, INPUT } from '../../../components/form/field.tsx';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { formatValue } from '../../../i18n/format.ts';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { KindSelect } from '../editing/kind-select.tsx';
import { SymbolField } from '../editing/symbol-field.tsx';
import { type PastedTable, pastedTable } from './pasted-table.ts';
import { SectionHead } from './section-head.tsx';

/** Values that are looked up by one or two keys: a life table, prices by year. */
export function Tables() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const add = () => {
    const label = t('model.tables.newLabel');
    const keys = [{ label: t('model.tables.newKey'), points: [0, 1] }];
    edit(addTable(document, { label, keys }).edits, t('editing.acts.added', { what: label }));
  };
  return (
    <>
      <SectionHead
        title={t('model.tables.title', { count: document.tables.length })}
        lead={t('model.tables.lead')}
      >
        <button type="button" className="control-primary" onClick={add}>
          {t('model.tables.add')}
        </button>
      </SectionHead>
      <ul className="mt-5 border-t border-ink">
        {document.tables.map((table, index) => (
          <li key={table.id} className="border-b border-rule py-4">
            <TableEditor table={table} index={index} />
          </li>
        ))}
      </ul>
    </>
  );
}

interface TableProps {
  readonly table: Table;
}

function TableEditor({ table, index }: TableProps & { readonly index: number }) {
  const { t } = useTranslation();
  const { change, issuesAt } = useEditing();
  const { id, label, symbol, unit, kind, interpolation } = table;
  const at: Place = ['tables', { id }];
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <div className="grid gap-3 sm:grid-cols-2 lg:grid-cols-5">
        <TextField
          label={t('editing.label')}
          required
          maxLength={300}
          value={label}
          onValue={(text) => change([...at, 'label'], text, label)}
        />
        <SymbolField named={{ what: 'table', id }} symbol={symbol} />
        <KindSelect
          optional
          value={kind}
          onValue={(next) => change([...at, 'kind'], next, label)}
        />
        <TextField
          label={t('editing.unit')}
          maxLength={60}
          value={unit ?? ''}
          onValue={(text) => change([...at, 'unit'], text === '' ? undefined : text, label)}
        />
        <SelectField<Table['interpolation']>
          label={t('model.tables.between')}
          value={interpolation}
          options={[
            { value: 'step', name: t('model.tables.betweens.step') },
            { value: 'linear', name: t('model.tables.betweens.linear') },
          ]}
          onValue={(next) => change([...at, 'interpolation'], next, label)}
        />
      </div>
      <TextField
        label={t('evidence.source')}
        value={table.source?.citation ?? ''}
        onValue={(citation) =>
          change([...at, 'source'], { ...table.source, citation } as Json, label)
        }
      />
      <IssueLines issues={issuesAt(['tables', index])} />
      <Grid table={table} />
      <Paste table={table} />
      <ItemActions target={{ what: 'table', id }} label={label} />
    </div>
  );
}

/** Rows of a table that are shown as fields; longer ones are pasted. */
const MOST_FIELDS = 200;

function Grid({ table }: TableProps) {
  const { t } = useTranslation();
  const { language, change } = useEditing();
  const { id, label, keys, values } = table;
  const at: Place = ['tables', { id }];
  const [first, second] = keys;
  const columns = second?.points ?? [null];
  const put = (index: number, value: number) =>
    change([...at, 'values'], values.with(index, value), label);
  const name = (row: number, column: number | null) =>
    [
      `${first?.label} ${formatValue(row, language)}`,
      column === null ? '' : `${second?.label} ${formatValue(column, language)}`,
    ]
      .filter((part) => part !== '')
      .join(', ');
  const isLong = values.length > MOST_FIELDS;
  const rows = (first?.points ?? []).slice(
    0,
    isLong ? Math.ceil(MOST_FIELDS / columns.length) : undefined,
  );
  return (
    <section
      className="relative max-h-96 min-w-0 overflow-auto"
      aria-label={label}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls is reached by keyboard
      tabIndex={0}
    >
      <table className="text-right">
        <thead>
          <tr>
            <th scope="col" className="pr-3 text-left text-sm font-normal text-mute">
              {second ? `${first?.label} \\ ${second.label}` : first?.label}
            </th>
            {columns.map((column) => (
              <th key={column} scope="col" className="px-1 text-sm font-normal text-mute">
                {column === null ? t('evidence.value') : formatValue(column, language)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((point, row) => (
            <tr key={point}>
              <th scope="row" className="pr-3 text-left font-normal">
                {formatValue(point, language)}
              </th>
              {columns.map((column, place) => (
                <td key={column} className="min-w-28 p-1">
                  <NumberField
                    quiet
                    label={name(point, column)}
                    value={values[row * columns.length + place] ?? 0}
                    onValue={(value) => put(row * columns.length + place, value)}
                  />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {isLong && (
        <p className="mt-1 text-sm text-mute">
          {t('model.tables.firstRows', { shown: rows.length, all: first?.points.length ?? 0 })}
        </p>
      )}
    </section>
  );
}

type Refused = Extract<PastedTable, { ok: false }>;

/** Puts what was copied from a spreadsheet in the place of the table's numbers. */
function Paste({ table }: TableProps) {
  const { t } = useTranslation();
  const { language, edit } = useEditing();
  const [text, setText] = useState('');
  const read = text.trim() === '' ? null : pastedTable(text, language, table);
  const problemWords = ({ why, row, column, text: cell }: Refused) =>
    t(`model.tables.problems.${why}`, { row, column, text: cell });
  const put = () => {
    if (!read?.ok) return;
    const at: Place = ['tables', { id: table.id }];
    const edits: Edit[] = [
      { type: 'set', at: [...at, 'keys'], value: read.keys as unknown as Json },
      { type: 'set', at: [...at, 'values'], value: read.values },
    ];
    edit(edits, t('model.tables.pasted', { what: table.label }));
    setText('');
  };
  return (
    <details className="rounded-md border border-rule px-3 py-1">
      <summary className="flex min-h-10 items-center text-brass">{t('model.tables.paste')}</summary>
      <div className="grid gap-3 pb-3">
        <Field
          label={t('model.tables.pasteHere')}
          help={t('model.tables.pasteHelp')}
          error={read && !read.ok ? problemWords(read) : null}
        >
          {(parts) => (
            <textarea
              {...parts}
              rows={6}
              className={INPUT}
              value={text}
              onChange={(event) => setText(event.target.value)}
            />
          )}
        </Field>
        {read?.ok && (
          <p role="status" className="text-sm text-mute">
            {t('model.tables.willBe', {
              rows: read.keys[0]?.points.length ?? 0,
              columns: read.keys[1]?.points.length ?? 1,
            })}
          </p>
        )}
        <button
          type="button"
          className="control justify-self-start"
          disabled={!read?.ok}
          onClick={put}
        >
          {t('model.tables.take')}
        </button>
      </div>
    </details>
  );
}
