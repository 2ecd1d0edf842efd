/** The value of perfect information over thresholds, a person and for all concerned. */
import { FigureFrame } from '../../../components/chart/figure-frame.tsx';
import { LazyLines } from '../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../components/chart/table.ts';
import { strategyMark } from '../../../components/strategy-mark.tsx';
import { formatLargeMoney } from '../../../i18n/format.ts';
import { type Curves, curvesAt, personsAffected } from '../../../store/curves.ts';
import type { FigureWords } from '../figure-words.ts';
import type { CurvesProps } from './page.tsx';

export function Evpi({ draws, curves, threshold, words }: CurvesProps) {
  const { t, symbol, outcome, number, language, document } = words;
  const here = curvesAt(draws, threshold).evpi[0]?.perPerson ?? 0;
  const persons = personsAffected(document.question);
  const what = { amount: words.money(here), threshold: words.threshold(threshold) };
  const title =
    persons === null
      ? t('uncertainty.evpi.title', what)
      : t('uncertainty.evpi.titlePopulation', {
          ...what,
          population: formatLargeMoney(here * persons, symbol, language),
        });
  return (
    <FigureFrame
      title={title}
      file="evpi"
      source={words.source}
      height={340}
      language={language}
      table={() => evpiTable(curves, words)}
      note={t('uncertainty.evpi.note')}
    >
      <LazyLines
        x={curves.thresholds}
        lines={[
          {
            id: 'evpi',
            name: t('uncertainty.evpi.line'),
            mark: { ...strategyMark(0), color: 'var(--ink)' },
            values: curves.evpi.map(({ perPerson }) => perPerson),
            band: curves.evpi.map(({ perPerson, standardError }) =>
              standardError === null
                ? null
                : ([
                    Math.max(0, perPerson - 2 * standardError),
                    perPerson + 2 * standardError,
                  ] as const),
            ),
          },
        ]}
        xTitle={t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per })}
        yTitle={t('uncertainty.evpi.yTitle', { symbol })}
        writeX={number}
        writeY={number}
        mark={{ at: threshold, label: words.threshold(threshold) }}
        fromZero
        alt={t('charts.alt', { title })}
      />
    </FigureFrame>
  );
}

export function evpiTable(
  { evpi }: Curves,
  { t, symbol, outcome, number, document }: FigureWords,
): ChartTable {
  const persons = personsAffected(document.question);
  const two = (value: number) => number(value, 2);
  return {
    columns: [
      {
        head: t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per }),
        write: number,
      },
      { head: t('uncertainty.evpi.yTitle', { symbol }), write: two },
      { head: t('uncertainty.evpi.error'), write: two },
      ...(persons === null
        ? []
        : [{ head: t('uncertainty.evpi.population', { symbol }), write: number }]),
    ],
    rows: evpi.map(({ threshold, perPerson, standardError }) => [
      threshold,
      perPerson,
      standardError,
      ...(persons === null ? [] : [perPerson * persons]),
    ]),
  };
}
