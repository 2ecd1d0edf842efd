import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import { usePageTitle } from '../../components/page-title.ts';
import { useOpenAppraisal } from '../../store/open-sessions.ts';
import type { Session } from '../../store/session.ts';
import type { StoreCode } from '../../store/store-error.ts';
import { NotFound } from '../not-found.tsx';
import { PlainPage } from '../plain-page.tsx';
import { OpenedAppraisal } from './opened-appraisal.tsx';

/** Opens the appraisal, or the worked example, that the address names. */
export function Component() {
  const { t } = useTranslation();
  const { slug = '' } = useParams();
  const opening = useOpenAppraisal(slug);
  switch (opening.status) {
    case 'opening':
      return (
        <PlainPage>
          <p role="status" className="mt-8 text-mute">
            {t('app.loading')}
          </p>
        </PlainPage>
      );
    case 'missing':
      return <NotFound />;
    case 'failed':
      return <CannotOpen code={opening.code} />;
    case 'open':
      // An example that becomes one's own changes its address and stays as it is on screen.
      return <OpenedAppraisal key={numberOf(opening.session)} {...opening} address={slug} />;
  }
}

function CannotOpen({ code }: { code: StoreCode }) {
  const { t } = useTranslation();
  usePageTitle(t('shell.cannotOpen'));
  return (
    <PlainPage>
      <h1 className="mt-8 text-2xl">{t('shell.cannotOpen')}</h1>
      <p className="mt-2 max-w-prose text-mute">{t(code)}</p>
      <button type="button" className="control-primary mt-6" onClick={() => location.reload()}>
        {t('shell.tryAgain')}
      </button>
    </PlainPage>
  );
}

const numbers = new WeakMap<Session, number>();
let count = 0;

function numberOf(session: Session): number {
  const number = numbers.get(session) ?? ++count;
  numbers.set(session, number);
  return number;
}
