import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  type Deleted,
  deleteAppraisal,
  restoreAppraisal,
  useAppraisals,
} from '../../store/appraisals.ts';
import { useConnection } from '../../store/connection.ts';
import { type StoreCode, storeCode } from '../../store/store-error.ts';
import { OwnAppraisal } from './own-appraisal.tsx';

/** The appraisals of this device; what was deleted can be brought back while the page is open. */
export function OwnAppraisals() {
  const { t } = useTranslation();
  const list = useAppraisals();
  const [deleted, setDeleted] = useState<Deleted | null>(null);
  const [failed, setFailed] = useState<StoreCode | null>(null);
  /** Tells what went wrong with any of the acts. */
  const attempt = async (work: () => Promise<void>) => {
    setFailed(null);
    await work().catch((problem) => setFailed(storeCode(problem)));
  };
  const remove = (id: string) =>
    attempt(async () => {
      setDeleted(await deleteAppraisal(id));
    });
  const restore = (gone: Deleted) =>
    attempt(async () => {
      await restoreAppraisal(gone);
      setDeleted(null);
    });
  const code = list.status === 'failed' ? list.code : failed;
  const own = list.status === 'read' ? list.appraisals : [];
  return (
    <>
      <StoreNotice code={code} />
      <div role="status">
        {deleted && (
          <p className="mt-6 flex flex-wrap items-center gap-x-4 rounded-md bg-brass-soft px-3 py-1">
            {t('own.deleted', { title: deleted.appraisal.title })}
            <button
              type="button"
              className="min-h-11 underline underline-offset-4"
              onClick={() => void restore(deleted)}
            >
              {t('shell.undo')}
            </button>
          </p>
        )}
      </div>
      {own.length > 0 && (
        <section aria-labelledby="own-title" className="mt-10">
          <h2 id="own-title" className="border-b border-ink pb-1.5 text-lg">
            {t('own.title')}
          </h2>
          <ul>
            {own.map((appraisal) => (
              <OwnAppraisal
                key={appraisal.id}
                appraisal={appraisal}
                attempt={attempt}
                remove={() => void remove(appraisal.id)}
              />
            ))}
          </ul>
        </section>
      )}
    </>
  );
}

/** What the reader has to know of the store before work is trusted to it. */
function StoreNotice({ code }: { code: StoreCode | null }) {
  const { t } = useTranslation();
  const connection = useConnection();
  const words = connection === 'open' ? code && t(code) : t(`connection.${connection}`);
  return (
    <div role="alert">
      {words && <p className="mt-6 max-w-[44em] border-l-4 border-clay pl-4 text-clay">{words}</p>}
    </div>
  );
}
