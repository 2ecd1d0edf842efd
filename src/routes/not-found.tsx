import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { usePageTitle } from '../components/page-title.ts';
import { PlainPage } from './plain-page.tsx';

export function NotFound() {
  const { t } = useTranslation();
  usePageTitle(t('notFound.title'));
  return (
    <PlainPage>
      <h1 className="mt-8 text-2xl">{t('notFound.title')}</h1>
      <p className="mt-2 max-w-prose text-mute">{t('notFound.body')}</p>
      <Link to="/" className="control-primary mt-6">
        {t('notFound.back')}
      </Link>
    </PlainPage>
  );
}
