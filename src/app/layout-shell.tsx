import { lazy, Suspense, useEffect, useRef, useState } from 'react';
import { Link, Outlet, useLocation, useNavigation, useNavigationType } from 'react-router-dom';
import { PageSkeleton } from '#src/components/skeleton.tsx';
import { hasKept } from '#src/lib/unsent.ts';
import { useMe } from '#src/queries/me.ts';
import { Brand } from './brand.tsx';
import { NameMenu } from './name-menu.tsx';
import { isCurrent, type Place, placesOf } from './navigation.ts';

const UnsentAnswers = lazy(() =>
  import('#src/features/practice/unsent-answers.tsx').then((module) => ({ default: module.UnsentAnswers })),
);

/** Staff only: students have the tab bar. */
const PhoneMenu = lazy(() => import('./phone-menu.tsx').then((module) => ({ default: module.PhoneMenu })));

function useIsSlow(isWaiting: boolean): boolean {
  const [isLate, setIsLate] = useState(false);
  useEffect(() => {
    if (!isWaiting) return;
    const timer = setTimeout(() => setIsLate(true), 300);
    return () => {
      clearTimeout(timer);
      setIsLate(false);
    };
  }, [isWaiting]);
  return isWaiting && isLate;
}

/** Moves to the top of a new page and gives it the focus, as a page load would. Going back keeps the place. */
function useArrival(pathname: string) {
  const main = useRef<HTMLElement>(null);
  const last = useRef(pathname);
  const isBack = useNavigationType() === 'POP';
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    main.current?.focus({ preventScroll: true });
    if (!isBack) window.scrollTo(0, 0);
  }, [pathname, isBack]);
  return main;
}

function PlaceLinks({ places, pathname }: { places: Place[]; pathname: string }) {
  return places.map((place) => (
    <Link key={place.to} to={place.to} aria-current={isCurrent(place, pathname) ? 'page' : undefined}>
      {place.icon ? <place.icon /> : null}
      <span>{place.label}</span>
    </Link>
  ));
}

/** The frame of every page behind the sign-in but a running set. */
export function LayoutShell() {
  const me = useMe();
  const { pathname } = useLocation();
  const { state, location } = useNavigation();
  const isSlow = useIsSlow(state === 'loading' && location.pathname !== pathname);
  const main = useArrival(pathname);
  const places = placesOf(me);
  // Asked once: answers are only left behind by leaving the runner, which brings this frame back.
  const [hasUnsent] = useState(() => hasKept(me.id));
  const hasTabBar = me.can.practise;
  return (
    <div className="flex min-h-screen flex-col">
      <a className="btn skip" href="#main">
        Skip to the page
      </a>
      <header className="bar max-md:!gap-3">
        <Brand />
        <nav aria-label="Main">
          <PlaceLinks places={places} pathname={pathname} />
        </nav>
        {hasTabBar ? null : (
          <Suspense fallback={null}>
            <PhoneMenu places={places} pathname={pathname} />
          </Suspense>
        )}
        <NameMenu />
      </header>
      {hasUnsent ? (
        <Suspense fallback={null}>
          <UnsentAnswers userId={me.id} />
        </Suspense>
      ) : null}
      <main id="main" ref={main} tabIndex={-1} className="flex-1 min-w-0" aria-busy={isSlow}>
        {isSlow ? <PageSkeleton /> : <Outlet />}
      </main>
      {hasTabBar ? (
        <nav className="tabbar" aria-label="Main, at the bottom">
          <PlaceLinks places={places.filter((place) => place.icon)} pathname={pathname} />
        </nav>
      ) : null}
    </div>
  );
}
