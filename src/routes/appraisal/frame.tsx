import { type ReactNode, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { Brand } from '../../components/brand.tsx';
import { Preferences } from '../../components/preferences.tsx';
import { Rail, type RailStep } from '../../features/rail/rail.tsx';
import { formatNumber } from '../../i18n/format.ts';
import { useSettings } from '../../store/settings.ts';

interface FrameProps {
  readonly document: ModelDocument | null;
  /** Name of the file it came from; null for a worked example. */
  readonly file: string | null;
  readonly strip: ReactNode;
  readonly children: ReactNode;
}

export function Frame({ document, file, strip, children }: FrameProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const drawer = useRef<HTMLDialogElement>(null);
  const count = document?.parameters.length;
  const steps: RailStep[] = [
    { to: 'question', name: t('steps.question') },
    {
      to: 'evidence',
      name: t('steps.evidence'),
      ...(count === undefined ? {} : { fact: formatNumber(count, language) }),
    },
    { to: 'results', name: t('steps.results') },
  ];
  const close = () => drawer.current?.close();
  return (
    <div className="lg:grid lg:grid-cols-[220px_1fr]">
      <aside className="sticky top-0 hidden h-dvh flex-col overflow-y-auto p-5 pr-0 lg:flex">
        <Brand />
        <div className="mt-5">
          <Rail steps={steps} />
          <AllAppraisals />
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
        <div className="flex h-full flex-col">
          <div className="mb-5 flex items-center justify-between">
            <Brand />
            <button type="button" className="control" onClick={close}>
              {t('rail.close')}
            </button>
          </div>
          <Rail steps={steps} onGo={close} />
          <AllAppraisals />
          <div className="mt-auto pt-6">
            <Preferences stacked />
          </div>
        </div>
      </dialog>
      <div className="min-h-dvh min-w-0 border-rule lg:border-l">
        <div className="mx-auto w-full max-w-[1280px] px-4 pb-12 sm:px-8">
          <header className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b-2 border-ink py-2">
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
            <p className="font-bold">{document?.question.title ?? file}</p>
            <p className="ml-auto flex min-h-11 items-center gap-2 text-sm text-mute">
              <span
                aria-hidden="true"
                className={`size-2 rounded-full ${file === null ? 'bg-gain' : 'border-2 border-brass'}`}
              />
              {file === null ? t('state.example') : t('state.file', { file })}
            </p>
          </header>
          {strip}
          <main id="main" tabIndex={-1} className="min-w-0 outline-none">
            {children}
          </main>
          <footer className="mt-10 max-w-[70em] border-t border-rule pt-3 text-sm text-mute">
            {document && <Provenance about={document.about} />}
            <p>{t('caution')}</p>
          </footer>
        </div>
      </div>
    </div>
  );
}

function AllAppraisals() {
  const { t } = useTranslation();
  return (
    <Link to="/" className="mt-4 inline-flex min-h-11 items-center text-mute hover:text-ink">
      {t('rail.all')}
    </Link>
  );
}

function Provenance({ about }: { about: ModelDocument['about'] }) {
  const { t } = useTranslation();
  if (about.invented) return <p className="font-bold text-ink">{t('provenance.invented')}</p>;
  return about.citation ? <p>{t('provenance.published', { citation: about.citation })}</p> : null;
}
