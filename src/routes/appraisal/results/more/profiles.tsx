/** For whom is which strategy best? */
import { useMemo } from 'react';
import {
  incrementalByProfile,
  type ProfileResult,
} from '../../../../../shared/analysis/breakdown/by-profile.ts';
import { FigureFrame } from '../../../../components/chart/figure-frame.tsx';
import type { ChartTable } from '../../../../components/chart/table.ts';
import type { FigureWords } from '../../figure-words.ts';
import type { SectionProps } from './more.tsx';

export function Profiles({ run, words, threshold }: SectionProps) {
  const { t, nameOf, number } = words;
  const { document, base } = run;
  const results = useMemo(
    () => incrementalByProfile(document, base, threshold),
    [document, base, threshold],
  );
  const each = results.slice(1);
  const whole = results[0]?.best ?? null;
  const count = each.filter(({ best }) => best === whole).length;
  return (
    <FigureFrame
      heading="h3"
      title={t('more.profiles.title', {
        strategy: nameOf(whole ?? ''),
        count,
        total: number(each.length),
        threshold: words.threshold(threshold),
      })}
      file="profiles"
      source={words.source}
      language={words.language}
      height={0}
      table={() => profilesTable(results, words)}
    />
  );
}

export function profilesTable(results: readonly ProfileResult[], words: FigureWords): ChartTable {
  const { t, document, nameOf, number, percent, symbol } = words;
  const { comparator } = document.question;
  const labels = new Map(document.profiles.map(({ id, label }) => [id, label]));
  const others = document.strategies.filter(({ id }) => id !== comparator);
  return {
    columns: [
      { head: t('more.profiles.profile') },
      { head: t('more.profiles.share'), write: percent },
      { head: t('more.profiles.best') },
      ...others.map(({ label }) => ({
        head: t('more.profiles.inmb', {
          strategy: label,
          comparator: nameOf(comparator),
          symbol,
        }),
        write: (value: number) => number(value, 2),
      })),
    ],
    rows: results.map(({ profile, share, best, against }) => [
      profile === null ? t('more.profiles.whole') : (labels.get(profile) ?? profile),
      share,
      nameOf(best ?? ''),
      ...others.map(({ id }) => against.find((row) => row.id === id)?.inmb ?? null),
    ]),
  };
}
