/** Net benefit of every strategy against the comparator, over thresholds. */
import { useMemo } from 'react';
import {
  type NetBenefitColumn,
  netBenefitTable,
} from '../../../../../shared/analysis/breakdown/net-benefit-table.ts';
import { FigureFrame } from '../../../../components/chart/figure-frame.tsx';
import { LazyLines } from '../../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../../components/chart/table.ts';
import { beamScale } from '../../../../features/beam/scale.ts';
import type { FigureWords } from '../../figure-words.ts';
import type { SectionProps } from './more.tsx';

const STEPS = 40;

export function NetBenefit({ run, words, threshold }: SectionProps) {
  const { t, symbol, outcome, number, nameOf, strategies } = words;
  const { document, base } = run;
  const { comparator, thresholds } = document.question;
  const columns = useMemo(() => {
    const { max } = beamScale(
      thresholds.map(({ value }) => value),
      [],
    );
    const at = Array.from({ length: STEPS + 1 }, (_, i) => (max * i) / STEPS);
    return netBenefitTable(document, base, at);
  }, [document, base, thresholds]);
  const here = netBenefitTable(document, base, [threshold])[0];
  const title = titleOf(here, threshold, words);
  return (
    <FigureFrame
      heading="h3"
      title={title}
      file="net-benefit"
      source={words.source}
      language={words.language}
      height={340}
      table={() => netBenefitFigures(columns, words)}
    >
      <LazyLines
        x={columns.map((column) => column.threshold)}
        lines={strategies.map((strategy, index) => ({
          ...strategy,
          values: columns.map(({ cells }) => cells[index]?.inmb ?? null),
        }))}
        xTitle={t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per })}
        yTitle={t('more.netBenefit.yTitle', { comparator: nameOf(comparator), symbol })}
        writeX={number}
        writeY={number}
        mark={{ at: threshold, label: words.threshold(threshold) }}
        alt={t('charts.alt', { title })}
      />
    </FigureFrame>
  );
}

function titleOf(
  here: NetBenefitColumn | undefined,
  threshold: number,
  { t, document, nameOf, money, threshold: write }: FigureWords,
): string {
  const { comparator } = document.question;
  const who = { comparator: nameOf(comparator), threshold: write(threshold) };
  const best = here?.best ?? comparator;
  if (best === comparator) return t('more.netBenefit.titleComparator', who);
  const amount = money(here?.cells.find(({ id }) => id === best)?.inmb ?? 0);
  return t('more.netBenefit.title', { ...who, strategy: nameOf(best), amount });
}

export function netBenefitFigures(
  columns: readonly NetBenefitColumn[],
  words: FigureWords,
): ChartTable {
  const { t, symbol, outcome, number, nameOf, strategies, document } = words;
  const comparator = nameOf(document.question.comparator);
  const two = (value: number) => number(value, 2);
  return {
    columns: [
      {
        head: t('uncertainty.acceptability.xTitle', { symbol, unit: outcome.per }),
        write: number,
      },
      ...strategies.flatMap(({ name }) => [
        { head: t('more.netBenefit.nmb', { strategy: name, symbol }), write: two },
        { head: t('more.netBenefit.inmb', { strategy: name, comparator, symbol }), write: two },
      ]),
    ],
    rows: columns.map(({ threshold, cells }) => [
      threshold,
      ...cells.flatMap(({ nmb, inmb }) => [nmb, inmb]),
    ]),
  };
}
