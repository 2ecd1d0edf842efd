/** A parameter: its value, how sure it is, where it comes from, and where it is used. */
import { useMemo } from 'react';
import { INTERVAL } from '../../../shared/analysis/psa/means.ts';
import { marginalOf } from '../../../shared/engine/distributions/marginal.ts';
import { formulaUses } from '../../../shared/formula/edit/uses.ts';
import { Figure } from '../../components/figure.tsx';
import { distributionWords } from '../../i18n/distribution-words.ts';
import type { ViewProps } from './panel.tsx';
import { useExplainWords } from './words.ts';

export function ParameterView({ document, subject }: ViewProps<'parameter'>) {
  const words = useExplainWords(document);
  const { t, exact, language } = words;
  const found = document.parameters.find(({ id }) => id === subject.parameter);
  const uses = useMemo(
    () => formulaUses(document, { what: 'parameter', id: subject.parameter }),
    [document, subject.parameter],
  );
  if (!found) return <p>{t('explain.cannot')}</p>;
  const { distribution, source } = found;
  const marginal = marginalOf(found, document.groups);
  const [low, high] = INTERVAL.map(marginal.quantile);
  return (
    <>
      <h2 className="text-lg">{found.label}</h2>
      <p className="mb-3 text-sm text-mute">
        {found.symbol} · {t(`kinds.${found.kind}`)}
      </p>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1.5">
        <dt className="text-mute">{t('evidence.value')}</dt>
        <dd>
          <Figure name="explained-parameter" value={found.value}>
            {exact(found.value)}
          </Figure>{' '}
          {found.unit}
        </dd>
        <dt className="text-mute">{t('evidence.distribution')}</dt>
        <dd>{distributionWords(distribution, document, t, language)}</dd>
        {distribution.type !== 'fixed' && (
          <>
            <dt className="text-mute">{t('explain.mean')}</dt>
            <dd>{exact(marginal.mean)}</dd>
            <dt className="text-mute">{t('explain.interval')}</dt>
            <dd>
              {t('explain.fromTo', {
                low: exact(low ?? Number.NaN),
                high: exact(high ?? Number.NaN),
              })}
            </dd>
          </>
        )}
        <dt className="text-mute">{t('evidence.source')}</dt>
        <dd className="min-w-0 break-words">
          {source.citation}
          {source.page && `, ${source.page}`}
          {source.url && <span className="block text-sm">{source.url}</span>}
          {source.invented && (
            <span className="block text-sm text-brass">{t('appraisals.invented')}</span>
          )}
        </dd>
        {found.notes && (
          <>
            <dt className="text-mute">{t('explain.notes')}</dt>
            <dd>{found.notes}</dd>
          </>
        )}
      </dl>
      <h3 className="mt-4 text-base">{t('explain.usedIn')}</h3>
      <ul>
        {uses.map(({ place, label }) => (
          <li key={JSON.stringify(place)} className="border-b border-rule py-1">
            {label}
          </li>
        ))}
        {uses.length === 0 && <li className="text-mute">{t('explain.usedNowhere')}</li>}
      </ul>
    </>
  );
}
