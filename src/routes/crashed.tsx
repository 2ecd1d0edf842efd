import { useTranslation } from 'react-i18next';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { usePageTitle } from '../components/page-title.ts';
import { NotFound } from './not-found.tsx';
import { PlainPage } from './plain-page.tsx';

/**
 * The last resort. Most often a part of an older version that is no longer to be had,
 * because another tab has put a new version in use: a reload mends that.
 */
export function Crashed() {
  const { t } = useTranslation();
  const problem = useRouteError();
  usePageTitle(t('crashed.title'));
  if (isRouteErrorResponse(problem) && problem.status === 404) return <NotFound />;
  const detail = problem instanceof Error ? problem.message : String(problem);
  return (
    <PlainPage>
      <h1 className="mt-8 text-2xl">{t('crashed.title')}</h1>
      <p className="mt-2 max-w-prose text-mute">{t('crashed.body')}</p>
      <p className="mt-2 max-w-prose text-sm text-mute">{detail}</p>
      <button type="button" className="control-primary mt-6" onClick={() => location.reload()}>
        {t('crashed.reload')}
      </button>
    </PlainPage>
  );
}
