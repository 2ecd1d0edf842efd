/** The button that opens the help on the step in view. */
import { lazy, Suspense, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { HelpTopic } from '../../i18n/help-words.ts';

const HelpPanel = lazy(async () => ({ default: (await import('./help-panel.tsx')).HelpPanel }));

export function Help({ topic }: { topic: HelpTopic }) {
  const { t } = useTranslation();
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <button
        type="button"
        aria-label={t('shell.helpOnStep')}
        aria-expanded={isOpen}
        className="flex min-h-11 items-center px-1 underline decoration-rule-strong underline-offset-4 hover:decoration-ink"
        onClick={() => setOpen(true)}
      >
        {t('shell.help')}
      </button>
      {isOpen && (
        <Suspense fallback={null}>
          <HelpPanel topic={topic} onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
}
