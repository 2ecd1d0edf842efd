/** What every figure of a step needs: names, marks and numbers in the reader's language. */
import type { TFunction } from 'i18next';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { FigureSource } from '../../components/chart/figure-frame.tsx';
import { type StrategyMark, strategyMark } from '../../components/strategy-mark.tsx';
import { formatMoney, formatNumber, formatPercent, formatValue } from '../../i18n/format.ts';
import { type OutcomeWords, outcomeWords } from '../../i18n/outcome-words.ts';
import { type Language, useSettings } from '../../store/settings.ts';

export interface FigureWords {
  readonly t: TFunction;
  readonly language: Language;
  readonly document: ModelDocument;
  readonly source: FigureSource;
  readonly outcome: OutcomeWords;
  readonly symbol: string;
  readonly strategies: readonly {
    readonly id: string;
    readonly name: string;
    readonly mark: StrategyMark;
  }[];
  readonly nameOf: (strategy: string) => string;
  readonly money: (value: number) => string;
  readonly number: (value: number, decimals?: number) => string;
  readonly percent: (share: number) => string;
  /** To as many figures as it needs. */
  readonly exact: (value: number) => string;
  /** A threshold in words, such as "KM 1,500 per QALY". */
  readonly threshold: (value: number) => string;
}

export function useFigureWords(document: ModelDocument, slug: string): FigureWords {
  const { t } = useTranslation();
  const { language } = useSettings();
  const { symbol } = document.question.currency;
  const outcome = outcomeWords(document.question, t);
  const money = (value: number) => formatMoney(value, symbol, language);
  return {
    t,
    language,
    document,
    source: { name: slug, invented: document.about.invented },
    outcome,
    symbol,
    strategies: document.strategies.map(({ id, label }, index) => ({
      id,
      name: label,
      mark: strategyMark(index),
    })),
    nameOf: (strategy) => document.strategies.find(({ id }) => id === strategy)?.label ?? strategy,
    money,
    number: (value, decimals = 0) => formatNumber(value, language, { decimals }),
    percent: (share) => formatPercent(share, language),
    exact: (value) => formatValue(value, language),
    threshold: (value) => t('threshold', { amount: money(value), unit: outcome.per }),
  };
}
