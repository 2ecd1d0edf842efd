import { type ReactNode, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, useLocation } from 'react-router-dom';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { Brand } from '../../components/brand.tsx';
import { Preferences } from '../../components/preferences.tsx';
import { Finder } from '../../features/finder/finder.tsx';
import { Help } from '../../features/help/help.tsx';
import { Rail, type RailStep } from '../../features/rail/rail.tsx';
import { formatNumber } from '../../i18n/format.ts';
import { HELP_TOPICS } from '../../i18n/help-words.ts';
import { useSettings } from '../../store/settings.ts';
import { KeysHelp } from './keys-help.tsx';
import { Notices } from './notices.tsx';
import { useSession } from './session-context.ts';
import { UndoButtons } from './undo-buttons.tsx';
import { useFinderEntries } from './use-finder-entries.ts';
import { useSought } from './use-sought.ts';
import { WorkState } from './work-state.tsx';

interface FrameProps {
  readonly strip: ReactNode;
  readonly children: ReactNode;
}

export function Frame({ strip, children }: FrameProps) {
  const { t } = useTranslation();
  const { document } = useSession();
  const drawer = useRef<HTMLDialogElement>(null);
  const keys = useRef<HTMLDialogElement>(null);
  const steps = useSteps(document);
  const close = () => drawer.current?.close();
  const showKeys = () => {
    close();
    keys.current?.showModal();
  };
  const entries = useFinderEntries(steps, showKeys);
  const go = useSought();
  const topic = useTopic();
  return (
    <div className="lg:grid lg:grid-cols-[220px_1fr] print:block">
      <aside className="sticky top-0 hidden h-dvh flex-col overflow-y-auto p-5 pr-0 lg:flex print:hidden">
        <Brand />
        <div className="mt-5">
          <Rail steps={steps} />
          <OtherPlaces onKeys={showKeys} />
        </div>
        <div className="mt-auto pt-6 pr-5">
          <Preferences stacked />
        </div>
      </aside>
      <dialog
        ref={drawer}
        aria-label={t('rail.label')}
        className="m-0 h-dvh max-h-none w-72 max-w-[85vw] border-r border-rule bg-paper p-5 text-ink backdrop:bg-[rgb(0_0_0/0.5)]"
      >
        <div className="flex min-h-full flex-col">
          <div className="mb-5 flex items-center justify-between">
            <Brand />
            <button type="button" className="control" onClick={close}>
              {t('rail.close')}
            </button>
          </div>
          <Rail steps={steps} onGo={close} />
          <OtherPlaces onKeys={showKeys} />
          <div className="mt-auto pt-6">
            <Preferences stacked />
          </div>
        </div>
      </dialog>
      <KeysHelp dialog={keys} />
      <div className="min-h-dvh min-w-0 border-rule lg:border-l print:border-0">
        <div className="mx-auto w-full max-w-[1280px] px-4 pb-12 sm:px-8 print:max-w-none print:p-0">
          <header className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b-2 border-ink py-2 print:hidden">
            <button
              type="button"
              className="control px-3 lg:hidden"
              onClick={() => drawer.current?.showModal()}
            >
              <svg width="18" height="14" viewBox="0 0 18 14" aria-hidden="true">
                <path d="M0 2 H18 M0 7 H18 M0 12 H18" stroke="currentColor" strokeWidth="2" />
              </svg>
              {t('rail.open')}
            </button>
            <p className="min-w-0 font-bold break-words">{document.question.title}</p>
            <div className="ml-auto flex flex-wrap items-center gap-x-3">
              <WorkState />
              <UndoButtons />
              <Finder document={document} entries={entries} go={go} />
              <Help topic={topic} />
            </div>
          </header>
          <Notices />
          <div className="bg-paper lg:sticky lg:top-0 lg:z-10 print:hidden">{strip}</div>
          <main id="main" tabIndex={-1} className="min-w-0 outline-none">
            {children}
          </main>
          <footer className="mt-10 max-w-[70em] border-t border-rule pt-3 text-sm text-mute print:hidden">
            <Provenance about={document.about} />
            <p>{t('caution')}</p>
          </footer>
        </div>
      </div>
    </div>
  );
}

/** In the order of the job. */
function useSteps({ parameters }: ModelDocument): readonly RailStep[] {
  const { t } = useTranslation();
  const { language } = useSettings();
  return [
    { to: 'question', name: t('steps.question') },
    {
      to: 'evidence',
      name: t('steps.evidence'),
      fact: formatNumber(parameters.length, language),
    },
    { to: 'model', name: t('steps.model') },
    { to: 'results', name: t('steps.results') },
    { to: 'uncertainty', name: t('steps.uncertainty') },
    { to: 'brief', name: t('brief.step') },
    { to: 'history', name: t('steps.history') },
  ];
}

/** The step in view, as the address tells it. */
function useTopic() {
  const step = useLocation().pathname.split('/')[3];
  return HELP_TOPICS.find((topic) => topic === step) ?? 'results';
}

function OtherPlaces({ onKeys }: { onKeys: () => void }) {
  const { t } = useTranslation();
  const style = 'flex min-h-11 items-center text-mute hover:text-ink';
  return (
    <div className="mt-4">
      <Link to="/" className={style}>
        {t('rail.all')}
      </Link>
      <Link to="/settings" className={style}>
        {t('shell.settings')}
      </Link>
      <button type="button" className={style} onClick={onKeys}>
        {t('keys.title')}
      </button>
    </div>
  );
}

function Provenance({ about }: { about: ModelDocument['about'] }) {
  const { t } = useTranslation();
  if (about.invented) return <p className="font-bold text-ink">{t('provenance.invented')}</p>;
  return about.citation ? <p>{t('provenance.published', { citation: about.citation })}</p> : null;
}
