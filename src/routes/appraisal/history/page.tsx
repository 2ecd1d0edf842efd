import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { usePageTitle } from '../../../components/page-title.ts';
import { useVersions } from '../../../store/versions.ts';
import { useSession } from '../session-context.ts';
import { Comparison } from './comparison.tsx';
import { DRAFT, type Pair } from './pair.ts';
import { SaveVersion } from './save-version.tsx';
import { VersionList } from './version-list.tsx';

/** Every version that was kept: who, when, why, and what it did to the answer. */
export function Component() {
  const { t } = useTranslation();
  const { state, document } = useSession();
  const versions = useVersions(state.appraisal?.id ?? null);
  const [chosen, setChosen] = useState<Pair | null>(null);
  usePageTitle(t('steps.history'), document.question.title);
  if (!versions) return <p className="mt-7 text-mute">{t('app.loading')}</p>;
  // The last step that was kept, against the work as it stands.
  const pair = chosen ?? { before: versions[0]?.digest ?? DRAFT, after: DRAFT };
  const title = state.appraisal
    ? t('history.title', { count: versions.length })
    : t('history.noneYet');
  return (
    <>
      <h1 className="mt-7 mb-4 max-w-[36em] text-2xl leading-tight">{title}</h1>
      <SaveVersion />
      {versions.length > 0 && (
        <>
          <VersionList
            versions={versions}
            compare={(before) => setChosen({ before, after: DRAFT })}
          />
          <Comparison versions={versions} pair={pair} choose={setChosen} />
        </>
      )}
    </>
  );
}
