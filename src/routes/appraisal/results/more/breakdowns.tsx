/** Costs and outcomes split by category, by state and by profile. */
import { useMemo, useState } from 'react';
import {
  type Breakdown,
  byCategory,
  byProfile,
  byState,
  type Measure,
} from '../../../../../shared/analysis/breakdown/breakdown.ts';
import { FigureFrame } from '../../../../components/chart/figure-frame.tsx';
import { LazyBars } from '../../../../components/chart/lazy.ts';
import type { ChartTable } from '../../../../components/chart/table.ts';
import { Choice } from '../../../../components/choice.tsx';
import { formatOutcome } from '../../../../i18n/format.ts';
import type { FigureWords } from '../../figure-words.ts';
import type { SectionProps } from './more.tsx';

const SPLITS = { category: byCategory, state: byState, profile: byProfile } as const;
type Split = keyof typeof SPLITS;
const SPLIT_NAMES = Object.keys(SPLITS) as Split[];
const MEASURES: readonly Measure[] = ['cost', 'outcome'];

export function Breakdowns({ run, words, best }: SectionProps) {
  const { t, symbol, outcome, number } = words;
  const { document, base } = run;
  const [measure, setMeasure] = useState<Measure>('cost');
  const [by, setBy] = useState<Split>('category');
  const breakdown = useMemo(
    () => SPLITS[by](document, base, measure),
    [document, base, measure, by],
  );
  const pieces = piecesOf(breakdown, by, words);
  const title = titleOf(pieces, measure, best, words);
  const axis =
    measure === 'cost'
      ? t('more.breakdown.costAxis', { symbol })
      : t('more.breakdown.outcomeAxis', { unit: outcome.plural });
  return (
    <div>
      <div className="mb-4 flex flex-wrap gap-x-6 gap-y-2">
        <Choice
          label={t('more.breakdown.measure')}
          options={MEASURES.map((id) => ({ id, name: t(`more.breakdown.${id}`) }))}
          chosen={measure}
          onChoose={setMeasure}
        />
        <Choice
          label={t('more.breakdown.by')}
          options={SPLIT_NAMES.map((id) => ({ id, name: t(`more.breakdown.${id}`) }))}
          chosen={by}
          onChoose={setBy}
        />
      </div>
      <FigureFrame
        heading="h3"
        title={title}
        file={`${measure}-by-${by}`}
        source={words.source}
        language={words.language}
        height={320}
        table={() => breakdownTable(pieces, axis, words)}
      >
        <LazyBars
          bars={pieces.bars}
          parts={pieces.parts}
          xTitle={axis}
          writeX={number}
          alt={t('charts.alt', { title })}
        />
      </FigureFrame>
    </div>
  );
}

export interface Pieces {
  readonly measure: Measure;
  readonly parts: readonly { readonly id: string; readonly name: string }[];
  /** One a strategy; its values sum to its total. */
  readonly bars: readonly {
    readonly id: string;
    readonly name: string;
    readonly values: readonly number[];
    readonly total: number;
  }[];
}

/** Named parts; what belongs to none is a part of its own where there is any. */
export function piecesOf(breakdown: Breakdown, by: Split, words: FigureWords): Pieces {
  const { t, document, nameOf } = words;
  const labels = new Map(
    { category: [], state: document.states, profile: document.profiles }[by].map(
      ({ id, label }) => [id, label],
    ),
  );
  const { measure, parts, strategies } = breakdown;
  const withRest = strategies.some(({ rest }) => rest !== 0);
  return {
    measure,
    parts: [
      ...parts.map((id) => ({ id, name: labels.get(id) ?? id })),
      ...(withRest ? [{ id: 'rest', name: t('more.breakdown.rest') }] : []),
    ],
    bars: strategies.map(({ id, values, rest, total }) => ({
      id,
      name: nameOf(id),
      values: withRest ? [...values, rest] : values,
      total,
    })),
  };
}

function titleOf(pieces: Pieces, measure: Measure, best: string, words: FigureWords): string {
  const { t, outcome, money, language } = words;
  const what =
    measure === 'cost'
      ? t('more.breakdown.whatCost')
      : t('more.breakdown.whatOutcome', { unit: outcome.plural });
  const bar = pieces.bars.find(({ id }) => id === best) ?? pieces.bars[0];
  if (!bar || bar.values.length === 0) return t('more.breakdown.none', { what });
  const most = bar.values.reduce(
    (a, value, index) => (Math.abs(value) > Math.abs(bar.values[a] ?? 0) ? index : a),
    0,
  );
  const write = measure === 'cost' ? money : (value: number) => formatOutcome(value, language);
  return t('more.breakdown.title', {
    part: pieces.parts[most]?.name,
    what,
    strategy: bar.name,
    amount: write(bar.values[most] ?? 0),
    total: write(bar.total),
  });
}

export function breakdownTable({ measure, parts, bars }: Pieces, unit: string, words: FigureWords) {
  const { t, number } = words;
  const write = (value: number) => number(value, measure === 'cost' ? 2 : 4);
  const table: ChartTable = {
    columns: [
      { head: `${t('table.strategy')} (${unit})` },
      ...parts.map(({ name }) => ({ head: name, write })),
      { head: t('more.breakdown.total'), write },
    ],
    rows: bars.map(({ name, values, total }) => [name, ...values, total]),
  };
  return table;
}
