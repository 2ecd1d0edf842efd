/** The beam on the page, with what it shows in words. */
import { useTranslation } from 'react-i18next';
import { frontierSegments } from '../../../../shared/analysis/frontier-segments.ts';
import { lever } from '../../../../shared/analysis/lever.ts';
import { beamScale } from '../../../features/beam/scale.ts';
import { StaticBeam } from '../../../features/beam/static-beam.tsx';
import { type BriefReader, thresholdWords } from '../../../i18n/brief-words.ts';
import { formatMoney } from '../../../i18n/format.ts';
import type { Drafted } from './use-brief.ts';

interface WeighedProps extends Drafted {
  readonly reader: BriefReader;
}

/** px that the printed beam is laid out in: its words come out at 8 points. */
const PRINTED = 900;

/** Nothing where there is a single strategy. */
export function Weighed({ brief, document, rows, reader }: WeighedProps) {
  const { t } = useTranslation();
  const { language, symbol } = reader;
  const { weighed: pair, threshold, segments } = brief;
  if (pair === null) return null;
  const { thresholds } = document.question;
  const values = [...thresholds.map(({ value }) => value), threshold.value];
  const scale = beamScale(
    values,
    rows.flatMap(({ icer }) => icer ?? []),
  );
  // As on Results: a third of the load tips the arm half way.
  const half = Math.abs(pair.incrementalCost) / 3;
  const weighed = lever(pair, threshold.value, half > 0 ? half : undefined);
  const names = new Map(document.strategies.map(({ id, label }) => [id, label]));
  const who = {
    strategy: names.get(pair.strategy),
    against: names.get(pair.against),
    threshold: thresholdWords(threshold.value, reader),
  };
  const look = {
    scale,
    pair,
    names,
    language,
    threshold: threshold.value,
    segments: frontierSegments(rows, scale.max),
    ranges: segments,
    notches: thresholds,
    lever: weighed,
    label: t('brief.beam.alt', who),
    wordFor: (value: number) => thresholdWords(value, reader),
    moneyFor: (value: number) => formatMoney(value, symbol, language),
  };
  return (
    <figure className="m-0">
      <StaticBeam {...look} width={PRINTED} className="hidden sheet:block" />
      <StaticBeam {...look} className="sheet:hidden" />
      <figcaption>{t(`brief.beam.${weighed.word}`, who)}</figcaption>
    </figure>
  );
}
