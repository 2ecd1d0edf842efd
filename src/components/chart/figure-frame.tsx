/** A chart with its finding as title, the same numbers as a table, and files to take away. */
import { type ReactNode, Suspense, useId, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Language } from '../../store/settings.ts';
import { saveBlob, saveFile } from '../save-file.ts';
import { DataTable } from './data-table.tsx';
import { chartSvg, svgText, svgToPng } from './picture.ts';
import { type ChartTable, tableCsv } from './table.ts';

/** Where the numbers come from, for what is saved. */
export interface FigureSource {
  /** Start of the file's name. */
  readonly name: string;
  readonly invented: boolean;
}

interface FigureFrameProps {
  /** Its place among the page's headings; `h2` where absent. */
  readonly heading?: 'h2' | 'h3';
  /** The finding, in a sentence. */
  readonly title: string;
  /** What a picture of it would be called. */
  readonly file: string;
  readonly source: FigureSource;
  /** Made when it is asked for: a chart may stand on many numbers. */
  readonly table: () => ChartTable;
  readonly mostRows?: number;
  /** Said below. */
  readonly note?: ReactNode;
  /** Room kept while the chart is fetched. */
  readonly height: number;
  /** The chart; absent where there is a table only. */
  readonly children?: ReactNode;
  readonly language: Language;
}

const MOST_ROWS = 200;

export function FigureFrame(props: FigureFrameProps) {
  const { heading: Heading = 'h2', title, language, table, children } = props;
  const { t } = useTranslation();
  const heading = useId();
  const box = useRef<HTMLDivElement>(null);
  const [shown, setShown] = useState<'chart' | 'table'>(children ? 'chart' : 'table');
  const [failed, setFailed] = useState(false);
  const name = `${props.source.name}-${props.file}`;
  const stamp = props.source.invented ? t('provenance.invented') : null;
  const saveCsv = () => saveFile(`${name}.csv`, tableCsv(table(), language), 'text/csv');
  const savePicture = async (type: 'png' | 'svg') => {
    try {
      if (!box.current) return;
      const picture = chartSvg(box.current, { title, stamp });
      const blob =
        type === 'png'
          ? await svgToPng(picture)
          : new Blob([svgText(picture)], { type: 'image/svg+xml' });
      saveBlob(`${name}.${type}`, blob);
      setFailed(false);
    } catch {
      setFailed(true);
    }
  };
  return (
    <section aria-labelledby={heading} className="min-w-0 break-inside-avoid">
      <Heading id={heading} className="mb-2.5 text-lg">
        {title}
      </Heading>
      {shown === 'chart' ? (
        <div ref={box} className="relative">
          <Suspense
            fallback={
              <p style={{ height: props.height }} className="text-mute">
                {t('charts.drawing')}
              </p>
            }
          >
            {children}
          </Suspense>
        </div>
      ) : (
        <DataTable
          table={table()}
          label={title}
          most={props.mostRows ?? MOST_ROWS}
          language={language}
        />
      )}
      {props.note && <p className="mt-1 max-w-[62em] text-sm text-mute">{props.note}</p>}
      <div className="mt-3 flex flex-wrap gap-2 text-sm print:hidden">
        {children && (
          <div className="inline-flex overflow-hidden rounded-md border border-rule-strong">
            {(['chart', 'table'] as const).map((choice) => (
              <button
                key={choice}
                type="button"
                aria-pressed={shown === choice}
                onClick={() => setShown(choice)}
                className="min-h-9 px-3 -outline-offset-2 aria-pressed:bg-ink aria-pressed:text-paper"
              >
                {t(`frontier.${choice}`)}
              </button>
            ))}
          </div>
        )}
        <div className="inline-flex overflow-hidden rounded-md border border-rule-strong">
          <Save label={t('frontier.csv')} name={title} onClick={saveCsv} />
          {shown === 'chart' && children && (
            <>
              <Save label={t('charts.png')} name={title} onClick={() => void savePicture('png')} />
              <Save label={t('charts.svg')} name={title} onClick={() => void savePicture('svg')} />
            </>
          )}
        </div>
        {failed && <p role="alert">{t('charts.notSaved')}</p>}
      </div>
    </section>
  );
}

function Save(props: { label: string; name: string; onClick: () => void }) {
  return (
    <button
      type="button"
      aria-label={`${props.label}: ${props.name}`}
      onClick={props.onClick}
      className="min-h-9 border-rule px-3 -outline-offset-2 not-first:border-l"
    >
      {props.label}
    </button>
  );
}
