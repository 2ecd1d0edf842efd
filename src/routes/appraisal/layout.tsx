import { useTranslation } from 'react-i18next';
import { Link, useParams } from 'react-router-dom';
import { usePageTitle } from '../../components/page-title.ts';
import { useAppraisal } from '../../store/appraisal.ts';
import { FILE_SLUG } from '../../store/opened-file.ts';
import { NotFound } from '../not-found.tsx';
import { PlainPage } from '../plain-page.tsx';
import { Workbench } from './workbench.tsx';

/** Opens the appraisal that the address names. */
export function Component() {
  const { t } = useTranslation();
  const { slug = '' } = useParams();
  const { data: opened, error } = useAppraisal(slug);
  if (error) throw error;
  if (!opened) {
    return (
      <PlainPage>
        <p role="status" className="mt-8 text-mute">
          {t('app.loading')}
        </p>
      </PlainPage>
    );
  }
  if (!opened.found) return slug === FILE_SLUG ? <FileGone /> : <NotFound />;
  return <Workbench key={slug} slug={slug} opened={opened} />;
}

/** A file is held until the page is closed: after a reload it has to be opened again. */
function FileGone() {
  const { t } = useTranslation();
  usePageTitle(t('fileGone.title'));
  return (
    <PlainPage>
      <h1 className="mt-8 text-2xl">{t('fileGone.title')}</h1>
      <p className="mt-2 max-w-prose text-mute">{t('fileGone.body')}</p>
      <Link to="/" className="control-primary mt-6">
        {t('fileGone.back')}
      </Link>
    </PlainPage>
  );
}
