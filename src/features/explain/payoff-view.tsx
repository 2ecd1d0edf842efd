/** A payoff cycle by cycle: who was where, what each counted, worth what today. */
import { Fragment, useMemo, useState } from 'react';
import { explainPayoff, type PayoffCycle } from '../../../shared/analysis/explain/payoff.ts';
import { Figure } from '../../components/figure.tsx';
import { Ask } from './ask.tsx';
import type { ViewProps } from './panel.tsx';
import { useExplainWords } from './words.ts';

/** Cycles shown at once: a weekly model has hundreds. */
const SHOWN = 60;

export function PayoffView({ document, subject, onAsk }: ViewProps<'payoff'>) {
  const words = useExplainWords(document);
  const { t } = words;
  const { strategy, payoff: id } = subject;
  const [opened, setOpened] = useState<number | null>(0);
  const [more, setMore] = useState(1);
  const explained = useMemo(
    () => explainPayoff(document, strategy, null, id),
    [document, strategy, id],
  );
  const payoff = document.payoffs.find((each) => each.id === id);
  if (!payoff) return null;
  const write = (value: number) => words.amount(value, payoff.measure);
  const shown = explained.cycles.slice(0, more * SHOWN);
  return (
    <>
      <h2 className="mb-1 text-lg">
        {t('explain.payoff', { payoff: payoff.label, strategy: words.strategy(strategy) })}
      </h2>
      <p className="mb-3">
        <Figure name="explained-payoff" value={explained.total}>
          {write(explained.total)}
        </Figure>{' '}
        <span className="text-sm text-mute">{t('explain.perPerson')}</span>
      </p>
      <h3 className="text-base">{t('explain.formulas')}</h3>
      <ul className="mb-4">
        {explained.sites.map(({ path, text, state }) => (
          <li key={path.join('.')} className="border-b border-rule py-1.5">
            {state !== null && (
              <span className="block text-sm text-mute">{words.state(state)}</span>
            )}
            <Ask onClick={() => onAsk({ what: 'formula', strategy, path, text })}>{text}</Ask>
          </li>
        ))}
      </ul>
      {explained.cycles.length === 0 && <p>{t('explain.notCounted')}</p>}
      {explained.cycles.length > 0 && (
        <>
          <h3 className="text-base">{t('explain.cycles')}</h3>
          <p className="text-sm text-mute">{t('explain.product')}</p>
          <table className="mt-2 w-full border-collapse text-right text-sm">
            <thead className="text-mute">
              <tr className="border-b border-ink">
                <th scope="col" className="pb-1 text-left font-normal">
                  {t('more.trace.cycle')}
                </th>
                <th scope="col" className="pb-1 pl-2 font-normal">
                  {t('explain.inCycle')}
                </th>
                <th scope="col" className="pb-1 pl-2 font-normal">
                  {t('explain.soFar')}
                </th>
              </tr>
            </thead>
            <tbody>
              {shown.map((row) => (
                <Fragment key={row.cycle}>
                  <tr className="border-b border-rule">
                    <th scope="row" className="py-1 text-left font-normal">
                      <button
                        type="button"
                        aria-expanded={opened === row.cycle}
                        className="min-h-8 min-w-12 text-left underline decoration-rule-strong underline-offset-4"
                        onClick={() => setOpened(opened === row.cycle ? null : row.cycle)}
                      >
                        {words.number(row.cycle, 0)}
                      </button>
                    </th>
                    <td className="py-1 pl-2">{write(row.total)}</td>
                    <td className="py-1 pl-2">{write(row.running)}</td>
                  </tr>
                  {opened === row.cycle && (
                    <tr className="border-b border-rule">
                      <td colSpan={3} className="py-1 pl-3 text-left">
                        <Working row={row} words={words} write={write} />
                      </td>
                    </tr>
                  )}
                </Fragment>
              ))}
            </tbody>
          </table>
          {shown.length < explained.cycles.length && (
            <button type="button" className="control mt-2" onClick={() => setMore(more + 1)}>
              {t('explain.moreCycles')}
            </button>
          )}
        </>
      )}
    </>
  );
}

interface WorkingProps {
  readonly row: PayoffCycle;
  readonly words: ReturnType<typeof useExplainWords>;
  readonly write: (value: number) => string;
}

/** The products that a cycle sums: share x amount x part counted x discount. */
function Working({ row, words, write }: WorkingProps) {
  const { t, exact } = words;
  return (
    <ul>
      {row.parts.map(({ state, moment, occupancy, value, share, discount, product }) => (
        <li key={`${state} ${moment}`} className="py-0.5">
          <span className="text-mute">
            {state === null ? t('explain.everyone') : words.state(state)},{' '}
            {t(`explain.moment.${moment}`)}:{' '}
          </span>
          {value === null
            ? t('explain.noAmount')
            : [occupancy, value, share, discount].map(exact).join(' × ')}
          {' = '}
          {write(product)}
        </li>
      ))}
    </ul>
  );
}
