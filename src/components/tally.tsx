import { type Standing, standingWords } from '#shared/schemas/practice.ts';

const STROKES: Record<Standing, number> = { secure: 3, developing: 2, weak: 1, notStarted: 0 };
const COLOURS: Record<Standing, string> = {
  secure: 'var(--accent)',
  developing: 'var(--caution)',
  weak: 'var(--gap)',
  notStarted: 'var(--edge)',
};

/** Three slanting strokes that mean standing and nothing else. */
export function Tally({ standing, hasWords = false }: { standing: Standing; hasWords?: boolean }) {
  return (
    <span className="inline-flex items-center gap-1.5 whitespace-nowrap align-middle">
      <svg width="27" height="17" viewBox="0 0 27 17" fill="none" strokeLinecap="round" aria-hidden="true">
        {[0, 1, 2].map((stroke) => {
          const isFull = stroke < STROKES[standing];
          return (
            <path
              key={stroke}
              d={`M${5 + 7 * stroke} 14 ${9 + 7 * stroke} 3`}
              strokeWidth={isFull ? 3.6 : 1.3}
              style={{ stroke: isFull ? COLOURS[standing] : 'var(--edge)' }}
            />
          );
        })}
      </svg>
      <span className={hasWords ? undefined : 'sr-only'}>{standingWords[standing]}</span>
    </span>
  );
}
