import { Suspense, useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { PageSkeleton } from '../components/PageSkeleton';
import { PlanNotice } from './PlanNotice';
import { Rail } from './Rail';
import styles from './Shell.module.css';
import { UnreachableNotice } from './UnreachableNotice';

/** The rail, the page beside it, and what goes for every page: skip link, focus, connection notice. */
export function AppShell() {
  const main = useFocusOnNewPage();
  return (
    <div className={styles.shell}>
      <a href="#main" className={styles.skip}>
        Skip to the page
      </a>
      <Rail />
      <main id="main" ref={main} tabIndex={-1} className={styles.main}>
        <UnreachableNotice />
        <PlanNotice />
        <Suspense fallback={<PageSkeleton />}>
          <Outlet />
        </Suspense>
      </main>
      <ScrollRestoration />
    </div>
  );
}

function useFocusOnNewPage() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    shown.current = pathname;
    if (!main.current?.contains(document.activeElement)) main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}
