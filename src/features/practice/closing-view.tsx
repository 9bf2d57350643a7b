import { type ReactNode, useEffect, useRef } from 'react';
import { durationWords } from '#shared/domain/time/words.ts';
import { RunnerFrame, type RunnerState } from './runner-frame.tsx';

interface ClosingViewProps {
  state: RunnerState;
  seconds: number;
  /** Questions not asked. */
  left: number;
  notes: ReactNode;
  steps: ReactNode;
}

/** Nothing more is asked: the time is up, or every question is answered. */
export function ClosingView({ state, seconds, left, notes, steps }: ClosingViewProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  const minutes = durationWords(state.set.budgetSeconds / 60);
  return (
    <RunnerFrame state={state} seconds={seconds} notes={notes}>
      <div className="sheet p-6 md:p-8">
        <h2 ref={heading} tabIndex={-1}>
          {left > 0 ? `Your ${minutes} are up` : 'Every question is answered'}
        </h2>
        <p className="text-ink-2 text-md mt-1">
          {left > 0
            ? `Your answers are saved. The other ${left === 1 ? 'question goes' : `${left} questions go`} back to the pool.`
            : 'Your answers are saved. See the marks by topic and what comes back when.'}
        </p>
        <div className="flex flex-wrap gap-3 mt-5">{steps}</div>
      </div>
    </RunnerFrame>
  );
}
