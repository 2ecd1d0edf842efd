/** The efficiency frontier as a chart, as a table, and as a file to take away. */
import { memo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { toCsv } from '../../../shared/export/csv.ts';
import { saveFile } from '../../components/save-file.ts';
import { Swatch } from '../../components/strategy-mark.tsx';
import { formatNumber, formatOutcome } from '../../i18n/format.ts';
import type { Language } from '../../store/settings.ts';
import { FrontierChart, type FrontierPoint } from './frontier-chart.tsx';

interface FrontierProps {
  readonly points: readonly FrontierPoint[];
  readonly fewerIsBetter: boolean;
  readonly symbol: string;
  /** The outcome's plural, such as "QALYs". */
  readonly unit: string;
  readonly fileName: string;
  readonly language: Language;
}

/** Does not depend on the poise: it is drawn anew only when its points change. */
export const Frontier = memo(function Frontier(props: FrontierProps) {
  const { points, symbol, unit, fewerIsBetter } = props;
  const { t } = useTranslation();
  const [shown, setShown] = useState<'chart' | 'table'>('chart');
  const on = points.filter(({ onFrontier }) => onFrontier).length;
  const title =
    on === points.length
      ? t('frontier.all', { count: points.length })
      : t('frontier.some', { count: on, total: points.length });
  const save = () => {
    const head = [
      t('table.strategy'),
      t('table.costIn', { symbol }),
      unit,
      t('frontier.onFrontier'),
    ];
    const rows = points.map(({ name, cost, outcome, onFrontier }) => [
      name,
      cost,
      outcome,
      onFrontier ? 1 : 0,
    ]);
    saveFile(`${props.fileName}-frontier.csv`, toCsv([head, ...rows]), 'text/csv');
  };
  return (
    <section aria-labelledby="frontier-title" className="min-w-0">
      <h2 id="frontier-title" className="mb-2.5 text-lg">
        {title}
      </h2>
      {shown === 'chart' ? (
        <FrontierChart
          points={points}
          fewerIsBetter={fewerIsBetter}
          title={title}
          costTitle={t('frontier.costAxis', { symbol })}
          outcomeTitle={t(fewerIsBetter ? 'frontier.fewerAxis' : 'frontier.outcomeAxis', { unit })}
          language={props.language}
        />
      ) : (
        <FrontierTable {...props} />
      )}
      <div className="mt-3 inline-flex overflow-hidden rounded-md border border-rule-strong text-sm">
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
        <button
          type="button"
          onClick={save}
          className="min-h-9 border-l border-rule px-3 -outline-offset-2"
        >
          {t('frontier.csv')}
        </button>
      </div>
    </section>
  );
});

function FrontierTable({ points, symbol, unit, language }: FrontierProps) {
  const { t } = useTranslation();
  return (
    <table className="w-full border-collapse text-right">
      <thead className="text-sm text-mute">
        <tr className="border-b border-ink">
          <th scope="col" className="pb-1.5 text-left font-normal">
            {t('table.strategy')}
          </th>
          <th scope="col" className="pb-1.5 pl-2 font-normal">
            {t('table.costIn', { symbol })}
          </th>
          <th scope="col" className="pb-1.5 pl-2 font-normal">
            {unit}
          </th>
          <th scope="col" className="pb-1.5 pl-2 font-normal">
            {t('frontier.onFrontier')}
          </th>
        </tr>
      </thead>
      <tbody>
        {points.map(({ id, name, index, cost, outcome, onFrontier }) => (
          <tr key={id} className="border-b border-rule">
            <th scope="row" className="py-2 text-left font-normal">
              <span className="inline-flex items-center gap-2">
                <Swatch index={index} />
                {name}
              </span>
            </th>
            <td className="py-2 pl-2">{formatNumber(cost, language, { decimals: 2 })}</td>
            <td className="py-2 pl-2">{formatOutcome(outcome, language)}</td>
            <td className="py-2 pl-2">{t(onFrontier ? 'frontier.yes' : 'frontier.no')}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
