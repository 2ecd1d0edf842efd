/** The one finding of the page, in a sentence. */
import type { TFunction } from 'i18next';
import { finding } from '../../../../shared/analysis/finding.ts';
import type { IncrementalRow } from '../../../../shared/analysis/incremental.ts';
import { formatMoney } from '../../../i18n/format.ts';
import type { Language } from '../../../store/settings.ts';

interface FindingWordsOptions {
  readonly t: TFunction;
  readonly names: ReadonlyMap<string, string>;
  readonly thresholdWords: (threshold: number) => string;
  readonly symbol: string;
  readonly language: Language;
}

export function findingWords(
  rows: readonly IncrementalRow[],
  strategy: string,
  { t, names, thresholdWords, symbol, language }: FindingWordsOptions,
): string {
  const found = finding(rows, strategy);
  const name = names.get(strategy);
  if (found.code === 'worthAbove' || found.code === 'worthBelow') {
    const threshold = thresholdWords(found.params.threshold);
    return t(`finding.${found.code}`, { strategy: name, threshold });
  }
  if (found.code === 'worthBetween') {
    const from = formatMoney(found.params.from, symbol, language);
    return t('finding.worthBetween', { strategy: name, from, to: thresholdWords(found.params.to) });
  }
  return t(`finding.${found.code}`, { strategy: name });
}
