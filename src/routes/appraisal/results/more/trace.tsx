/** Where the cohort is over time, strategy by strategy, and who is left at the end. */
import { useMemo, useState } from 'react';
import {
  survivors,
  type TraceRow,
  traceTable,
} from '../../../../../shared/analysis/breakdown/trace-table.ts';
import { FigureFrame } from '../../../../components/chart/figure-frame.tsx';
import { LazyLines, LazyStack } from '../../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../../components/chart/table.ts';
import { Choice } from '../../../../components/choice.tsx';
import { strategyMark } from '../../../../components/strategy-mark.tsx';
import type { FullRun } from '../../../../store/base-run.ts';
import type { FigureWords } from '../../figure-words.ts';
import type { SectionProps } from './more.tsx';
import { OccupancyPicker } from './occupancy-picker.tsx';

/** Points of a chart: more would not be seen. */
const POINTS = 160;

interface TraceProps extends SectionProps {
  readonly onOccupancy: (strategy: string, state: string, cycle: number) => void;
}

export function Trace({ run, words, best, onOccupancy }: TraceProps) {
  const { t, strategies, source, language } = words;
  const { document, base } = run;
  const [wanted, setWanted] = useState<string | null>(null);
  const strategy = strategies.find(({ id }) => id === wanted)?.id ?? best;
  const rows = useMemo(() => traceTable(document, base, strategy), [document, base, strategy]);
  const shown = useMemo(() => thinned(rows), [rows]);
  const x = shown.map(({ time }) => time);
  const who = words.nameOf(strategy);
  const end = rows.at(-1);
  const title = t('more.trace.finding', {
    share: words.percent(end?.alive ?? 0),
    years: yearsWords(end?.time ?? 0, words),
    strategy: who,
  });
  const lines = t('more.trace.lines', { strategy: who });
  const table = () => traceFigures(rows, words);
  const states = document.states.map(({ id, label }, index) => ({
    id,
    name: label,
    mark: strategyMark(index),
    values: shown.map(({ shares }) => shares[index] ?? 0),
  }));
  const axes = {
    x,
    xTitle: t('more.trace.xTitle'),
    yTitle: t('more.trace.yTitle'),
    writeX: words.exact,
    writeY: words.percent,
  };
  return (
    <div>
      <Choice
        label={t('more.trace.strategy')}
        options={strategies}
        chosen={strategy}
        onChoose={setWanted}
      />
      <div className="mt-4 grid gap-x-10 gap-y-10 min-[1120px]:grid-cols-2">
        <FigureFrame
          heading="h3"
          {...{ title, source, language, table }}
          file={`trace-${strategy}`}
          height={340}
          note={survivorWords(run, words)}
        >
          <LazyStack {...axes} layers={states} alt={t('charts.alt', { title })} />
        </FigureFrame>
        <FigureFrame
          heading="h3"
          {...{ source, language, table }}
          title={lines}
          file={`trace-lines-${strategy}`}
          height={340}
          note={
            <OccupancyPicker
              document={document}
              cycles={base.cycles}
              onPick={(state, cycle) => onOccupancy(strategy, state, cycle)}
            />
          }
        >
          <LazyLines
            {...axes}
            lines={states}
            span={[0, 1]}
            alt={t('charts.alt', { title: lines })}
          />
        </FigureFrame>
      </div>
    </div>
  );
}

/** Years, states and those alive, one row a boundary. */
export function traceFigures(rows: readonly TraceRow[], words: FigureWords): ChartTable {
  const { t, document, number, exact } = words;
  const share = (value: number) => number(value, 4);
  return {
    columns: [
      { head: t('more.trace.cycle'), write: number },
      { head: t('more.trace.xTitle'), write: exact },
      ...document.states.map(({ label }) => ({ head: label, write: share })),
      { head: t('more.trace.alive'), write: share },
    ],
    rows: rows.map(({ cycle, time, shares, alive }) => [cycle, time, ...shares, alive]),
  };
}

function survivorWords({ document, base }: FullRun, words: FigureWords): string {
  const { t, nameOf, percent } = words;
  const left = survivors(document, base);
  if (left.every(({ alive }) => alive < 0.0005)) return t('more.trace.nobody');
  const list = left.map(({ id, alive }) =>
    t('more.trace.survivor', { share: percent(alive), strategy: nameOf(id) }),
  );
  return t('more.trace.survivors', { list: list.join(', ') });
}

function yearsWords(years: number, { t, exact }: FigureWords): string {
  return t('question.years', { count: years, value: exact(years) });
}

function thinned(rows: readonly TraceRow[]): readonly TraceRow[] {
  const every = Math.ceil(rows.length / POINTS);
  return rows.filter((_, index) => index % every === 0 || index === rows.length - 1);
}
