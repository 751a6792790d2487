import { Suspense, useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { useTranslation } from 'react-i18next';
import { LeaveGuard } from '../form/leave-guard';
import { FirstLook } from './first-look';
import { SeeingBanner } from './seeing-banner';

/** What is around every page: what tells that one sees as somebody else, skip link, a sign that the next page is on its way, the leave guard. */
export function Root() {
  return (
    <Suspense fallback={<FirstLook />}>
      <SeeingBanner />
      <SkipLink />
      <OnItsWay />
      <Outlet />
      <LeaveGuard />
      <ScrollRestoration />
      <FocusOnNewPage />
    </Suspense>
  );
}

function SkipLink() {
  const { t } = useTranslation();
  return (
    <a href="#main" className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:rounded-control focus:bg-fjord focus:px-4 focus:py-3 focus:text-on">
      {t('skip')}
    </a>
  );
}

function OnItsWay() {
  const { t } = useTranslation();
  const busy = useNavigation().state !== 'idle';
  return (
    <div role="status" className="pointer-events-none fixed inset-x-0 top-0 z-40">
      {busy && (
        <>
          <span className="sr-only">{t('loading')}</span>
          <span className="block h-0.5 animate-pulse bg-fjord motion-reduce:animate-none" />
        </>
      )}
    </div>
  );
}

/** A new page begins at its top for the keyboard and the screen reader as well; a pane beside a list leaves focus in the list. */
function FocusOnNewPage() {
  const { pathname, state } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    if (!keepsFocus(state)) document.getElementById('main')?.focus({ preventScroll: true });
  }, [pathname, state]);
  return null;
}

const keepsFocus = (state: unknown): boolean => typeof state === 'object' && state !== null && 'keepFocus' in state;
