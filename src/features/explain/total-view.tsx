/** A strategy's cost or outcome as the sum of its payoffs. */
import { useMemo } from 'react';
import { explainPayoff } from '../../../shared/analysis/explain/payoff.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { Figure } from '../../components/figure.tsx';
import { Ask } from './ask.tsx';
import type { ViewProps } from './panel.tsx';
import { useExplainWords } from './words.ts';

export function TotalView({ document, subject, onAsk }: ViewProps<'total'>) {
  const words = useExplainWords(document);
  const { t } = words;
  const { strategy, measure } = subject;
  const parts = useMemo(() => partsOf(document, strategy, measure), [document, strategy, measure]);
  const total = parts.reduce((sum, part) => sum + part.total, 0);
  const write = (value: number) => words.amount(value, measure);
  return (
    <>
      <h2 className="mb-1 text-lg">
        {t(measure === 'cost' ? 'explain.cost' : 'explain.outcome', {
          strategy: words.strategy(strategy),
          unit: words.outcome.plural,
        })}
      </h2>
      <p className="mb-3 text-sm text-mute">{t('explain.totalLead')}</p>
      <table className="w-full border-collapse text-right">
        <tbody>
          {parts.map(({ id, label, category, total: own }) => (
            <tr key={id} className="border-b border-rule">
              <th scope="row" className="py-2 text-left font-normal">
                <Ask onClick={() => onAsk({ what: 'payoff', strategy, payoff: id })}>{label}</Ask>
                <span className="block text-sm text-mute">{category}</span>
              </th>
              <td className="py-2 pl-3">
                <Figure name={`payoff-${id}`} value={own}>
                  {write(own)}
                </Figure>
              </td>
            </tr>
          ))}
          <tr className="font-bold">
            <th scope="row" className="py-2 text-left">
              {t('explain.sum')}
            </th>
            <td className="py-2 pl-3">
              <Figure name="explained-total" value={total}>
                {write(total)}
              </Figure>
            </td>
          </tr>
        </tbody>
      </table>
    </>
  );
}

/** Payoffs of the measure that count for the strategy. */
function partsOf(document: ModelDocument, strategy: string, measure: 'cost' | 'outcome') {
  return document.payoffs
    .filter((payoff) => payoff.measure === measure)
    .filter(({ strategies }) => strategies?.includes(strategy) ?? true)
    .map(({ id, label, category }) => ({
      ...{ id, label, category },
      total: explainPayoff(document, strategy, null, id).total,
    }));
}
