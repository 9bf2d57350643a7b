import { keyed } from '#src/lib/keyed.ts';
import { Markdown } from './markdown.tsx';
import { Caret, Tick } from './tick.tsx';

export interface SchemePoint {
  code: 'M' | 'A' | 'B' | null;
  text: string;
  marks: number;
  allow: string[];
  ignore: string[];
  reject: string[];
  /** Null until somebody has decided, or where nobody answers. */
  isEarned: boolean | null;
}

/** "M1" in mathematics; plain marks elsewhere. */
export const pointCode = (point: Pick<SchemePoint, 'code' | 'marks'>): string => `${point.code ?? ''}${point.marks}`;

/** What to allow, ignore and reject under a point. */
export function PointNotes({ point }: { point: Pick<SchemePoint, 'allow' | 'ignore' | 'reject'> }) {
  const notes = [
    { name: 'Allow', items: point.allow },
    { name: 'Ignore', items: point.ignore },
    { name: 'Reject', items: point.reject },
  ].filter(({ items }) => items.length > 0);
  if (notes.length === 0) return null;
  return (
    <span className="block text-sm text-ink-2 mt-0.5">
      {notes.map(({ name, items }) => (
        <span key={name} className="block">
          <b className="font-semibold">{name}</b>{' '}
          {items.map((item, index) => (
            <span key={item}>
              {index > 0 ? '; ' : null}
              <Markdown isInline source={item} />
            </span>
          ))}
        </span>
      ))}
    </span>
  );
}

function Sign({ isEarned, isDrawn }: { isEarned: boolean | null; isDrawn: boolean }) {
  if (isEarned === null) return null;
  return isEarned ? <Tick isDrawn={isDrawn} label="earned" /> : <Caret label="missed" />;
}

interface MarkSchemeProps {
  points: SchemePoint[];
  /** Ticks draw themselves: only straight after marking. */
  isDrawn?: boolean;
}

/** The points of one part, each with its tick or caret once decided. */
export function MarkScheme({ points, isDrawn = false }: MarkSchemeProps) {
  const isDecided = points.some((point) => point.isEarned !== null);
  return (
    <ul className="mt-1">
      {keyed(points, (point) => point.text).map(({ key, item: point }) => (
        <li
          key={key}
          className={`grid items-baseline py-2 border-b border-rule-soft ${isDecided ? 'grid-cols-[1.75rem_2.25rem_1fr]' : 'grid-cols-[2.25rem_1fr]'}`}
        >
          {isDecided ? (
            <span className="relative top-[.2rem]">
              <Sign isEarned={point.isEarned} isDrawn={isDrawn} />
            </span>
          ) : null}
          <span className={`mcode ${point.isEarned === false ? 'no' : ''}`}>
            {pointCode(point)}
            {point.code ? null : <span className="sr-only"> {point.marks === 1 ? 'mark' : 'marks'}</span>}
          </span>
          <span className="min-w-0">
            <Markdown isInline source={point.text} />
            <PointNotes point={point} />
          </span>
        </li>
      ))}
    </ul>
  );
}
