import { Suspense, useEffect, useRef } from 'react';
import { Navigate, Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { useSession } from '../features/session/queries';
import { buildSignInPath } from '../paths';
import { Toasts } from '../ui/toasts';
import { DemoBanner } from './demo-banner';
import { TopBar } from './top-bar';
import { useIdleLock } from './use-idle-lock';
import { Waiting } from './waiting';

/** What stands around every page behind the sign-in. */
export function Frame() {
  const { user, hospital } = useSession();
  const content = useFocusOnNewPage();
  useIdleLock();
  const navigation = useNavigation();
  const { pathname, search } = useLocation();
  // The session may end while a page is open: the answer to the next request says so.
  if (!user) return <Navigate to={buildSignInPath(pathname + search)} replace />;
  return (
    <>
      <a
        href="#content"
        className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:bg-surface focus:px-4 focus:py-2 focus:font-semibold"
      >
        Skip to the content
      </a>
      {hospital?.isDemo && <DemoBanner hospitalName={hospital.name} />}
      <TopBar user={user} />
      {navigation.state === 'loading' && <Waiting />}
      <main id="content" ref={content} tabIndex={-1} className="outline-none">
        <Suspense fallback={<Waiting />}>
          <Outlet />
        </Suspense>
      </main>
      <Toasts />
      <ScrollRestoration />
    </>
  );
}

/** After a change of page the focus moves to its content, so that a screen reader starts there. */
function useFocusOnNewPage() {
  const { pathname } = useLocation();
  const content = useRef<HTMLElement>(null);
  const lastPathname = useRef(pathname);
  useEffect(() => {
    if (lastPathname.current !== pathname) content.current?.focus({ preventScroll: true });
    lastPathname.current = pathname;
  }, [pathname]);
  return content;
}
