import { lazy, Suspense, useEffect, useState } from 'react';
import type { MeDto } from '#shared/schemas/auth.ts';
import { roleWords } from '#shared/schemas/role.ts';
import { useDisclosure } from '#src/lib/use-disclosure.ts';
import { useMe } from '#src/queries/me.ts';

const loadPanel = () => import('./name-panel.tsx');
const NamePanel = lazy(() => loadPanel().then((module) => ({ default: module.NamePanel })));

/** Once the page has settled, what the menu needs is fetched, so that it also opens offline. */
const PRELOAD_AFTER_MS = 3000;

/** "11S", "Mathematics", "Carer of Safa Hussain". */
function scopeWords(membership: MeDto['memberships'][number] | undefined): string | null {
  if (!membership?.scope) return null;
  return membership.role === 'carer' ? `${roleWords.carer} of ${membership.scope}` : membership.scope;
}

/** The name at the top right, with the person's own settings under it. */
export function NameMenu() {
  const me = useMe();
  const { isOpen, frame, button, toggle, close } = useDisclosure();
  const [wasOpened, setWasOpened] = useState(false);
  const scope = scopeWords(me.memberships.find((membership) => membership.scope));
  useEffect(() => {
    const timer = setTimeout(() => void loadPanel().catch(() => undefined), PRELOAD_AFTER_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <div ref={frame} className="relative ml-auto -mr-2 min-w-0">
      <button
        ref={button}
        type="button"
        aria-expanded={isOpen}
        aria-controls="name-menu"
        onClick={() => {
          setWasOpened(true);
          toggle();
        }}
        className="block min-h-11 w-full rounded px-2 text-right text-sm leading-tight hover:bg-sunk"
      >
        <span className={scope ? 'block truncate font-semibold max-sm:sr-only' : 'block truncate font-semibold'}>
          {me.name}
        </span>
        {scope ? <span className="block truncate text-ink-2">{scope}</span> : null}
        <span className="sr-only">, your settings</span>
      </button>
      <div
        id="name-menu"
        hidden={!isOpen}
        className="absolute right-0 top-full z-30 mt-2 w-[18.5rem] max-w-[calc(100vw-2.5rem)] rounded-lg border border-rule bg-raise p-5 shadow-lift"
      >
        {wasOpened ? (
          <Suspense fallback={null}>
            <NamePanel onClose={close} />
          </Suspense>
        ) : null}
      </div>
    </div>
  );
}
