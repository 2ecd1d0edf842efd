/** Names and numbers as the panel writes them. */
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { formatMoney, formatNumber, formatValue } from '../../i18n/format.ts';
import { outcomeWords } from '../../i18n/outcome-words.ts';
import { useSettings } from '../../store/settings.ts';

export function useExplainWords(document: ModelDocument) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const outcome = outcomeWords(document.question, t);
  const { symbol } = document.question.currency;
  const labelIn =
    (list: readonly { readonly id: string; readonly label: string }[]) => (id: string) =>
      list.find((each) => each.id === id)?.label ?? id;
  return {
    t,
    language,
    outcome,
    strategy: labelIn(document.strategies),
    state: labelIn(document.states),
    exact: (value: number) => formatValue(value, language),
    number: (value: number, decimals: number) => formatNumber(value, language, { decimals }),
    /** Money, or the outcome with its unit. */
    amount: (value: number, measure: 'cost' | 'outcome') =>
      measure === 'cost'
        ? formatMoney(value, symbol, language, { decimals: 2 })
        : `${formatNumber(value, language, { decimals: 4 })} ${outcome.plural}`,
  };
}
