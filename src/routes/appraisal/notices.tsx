import { useTranslation } from 'react-i18next';
import { useSession } from './session-context.ts';

/** What happened to the work behind the reader's back: said until it is closed. */
export function Notices() {
  const { t } = useTranslation();
  const { state, session } = useSession();
  return (
    <div role="status" className="print:hidden">
      {state.notices.map(({ id, code, label, count }) => (
        <p
          key={id}
          className="flex flex-wrap items-center gap-x-4 border-b border-rule bg-brass-soft px-3 py-1"
        >
          <span className="min-w-0 flex-1 basis-64">{t(code, { label, count })}</span>
          <button
            type="button"
            className="min-h-11 underline underline-offset-4"
            onClick={() => session.dismiss(id)}
          >
            {t('shell.dismiss')}
          </button>
        </p>
      ))}
    </div>
  );
}
