import { useTranslation } from 'react-i18next';
import { exportDocument } from './export-document.ts';
import { useSession } from './session-context.ts';

/** Where the work is, in words and by a mark; what to do where it is not safe. */
export function WorkState() {
  const { t } = useTranslation();
  const { state, session, document } = useSession();
  const { work, appraisal } = state;
  if (work.status === 'failed') {
    return (
      <span className="flex flex-wrap items-center gap-x-3 text-sm text-clay">
        <span role="alert">{t('shell.failed', { why: t(work.code) })}</span>
        <Act name={t('shell.retry')} act={() => void session.retry()} />
        <Act name={t('shell.export')} act={() => void exportDocument(document)} />
      </span>
    );
  }
  if (work.status === 'saving')
    return <Said mark="border-2 border-brass">{t('shell.saving')}</Said>;
  if (!appraisal) return <Said mark="border-2 border-mute">{t('shell.example')}</Said>;
  return <Said mark="bg-gain">{t('shell.saved')}</Said>;
}

function Said({ mark, children }: { mark: string; children: string }) {
  return (
    <span data-work className="flex min-h-11 items-center gap-2 text-sm text-mute" role="status">
      <span aria-hidden="true" className={`size-2 shrink-0 rounded-full ${mark}`} />
      {children}
    </span>
  );
}

function Act({ name, act }: { name: string; act: () => void }) {
  return (
    <button type="button" className="min-h-11 text-ink underline underline-offset-4" onClick={act}>
      {name}
    </button>
  );
}
