import type { ReactNode } from 'react';
import { Logo } from '#src/components/logo.tsx';
import { Ribbon } from '#src/components/ribbon.tsx';
import { type RibbonItem, ribbonSizes } from '#src/components/ribbon-geometry.ts';

const ORDER = ['ma', 'el', 'ch', 'bi', 'ge', 'hi', 'fr', 'ph', 'en', 'ma', 'cs', 'rs', 'el', 'bi', 'ch'];

const plaitOf = (count: number): RibbonItem[] =>
  ORDER.slice(0, count).map((strand, index) => ({
    code: strand.toUpperCase(),
    name: strand,
    strand,
    state: index < 10 ? 'done' : 'next',
  }));

/** The one page where the plait is only a picture. */
export function SignInFrame({ children, foot }: { children: ReactNode; foot?: ReactNode }) {
  return (
    <main className="min-h-screen grid grid-cols-1 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.05fr)]">
      <div className="px-6 md:px-16 py-8 md:py-12 flex flex-col min-w-0">
        <div className="flex items-center gap-2.5">
          <Logo isLarge />
        </div>
        <div className="lg:hidden mt-6 -mx-6 md:-mx-16 overflow-hidden" aria-hidden="true">
          <div className="w-[calc(100%+40px)] -ml-5 flex justify-center">
            <Ribbon items={plaitOf(11)} size={ribbonSizes.signInPhone} hasLabels={false} />
          </div>
        </div>
        <div className="my-auto py-10 w-full max-w-[25rem]">{children}</div>
        {foot ? <div className="text-sm text-ink-2">{foot}</div> : null}
      </div>
      <div
        className="hidden lg:block sticky top-0 h-screen overflow-hidden border-l border-rule bg-sheet"
        aria-hidden="true"
      >
        <div className="absolute inset-0 grid grid-cols-[88px_1fr_96px]">
          <div className="border-r border-rule" />
          <div />
          <div className="border-l border-rule" />
        </div>
        <div className="absolute inset-0 flex items-center justify-center">
          <div className="-rotate-90 w-[1160px] flex-none">
            <Ribbon items={plaitOf(15)} size={ribbonSizes.signIn} surface="sheet" hasLabels={false} />
          </div>
        </div>
      </div>
    </main>
  );
}
