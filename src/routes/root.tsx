import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { Outlet, useLocation, useNavigation } from 'react-router-dom';
import { UpdateNotice } from '../pwa/update-notice.tsx';

/** What every page stands in: the skip link, news of a new version, focus on moving about. */
export function Root() {
  const { t } = useTranslation();
  const { state } = useNavigation();
  useFocusOnMove();
  return (
    <>
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-30 focus:rounded-md focus:bg-ink focus:px-4 focus:py-2 focus:text-paper"
      >
        {t('app.skip')}
      </a>
      <div aria-busy={state === 'loading'}>
        <Outlet />
      </div>
      <UpdateNotice />
    </>
  );
}

export function RootLoading() {
  const { t } = useTranslation();
  return (
    <main id="main" className="p-4">
      <p role="status">{t('app.loading')}</p>
    </main>
  );
}

/** A new page starts at its top, with the focus at its content, as a full load would. */
function useFocusOnMove(): void {
  const { pathname, state } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    // The same page under another name: whoever types in it is not disturbed.
    if (state?.keepFocus) return;
    window.scrollTo(0, 0);
    document.getElementById('main')?.focus({ preventScroll: true });
  }, [pathname, state]);
}
