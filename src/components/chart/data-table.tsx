import { useTranslation } from 'react-i18next';
import { formatNumber } from '../../i18n/format.ts';
import type { Language } from '../../store/settings.ts';
import { type ChartTable, cellWords } from './table.ts';

interface DataTableProps {
  readonly table: ChartTable;
  readonly label: string;
  /** Rows shown; the rest is in the CSV, which is said. */
  readonly most: number;
  readonly language: Language;
}

/** Scrolls sideways within itself where it is wider than the page, and can be reached by key. */
export function DataTable({ table, label, most, language }: DataTableProps) {
  const { t } = useTranslation();
  const { columns, rows } = table;
  return (
    <>
      <section
        aria-label={`${t('frontier.table')}: ${label}`}
        // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reached by key
        tabIndex={0}
        className="max-h-[26rem] overflow-auto"
      >
        <table className="w-full border-collapse text-right text-sm">
          <thead className="sticky top-0 bg-paper text-mute">
            <tr>
              {columns.map(({ head }, index) => (
                <th
                  key={head}
                  scope="col"
                  className={`border-b border-ink pb-1.5 align-bottom font-normal ${columns.length > 6 ? 'min-w-28' : ''} ${index === 0 ? 'text-left' : 'pl-4'}`}
                >
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.slice(0, most).map((row) => (
              <tr key={row.join(' ')} className="border-b border-rule">
                {columns.map((column, index) => {
                  const words = cellWords(row[index] ?? null, column);
                  return index === 0 ? (
                    <th key={column.head} scope="row" className="py-1.5 text-left font-normal">
                      {words}
                    </th>
                  ) : (
                    <td key={column.head} className="py-1.5 pl-4 whitespace-nowrap">
                      {words}
                    </td>
                  );
                })}
              </tr>
            ))}
          </tbody>
        </table>
      </section>
      {rows.length > most && (
        <p className="mt-1 text-sm text-mute">
          {t('charts.firstRows', {
            shown: formatNumber(most, language),
            total: formatNumber(rows.length, language),
          })}
        </p>
      )}
    </>
  );
}
