import { useTranslation } from 'react-i18next';
import { dismissUpdate, takeNewVersion, useUpdateState } from './updates.ts';

/** Says what the service worker has to say; the reader chooses when. */
export function UpdateNotice() {
  const { t } = useTranslation();
  const state = useUpdateState();
  return (
    <div
      role="status"
      aria-live="polite"
      className="pointer-events-none fixed inset-x-0 bottom-0 z-20 flex justify-center p-4"
    >
      {state !== 'none' && (
        <div className="pointer-events-auto flex max-w-xl flex-wrap items-center gap-x-4 gap-y-2 rounded-md border border-rule-strong bg-raised px-4 py-3 shadow-float">
          <p>{t(`update.${state}`)}</p>
          {state !== 'offlineReady' && (
            <button type="button" className="control-primary" onClick={takeNewVersion}>
              {t('update.take')}
            </button>
          )}
          <button type="button" className="control" onClick={dismissUpdate}>
            {t(state === 'offlineReady' ? 'update.close' : 'update.later')}
          </button>
        </div>
      )}
    </div>
  );
}
