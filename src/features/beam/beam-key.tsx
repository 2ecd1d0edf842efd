import { useTranslation } from 'react-i18next';
import type { FrontierSegment } from '../../../shared/analysis/frontier-segments.ts';
import { Swatch } from '../../components/strategy-mark.tsx';

interface BeamKeyProps {
  /** Over all thresholds: also what lies beyond the arm's end. */
  readonly ranges: readonly FrontierSegment[];
  readonly names: ReadonlyMap<string, string>;
  readonly moneyFor: (amount: number) => string;
}

/** The names that find no room along the arm, with the thresholds at which each is best. */
export function BeamKey({ ranges, names, moneyFor }: BeamKeyProps) {
  const { t } = useTranslation();
  const order = [...names.keys()];
  return (
    <ul aria-label={t('beam.key')} className="mt-1 grid max-w-xl gap-1">
      {ranges.map(({ strategy, from, to }) => (
        <li key={strategy} className="flex flex-wrap items-center gap-x-2">
          <Swatch index={order.indexOf(strategy)} />
          {names.get(strategy)}
          <span className="ml-auto text-sm text-mute">
            {to === Number.POSITIVE_INFINITY
              ? t('beam.from', { from: moneyFor(from) })
              : t('beam.between', { from: moneyFor(from), to: moneyFor(to) })}
          </span>
        </li>
      ))}
    </ul>
  );
}
