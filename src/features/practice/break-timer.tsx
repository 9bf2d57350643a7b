import { useEffect, useState } from 'react';
import { Link } from 'react-router-dom';
import { type SetKind, setKindWords } from '#shared/schemas/set-kind.ts';

interface BreakTimerProps {
  kind: SetKind;
  minutes: number;
  /** Wall-clock milliseconds at which the break is over; null where the set was not finished just now. */
  endsAt: number | null;
}

function useSecondsTo(endsAt: number | null): number | null {
  const left = () => (endsAt === null ? null : Math.max(0, Math.ceil((endsAt - Date.now()) / 1000)));
  const [seconds, setSeconds] = useState(left);
  useEffect(() => {
    if (endsAt === null) return;
    const timer = setInterval(() => setSeconds(Math.max(0, Math.ceil((endsAt - Date.now()) / 1000))), 1000);
    return () => clearInterval(timer);
  }, [endsAt]);
  return seconds;
}

const figures = (seconds: number): string => `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`;

function leftWords(seconds: number): string {
  if (seconds === 0) return 'The break is over.';
  if (seconds <= 60) return 'One minute of the break left.';
  return seconds <= 300 ? 'Five minutes of the break left.' : '';
}

const WAVE = `M6 17${Array.from({ length: 12 }, (_, k) => `q12 ${k % 2 ? 22 : -22} 24 0`).join('')}`;

/** One waving strand that shortens in steps of a second. */
function WaveTimer({ share }: { share: number }) {
  return (
    <svg viewBox="0 0 300 34" className="w-full" fill="none" strokeLinecap="round" aria-hidden="true">
      <path d={WAVE} style={{ stroke: 'var(--rule)' }} strokeWidth="8" />
      {share > 0 ? (
        <path
          d={WAVE}
          pathLength={1}
          strokeDasharray={`${share} 2`}
          style={{ stroke: 'var(--accent)' }}
          strokeWidth="8"
        />
      ) : null}
    </svg>
  );
}

/** The break after a set. Stopping is as large as going on. */
export function BreakTimer({ kind, minutes, endsAt }: BreakTimerProps) {
  const seconds = useSecondsTo(endsAt);
  return (
    <aside className="lg:border-l lg:border-rule lg:pl-8" aria-labelledby="break">
      <h2 id="break" className="!text-[1.25rem]">
        Break
      </h2>
      {seconds === null ? (
        <p className="mt-2 text-md">Take {minutes} minutes away from the screen between sets.</p>
      ) : (
        <>
          <p className="disp num text-[4.5rem] leading-none mt-3 mb-2 -ml-0.5 timer" role="timer">
            {figures(seconds)}
          </p>
          <p role="status" className="sr-only">
            {leftWords(seconds)}
          </p>
          <div className="motion-reduce:hidden">
            <WaveTimer share={minutes > 0 ? Math.min(1, seconds / (minutes * 60)) : 0} />
          </div>
          <p className="mt-4 text-md">
            {seconds === 0 ? 'The break is over.' : 'Get some water. Leave the phone where it is.'}
          </p>
        </>
      )}
      <div className="grid gap-2.5 mt-5">
        <Link className="btn" to="/today">
          Stop here for today
        </Link>
        {kind === 'chosen' ? (
          <Link className="btn quiet" to="/topics">
            Choose topics for another set
          </Link>
        ) : (
          <Link className="btn quiet" to={`/set/${kind}?another=1`}>
            Start another {setKindWords[kind].toLowerCase()}
          </Link>
        )}
      </div>
    </aside>
  );
}
