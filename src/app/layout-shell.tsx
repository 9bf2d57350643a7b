import { lazy, Suspense, useEffect, useRef, useState } from 'react';
import { Link, Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { PageSkeleton } from '#src/components/skeleton.tsx';
import { countUnsent } from '#src/lib/unsent.ts';
import { useDisclosure } from '#src/lib/use-disclosure.ts';
import { useMe } from '#src/queries/me.ts';
import { Brand } from './brand.tsx';
import { NameMenu } from './name-menu.tsx';
import { isCurrent, type Place, placesOf } from './navigation.ts';

const UnsentAnswers = lazy(() =>
  import('#src/features/practice/unsent-answers.tsx').then((module) => ({ default: module.UnsentAnswers })),
);

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

/** Moves the focus to the new page, as a page load would. */
function useFocusOnArrival(pathname: string) {
  const main = useRef<HTMLElement>(null);
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}

function PlaceLinks({ places, pathname }: { places: Place[]; pathname: string }) {
  return places.map((place) => (
    <Link key={place.to} to={place.to} aria-current={isCurrent(place, pathname) ? 'page' : undefined}>
      {place.icon ? <place.icon aria-hidden="true" size={21} strokeWidth={1.75} className="md:hidden" /> : null}
      <span>{place.label}</span>
    </Link>
  ));
}

function PhoneMenu({ places, pathname }: { places: Place[]; pathname: string }) {
  const { isOpen, frame, button, toggle, close } = useDisclosure();
  return (
    <div ref={frame} className="relative md:hidden">
      <button
        ref={button}
        type="button"
        className="btn quiet"
        aria-expanded={isOpen}
        aria-controls="menu"
        onClick={toggle}
      >
        Menu
      </button>
      <ul
        id="menu"
        hidden={!isOpen}
        className="absolute left-0 top-full z-30 mt-2 w-56 rounded-lg border border-rule bg-raise p-2 shadow-lift"
      >
        {places.map((place) => (
          <li key={place.to}>
            <Link
              to={place.to}
              onClick={close}
              aria-current={isCurrent(place, pathname) ? 'page' : undefined}
              className="flex min-h-11 items-center border-l-[3px] border-transparent px-3 aria-[current]:border-accent aria-[current]:font-semibold"
            >
              {place.label}
            </Link>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** The frame of every page behind the sign-in but a running set. */
export function LayoutShell() {
  const me = useMe();
  const { pathname } = useLocation();
  const { state, location } = useNavigation();
  const isSlow = useIsSlow(state === 'loading' && location.pathname !== pathname);
  const main = useFocusOnArrival(pathname);
  const places = placesOf(me);
  // Asked once: answers are only left behind by leaving the runner, which brings this frame back.
  const [hasUnsent] = useState(() => countUnsent(me.id) > 0);
  const hasTabBar = me.can.practise;
  return (
    <div className="flex min-h-screen flex-col">
      <a className="btn skip" href="#main">
        Skip to the page
      </a>
      <header className="bar">
        <Brand />
        <nav aria-label="Main">
          <PlaceLinks places={places} pathname={pathname} />
        </nav>
        {hasTabBar ? null : <PhoneMenu places={places} pathname={pathname} />}
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
      <ScrollRestoration />
    </div>
  );
}
