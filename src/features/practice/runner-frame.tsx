import { X } from 'lucide-react';
import { type ReactNode, type Ref, useMemo } from 'react';
import { Link } from 'react-router-dom';
import type { SetDto } from '#shared/schemas/practice.ts';
import { setKindWords } from '#shared/schemas/set-kind.ts';
import { type RibbonItem, ribbonSizes } from '#src/components/ribbon-geometry.ts';
import { RibbonRows } from '#src/components/ribbon-rows.tsx';
import { timerWords } from '#src/lib/dates.ts';
import { useHiddenTime } from './use-hidden-time.ts';

export interface RunnerState {
  set: SetDto;
  /** Place of the question shown, from 0. */
  place: number;
  /** Items answered, those still waiting on this device included. */
  answeredIds: ReadonlySet<string>;
  /** The question shown was answered just now. */
  isFresh?: boolean;
}

interface RunnerFrameProps {
  state: RunnerState;
  /** Work so far, in seconds. */
  seconds: number;
  /** The heading takes the focus when a question appears. */
  headingRef?: Ref<HTMLHeadingElement>;
  /** What stands above the sheet: offline, a race with another tab. */
  notes?: ReactNode;
  children: ReactNode;
}

function useRibbonItems({ set, place, answeredIds, isFresh = false }: RunnerState): RibbonItem[] {
  return useMemo(
    () =>
      set.items.map(({ id, subject }, index) => ({
        code: subject.code,
        name: subject.name,
        strand: subject.strand,
        state: index === place ? 'now' : answeredIds.has(id) ? 'done' : 'next',
        ...(index === place ? { isAnswered: answeredIds.has(id), isFresh } : {}),
      })),
    [set.items, place, answeredIds, isFresh],
  );
}

/** Said at five minutes, at one and at none; silent between. */
function timeLeftWords(left: number): string {
  if (left <= 0) return 'Time is up. The set closes after this question.';
  if (left <= 60) return 'One minute left.';
  return left <= 300 ? 'Five minutes left.' : '';
}

/** The time of a set, and the way to hide it, which is kept on the device. */
function SetTime({ seconds, isHidden, toggle }: { seconds: number; isHidden: boolean; toggle: () => void }) {
  return (
    <span className="text-sm text-ink-2 flex items-center justify-end gap-x-2.5">
      {isHidden ? null : <span role="timer">{timerWords(seconds)} so far</span>}
      <HideTime isHidden={isHidden} toggle={toggle} className="max-md:hidden -my-3" />
    </span>
  );
}

function HideTime({ isHidden, toggle, className }: { isHidden: boolean; toggle: () => void; className: string }) {
  return (
    <button type="button" className={`link text-sm min-h-11 ${className}`} onClick={toggle}>
      {isHidden ? 'Show time' : 'Hide time'}
    </button>
  );
}

/** The frame of a running set: one way out, the ribbon, where we are and how long it took. */
export function RunnerFrame({ state, seconds, headingRef, notes, children }: RunnerFrameProps) {
  const { set, place } = state;
  const items = useRibbonItems(state);
  const name = setKindWords[set.kind];
  const time = useHiddenTime();
  const left = set.budgetSeconds - seconds;
  return (
    <div className="flex min-h-screen flex-col">
      <title>{`Question ${place + 1}, ${name.toLowerCase()} – Plait`}</title>
      <header className="px-5 md:px-10 pt-4 md:pt-5 pb-3">
        <div className="max-w-[62rem] mx-auto grid grid-cols-[auto_1fr_auto] md:grid-cols-[1fr_minmax(0,34rem)_1fr] items-center gap-4 md:gap-6">
          <Link
            to={set.kind === 'chosen' ? '/topics' : '/today'}
            className="btn bare !px-0 !min-h-11 min-w-11 !justify-start"
          >
            <X aria-hidden="true" size={20} strokeWidth={1.75} />
            <span className="max-md:sr-only">
              Leave<span className="sr-only"> the set</span>
            </span>
          </Link>
          <div className="flex justify-center min-w-0">
            <span className="hidden md:flex justify-center w-full max-w-[34rem]">
              <RibbonRows items={items} size={ribbonSizes.runner} name={name} room={544} />
            </span>
            <span className="md:hidden flex justify-center w-full">
              <RibbonRows items={items} size={ribbonSizes.runnerPhone} name={name} room={200} />
            </span>
          </div>
          <div className="num text-right leading-tight">
            <h1
              ref={headingRef}
              tabIndex={-1}
              className="!text-[.9375rem] !leading-5 !font-text !tracking-normal [font-stretch:100%]"
            >
              <span className="sr-only">Question </span>
              {place + 1} of {set.items.length}
            </h1>
            <SetTime seconds={seconds} {...time} />
          </div>
        </div>
      </header>
      <main className="md:px-10 pb-8 flex-1">
        <div className="max-w-[62rem] mx-auto">
          <p role="status" className="sr-only">
            {time.isHidden && left > 0 ? '' : timeLeftWords(left)}
          </p>
          {notes}
          {children}
          <HideTime {...time} className="md:hidden mx-5 mt-2" />
        </div>
      </main>
    </div>
  );
}
