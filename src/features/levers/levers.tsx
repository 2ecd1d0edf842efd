/** The way to the what-if panel, which is fetched when it is opened. */
import { lazy, Suspense, useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { LeversPanelProps } from './levers-panel.tsx';

const LeversPanel = lazy(async () => ({
  default: (await import('./levers-panel.tsx')).LeversPanel,
}));

export function Levers(props: LeversPanelProps) {
  const { t } = useTranslation();
  const panel = useId();
  const count = props.levers.overrides.length;
  const [opened, setOpened] = useState(count > 0);
  return (
    <section aria-label={t('levers.title')} className="mt-5 border-y border-rule py-2 print:hidden">
      <h2 className="text-base">
        <button
          type="button"
          aria-expanded={opened}
          aria-controls={panel}
          className="flex min-h-11 w-full items-center gap-2 text-left"
          onClick={() => setOpened(!opened)}
        >
          <svg width="12" height="12" viewBox="0 0 12 12" aria-hidden="true">
            <path
              d={opened ? 'M1 3 L6 9 L11 3' : 'M3 1 L9 6 L3 11'}
              fill="none"
              stroke="var(--brass)"
              strokeWidth="2"
            />
          </svg>
          {count > 0 ? t('levers.titleMoved', { count }) : t('levers.title')}
        </button>
      </h2>
      <div id={panel}>
        {opened && (
          <Suspense fallback={<p className="text-mute">{t('app.loading')}</p>}>
            <LeversPanel {...props} />
          </Suspense>
        )}
      </div>
    </section>
  );
}
