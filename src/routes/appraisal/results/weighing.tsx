/** The beam, what it weighs in words, and the policy thresholds to put the poise at. */
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { frontierSegments } from '../../../../shared/analysis/frontier-segments.ts';
import {
  defaultPair,
  type Lever,
  lever,
  type WeighedPair,
} from '../../../../shared/analysis/lever.ts';
import { Steady } from '../../../components/steady.tsx';
import { Beam } from '../../../features/beam/beam.tsx';
import { beamScale } from '../../../features/beam/scale.ts';
import { formatMoney } from '../../../i18n/format.ts';
import type { Language } from '../../../store/settings.ts';
import type { Result } from '../context.ts';
import { BasisChoice } from './basis.tsx';

interface WeighingProps {
  readonly result: Result;
  readonly language: Language;
}

export function Weighing({ result, language }: WeighingProps) {
  const { t } = useTranslation();
  const { document, comparison, now, names, move, outcome, thresholdWords } = result;
  const { thresholds, currency } = document.question;
  const scale = useMemo(
    () =>
      beamScale(
        thresholds.map(({ value }) => value),
        comparison.rows.flatMap(({ icer }) => icer ?? []),
      ),
    [thresholds, comparison],
  );
  const segments = useMemo(
    () => frontierSegments(comparison.rows, scale.max),
    [comparison, scale.max],
  );
  const ranges = useMemo(
    () => frontierSegments(comparison.rows, Number.POSITIVE_INFINITY),
    [comparison],
  );
  const pair = defaultPair(comparison.rows, now.best);
  if (!pair) return <p className="mt-2 text-mute">{t('beam.alone')}</p>;
  // A third of the load tips the arm half way: small differences show, large ones saturate.
  const half = Math.abs(pair.incrementalCost) / 3;
  const weighed = lever(pair, now.threshold, half > 0 ? half : undefined);
  const money = (value: number) => formatMoney(value, currency.symbol, language);
  const pairWords = (weighing: WeighedPair) =>
    [
      t(weighing.incrementalCost < 0 ? 'beam.hookSaves' : 'beam.hookCosts', {
        strategy: names.get(weighing.strategy),
        against: names.get(weighing.against),
      }),
      t(weighing.incrementalHealth < 0 ? 'beam.poiseLoses' : 'beam.poiseGains', {
        gained: outcome.gained,
        lost: outcome.lost,
      }),
      t('beam.along', { unit: outcome.per }),
    ].join(' ');
  const others = ranges.flatMap(({ strategy }) => {
    const other = defaultPair(comparison.rows, strategy);
    return other ? [pairWords(other)] : [];
  });
  return (
    <section aria-label={t('beam.title')}>
      <div className="mt-1 mb-4 max-w-[62em] text-mute">
        <Steady others={others} className="">
          <p>{pairWords(pair)}</p>
        </Steady>
      </div>
      <Beam
        scale={scale}
        threshold={now.threshold}
        segments={segments}
        ranges={ranges}
        notches={thresholds}
        lever={weighed}
        pair={pair}
        names={names}
        wordFor={thresholdWords}
        moneyFor={money}
        best={names.get(now.best) ?? now.best}
        onMove={move}
        language={language}
      />
      <Reading {...{ weighed, pair, result, max: scale.max }} money={money} />
      <div className="mt-4 flex flex-wrap gap-x-8 gap-y-3">
        <div className="flex flex-wrap items-center gap-2">
          <span className="mr-1 text-sm text-mute">{t('beam.notches')}</span>
          {thresholds.map(({ id, label, value }) => (
            <button
              key={id}
              type="button"
              aria-pressed={value === now.threshold}
              className="control gap-2 px-3 text-left text-sm aria-pressed:border-brass aria-pressed:bg-brass-soft"
              onClick={() => move({ to: value, starts: true })}
            >
              <span className="font-bold">{money(value)}</span>
              {label}
            </button>
          ))}
        </div>
        <BasisChoice result={result} />
      </div>
    </section>
  );
}

interface ReadingProps {
  readonly weighed: Lever;
  readonly pair: WeighedPair;
  readonly result: Result;
  readonly max: number;
  readonly money: (value: number) => string;
}

/** What the beam shows, in words. */
function Reading({ weighed, pair, result, max, money }: ReadingProps) {
  const { t } = useTranslation();
  const { names, now, thresholdWords } = result;
  const who = { strategy: names.get(pair.strategy), against: names.get(pair.against) };
  const benefit = now.threshold * pair.incrementalHealth - pair.incrementalCost;
  const threshold = thresholdWords(now.threshold);
  const sentences = [
    t(`beam.words.${weighed.word}`, { ...who, threshold, amount: money(Math.abs(benefit)) }),
  ];
  if (weighed.hook === 'lift') sentences.push(t('beam.savingsLift'));
  if (weighed.poise === 'loss') sentences.push(t('beam.lossLifts'));
  if (weighed.levelAt !== null && weighed.levelAt > max) {
    sentences.push(t('beam.levelBeyond', { threshold: thresholdWords(weighed.levelAt) }));
  }
  const before = result.was && levelBefore(result.was);
  if (before !== null && before !== weighed.levelAt) {
    sentences.push(t('levers.wasLevel', { threshold: thresholdWords(before) }));
  }
  return <p className="mt-2 max-w-[62em] text-mute">{sentences.join(' ')}</p>;
}

/** Where the arm lay level before the last change, for the pair that it weighed then. */
function levelBefore({ comparison, answer }: NonNullable<Result['was']>): number | null {
  const pair = defaultPair(comparison.rows, answer.best);
  return pair ? lever(pair, answer.threshold).levelAt : null;
}
