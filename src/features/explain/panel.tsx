/** Slides in at the side and leaves the page at work; on a phone it takes the screen. */
import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { DocumentError } from '../../../shared/model/issue.ts';
import { Failing } from '../../components/failing.tsx';
import { IssueList } from '../../components/issue-list.tsx';
import { FormulaView } from './formula-view.tsx';
import { OccupancyView } from './occupancy-view.tsx';
import { ParameterView } from './parameter-view.tsx';
import { PayoffView } from './payoff-view.tsx';
import type { Subject } from './subject.ts';
import { TotalView } from './total-view.tsx';

interface PanelProps {
  readonly document: ModelDocument;
  /** What is shown is the last; those before it are the way back. */
  readonly asked: readonly Subject[];
  readonly onAsk: (asked: readonly Subject[]) => void;
  readonly onClose: () => void;
}

export interface ViewProps<W extends Subject['what']> {
  readonly document: ModelDocument;
  readonly subject: Extract<Subject, { what: W }>;
  /** Goes further into what it is made of. */
  readonly onAsk: (subject: Subject) => void;
}

const WIDE = '(min-width: 1024px)';

export function Panel({ document, asked, onAsk, onClose }: PanelProps) {
  const { t } = useTranslation();
  const dialog = useRef<HTMLDialogElement>(null);
  const subject = asked.at(-1);
  useEffect(() => {
    const element = dialog.current;
    if (!element || element.open) return;
    if (window.matchMedia?.(WIDE).matches) element.show();
    else element.showModal();
  }, []);
  useEffect(() => {
    dialog.current?.scrollTo?.(0, 0);
    if (asked.length > 1) dialog.current?.focus();
  }, [asked]);
  if (!subject) return null;
  const close = () => dialog.current?.close();
  return (
    <dialog
      ref={dialog}
      tabIndex={-1}
      aria-label={t('explain.title')}
      onClose={onClose}
      onKeyDown={(event) => event.key === 'Escape' && close()}
      className="fixed inset-y-0 right-0 left-auto z-20 m-0 h-dvh max-h-none w-full max-w-full overflow-y-auto border-l border-rule-strong bg-paper p-4 text-ink shadow-float outline-none backdrop:bg-[rgb(0_0_0/0.5)] sm:w-[30rem] motion-safe:transition-transform motion-safe:starting:translate-x-8 print:hidden"
    >
      <div className="mb-3 flex items-center gap-2">
        {asked.length > 1 && (
          <button type="button" className="control px-3" onClick={() => onAsk(asked.slice(0, -1))}>
            {t('explain.back')}
          </button>
        )}
        <p className="text-mute">{t('explain.title')}</p>
        <button type="button" className="control ml-auto px-3" onClick={close}>
          {t('explain.close')}
        </button>
      </div>
      <Failing
        key={JSON.stringify(subject)}
        fallback={(problem) => <Unexplained problem={problem} document={document} />}
      >
        <View document={document} subject={subject} onAsk={(next) => onAsk([...asked, next])} />
      </Failing>
    </dialog>
  );
}

function View(props: {
  document: ModelDocument;
  subject: Subject;
  onAsk: (subject: Subject) => void;
}) {
  const { subject, ...rest } = props;
  switch (subject.what) {
    case 'total':
      return <TotalView {...rest} subject={subject} />;
    case 'payoff':
      return <PayoffView {...rest} subject={subject} />;
    case 'occupancy':
      return <OccupancyView {...rest} subject={subject} />;
    case 'parameter':
      return <ParameterView {...rest} subject={subject} />;
    case 'formula':
      return <FormulaView {...rest} subject={subject} />;
  }
}

/** A model that was broken, or lost what was asked of, since the panel was opened. */
function Unexplained({ problem, document }: { problem: unknown; document: ModelDocument }) {
  const { t } = useTranslation();
  return (
    <div role="alert">
      <p>{t('explain.cannot')}</p>
      {problem instanceof DocumentError && (
        <IssueList issues={problem.issues} document={document} most={3} />
      )}
    </div>
  );
}
