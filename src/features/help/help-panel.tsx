/** Slides in at the side, so that one can read and do; on a phone it takes the screen. */
import { use, useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { Failing } from '../../components/failing.tsx';
import { type HelpTopic, helpWords } from '../../i18n/help-words.ts';
import { useSettings } from '../../store/settings.ts';

interface HelpPanelProps {
  readonly topic: HelpTopic;
  readonly onClose: () => void;
}

const WIDE = '(min-width: 1024px)';

export function HelpPanel({ topic, onClose }: HelpPanelProps) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const element = dialog.current;
    if (!element || element.open) return;
    if (window.matchMedia?.(WIDE).matches) element.show();
    else element.showModal();
  }, []);
  const close = () => dialog.current?.close();
  return (
    <dialog
      ref={dialog}
      tabIndex={-1}
      aria-label={t('shell.helpOnStep')}
      onClose={onClose}
      onKeyDown={(event) => event.key === 'Escape' && close()}
      className="fixed inset-y-0 right-0 left-auto z-20 m-0 h-dvh max-h-none w-full max-w-full overflow-y-auto border-l border-rule-strong bg-paper p-5 text-ink shadow-float outline-none backdrop:bg-[rgb(0_0_0/0.5)] sm:w-[26rem] motion-safe:transition-transform motion-safe:starting:translate-x-8 print:hidden"
    >
      <div className="mb-4 flex items-center gap-2">
        <p className="text-mute">{t('shell.helpOnStep')}</p>
        <button type="button" className="control ml-auto px-3" onClick={close}>
          {t('shell.dismiss')}
        </button>
      </div>
      <Failing key={language} fallback={() => <p role="alert">{t('shell.helpFailed')}</p>}>
        <Topic topic={topic} words={helpWords(language)} />
      </Failing>
    </dialog>
  );
}

function Topic({ topic, words }: { topic: HelpTopic; words: ReturnType<typeof helpWords> }) {
  const title = useTopicTitle(topic);
  const { headings, topics } = use(words);
  const { what, todo, wrong } = topics[topic];
  return (
    <>
      <h2 className="text-xl">{title}</h2>
      <h3 className="mt-5">{headings.what}</h3>
      <p className="mt-1">{what}</p>
      <h3 className="mt-5">{headings.todo}</h3>
      <ol className="mt-1 grid list-decimal gap-2 pl-6 marker:text-mute">
        {todo.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ol>
      <h3 className="mt-5">{headings.wrong}</h3>
      <ul className="mt-1 grid list-disc gap-2 pl-6 marker:text-clay">
        {wrong.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
    </>
  );
}

function useTopicTitle(topic: HelpTopic): string {
  const { t } = useTranslation();
  switch (topic) {
    case 'appraisals':
      return t('appraisals.title');
    case 'settings':
      return t('shell.settings');
    case 'brief':
      return t('brief.step');
    default:
      return t(`steps.${topic}`);
  }
}
