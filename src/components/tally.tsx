import { type Standing, standingWords } from '#shared/schemas/standing.ts';

const STROKES: Record<Standing, number> = { secure: 3, developing: 2, weak: 1, notEnough: 0, notStarted: 0 };
const COLOURS = ['', 'var(--gap)', 'var(--caution)', 'var(--accent)'];

/** Three slanting strokes that mean standing and nothing else; dotted where there is not enough yet. */
export function Tally({ standing, hasWords = false }: { standing: Standing; hasWords?: boolean }) {
  const strokes = STROKES[standing];
  return (
    <span className="inline-flex items-center gap-1.5 whitespace-nowrap align-middle">
      <svg width="27" height="17" viewBox="0 0 27 17" fill="none" strokeLinecap="round" aria-hidden="true">
        {[0, 1, 2].map((stroke) => {
          const isFull = stroke < strokes;
          return (
            <path
              key={stroke}
              d={`M${5 + 7 * stroke} 14 ${9 + 7 * stroke} 3`}
              strokeWidth={isFull ? 3.6 : 1.3}
              strokeDasharray={standing === 'notEnough' ? '1.5 3' : undefined}
              style={{ stroke: isFull ? COLOURS[strokes] : 'var(--edge)' }}
            />
          );
        })}
      </svg>
      <span className={hasWords ? undefined : 'sr-only'}>{standingWords[standing]}</span>
    </span>
  );
}
