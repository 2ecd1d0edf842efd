import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { formatNumber } from '../../i18n/format.ts';
import { useAppraisals } from '../../store/appraisals.ts';
import { askToPersist, readStorageFacts, type StorageFacts } from '../../store/persistence.ts';
import { type Language, useSettings } from '../../store/settings.ts';

const FACTS = ['storage-facts'];

/** What is kept, how much room there is, and whether the browser promises to keep it. */
export function Storage() {
  const { t } = useTranslation();
  const { language } = useSettings();
  const queries = useQueryClient();
  const list = useAppraisals();
  const { data: facts } = useQuery({
    queryKey: FACTS,
    queryFn: readStorageFacts,
    staleTime: 0,
  });
  const ask = async () => queries.setQueryData(FACTS, await askToPersist());
  return (
    <>
      {list.status === 'failed' && <p className="text-clay">{t(list.code)}</p>}
      {list.status === 'read' && (
        <p>{t('settings.appraisals', { count: list.appraisals.length })}</p>
      )}
      {facts && (
        <>
          <Room facts={facts} language={language} />
          <p role="status">{t(`settings.kept.${facts.kept}`)}</p>
          {facts.kept === 'refused' && (
            <p>
              <button type="button" className="control" onClick={() => void ask()}>
                {t('settings.keep')}
              </button>
            </p>
          )}
        </>
      )}
    </>
  );
}

function Room({ facts, language }: { facts: StorageFacts; language: Language }) {
  const { t } = useTranslation();
  const { usage, quota } = facts;
  if (usage === null || quota === null) return null;
  return (
    <p>
      {t('settings.room', { used: megabytes(usage, language), all: megabytes(quota, language) })}
    </p>
  );
}

const MEGABYTE = 1_000_000;

function megabytes(bytes: number, language: Language): string {
  const size = bytes / MEGABYTE;
  return formatNumber(size, language, { decimals: size < 10 ? 1 : 0 });
}
