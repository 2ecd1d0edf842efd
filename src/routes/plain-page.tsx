import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { Brand } from '../components/brand.tsx';
import { Preferences } from '../components/preferences.tsx';
import { Help } from '../features/help/help.tsx';
import type { HelpTopic } from '../i18n/help-words.ts';

interface PlainPageProps {
  /** Language and theme stand in the page itself. */
  readonly hasChoices?: boolean;
  readonly help?: HelpTopic;
  readonly children: ReactNode;
}

/** A page outside an appraisal: the name and the choices on top, one column below. */
export function PlainPage({ hasChoices = false, help, children }: PlainPageProps) {
  const { t } = useTranslation();
  return (
    <div className="mx-auto max-w-5xl px-4 pb-16 sm:px-8">
      <header className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-b-2 border-ink py-3">
        <Brand />
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
          {!hasChoices && <Preferences />}
          <Link to="/settings" className="flex min-h-11 items-center text-mute hover:text-ink">
            {t('shell.settings')}
          </Link>
          {help && <Help topic={help} />}
        </div>
      </header>
      <main id="main" tabIndex={-1} className="outline-none">
        {children}
      </main>
    </div>
  );
}
