/** The efficiency frontier as a chart, as a table, and as files to take away. */
import { memo } from 'react';
import { useTranslation } from 'react-i18next';
import { FigureFrame, type FigureSource } from '../../components/chart/figure-frame.tsx';
import type { ChartTable } from '../../components/chart/table.ts';
import { formatNumber, formatOutcome } from '../../i18n/format.ts';
import type { Language } from '../../store/settings.ts';
import { FrontierChart, type FrontierPoint } from './frontier-chart.tsx';

interface FrontierProps {
  readonly points: readonly FrontierPoint[];
  readonly fewerIsBetter: boolean;
  readonly symbol: string;
  /** The outcome's plural, such as "QALYs". */
  readonly unit: string;
  readonly source: FigureSource;
  readonly language: Language;
}

/** Does not depend on the poise: it is drawn anew only when its points change. */
export const Frontier = memo(function Frontier(props: FrontierProps) {
  const { points, symbol, unit, fewerIsBetter, source, language } = props;
  const { t } = useTranslation();
  const on = points.filter(({ onFrontier }) => onFrontier).length;
  const title =
    on === points.length
      ? t('frontier.all', { count: points.length })
      : t('frontier.some', { count: on, total: points.length });
  const table = (): ChartTable => ({
    columns: [
      { head: t('table.strategy') },
      {
        head: t('table.costIn', { symbol }),
        write: (value) => formatNumber(value, language, { decimals: 2 }),
      },
      { head: unit, write: (value) => formatOutcome(value, language) },
      { head: t('frontier.onFrontier') },
    ],
    rows: points.map(({ name, cost, outcome, onFrontier }) => [
      ...[name, cost, outcome],
      t(onFrontier ? 'frontier.yes' : 'frontier.no'),
    ]),
  });
  return (
    <FigureFrame {...{ title, source, language, table }} file="frontier" height={300}>
      <FrontierChart
        points={points}
        fewerIsBetter={fewerIsBetter}
        title={title}
        costTitle={t('frontier.costAxis', { symbol })}
        outcomeTitle={t(fewerIsBetter ? 'frontier.fewerAxis' : 'frontier.outcomeAxis', { unit })}
        language={language}
      />
    </FigureFrame>
  );
});
