/** Who is in a state at a moment, where they came from, and where they go. */
import { useMemo } from 'react';
import { explainOccupancy, type Flow } from '../../../shared/analysis/explain/occupancy.ts';
import { Figure } from '../../components/figure.tsx';
import { Ask } from './ask.tsx';
import type { ViewProps } from './panel.tsx';
import { useExplainWords } from './words.ts';

export function OccupancyView({ document, subject, onAsk }: ViewProps<'occupancy'>) {
  const words = useExplainWords(document);
  const { t, exact } = words;
  const { strategy, state, cycle } = subject;
  const explained = useMemo(
    () => explainOccupancy(document, strategy, null, state, cycle),
    [document, strategy, state, cycle],
  );
  const { inflows, outflows, terms } = explained;
  return (
    <>
      <h2 className="mb-1 text-lg">
        {t('explain.occupancy', {
          state: words.state(state),
          cycle: words.number(cycle, 0),
          strategy: words.strategy(strategy),
        })}
      </h2>
      <p className="mb-3 text-lg font-bold">
        <Figure name="explained-occupancy" value={explained.occupancy}>
          {exact(explained.occupancy)}
        </Figure>
      </p>
      {terms.length > 0 && (
        <>
          <h3 className="text-base">{t(cycle === 0 ? 'explain.startShares' : 'explain.curves')}</h3>
          <ul className="mb-3">
            {terms.map(({ sign, value, site }) => (
              <li key={site?.path.join('.') ?? 'whole'} className="border-b border-rule py-1.5">
                {sign < 0 ? '−' : '+'} {exact(value)}{' '}
                {site ? (
                  <Ask onClick={() => onAsk({ what: 'formula', strategy, cycle, ...site })}>
                    {site.text}
                  </Ask>
                ) : (
                  t('explain.whole')
                )}
              </li>
            ))}
          </ul>
        </>
      )}
      <Flows
        title={t('explain.inflows')}
        flows={inflows}
        cycle={cycle - 1}
        {...{ strategy, words, onAsk }}
      />
      <Flows
        title={t('explain.outflows')}
        flows={outflows}
        cycle={cycle}
        {...{ strategy, words, onAsk }}
      />
    </>
  );
}

interface FlowsProps extends Pick<ViewProps<'occupancy'>, 'onAsk'> {
  readonly title: string;
  readonly flows: readonly Flow[];
  readonly strategy: string;
  readonly cycle: number;
  readonly words: ReturnType<typeof useExplainWords>;
}

/** Share there x chance of the move = share that moves. */
function Flows({ title, flows, strategy, cycle, words, onAsk }: FlowsProps) {
  const { t, exact } = words;
  if (flows.length === 0) return null;
  return (
    <>
      <h3 className="text-base">{title}</h3>
      <p className="text-sm text-mute">{t('explain.flow')}</p>
      <ul className="mb-3">
        {flows.map(({ state, stays, occupancy, chance, flow, site }) => (
          <li key={state} className="border-b border-rule py-1.5">
            <span className="block">
              {words.state(state)}
              {stays && <span className="text-mute"> ({t('explain.stays')})</span>}
            </span>
            {exact(occupancy)} × {exact(chance)} = <b>{exact(flow)}</b>
            <span className="block text-sm text-mute">
              {site ? (
                <Ask onClick={() => onAsk({ what: 'formula', strategy, cycle, ...site })}>
                  {site.text}
                </Ask>
              ) : (
                t('explain.rest')
              )}
            </span>
          </li>
        ))}
      </ul>
    </>
  );
}
