import { type RefObject, useEffect, useRef } from 'react';

interface MathsOverlayProps {
  source: string;
  area: RefObject<HTMLTextAreaElement | null>;
}

const mathsPattern = /(\$\$[^$]*\$\$|\$[^$\n]*\$)/;

/** Colours the maths in a field of source. It lies over the field, letter on letter, and takes no part in anything. */
export function MathsOverlay({ source, area }: MathsOverlayProps) {
  const layer = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const element = area.current;
    if (!element) return;
    const follow = () => {
      if (layer.current) layer.current.scrollTop = element.scrollTop;
    };
    element.addEventListener('scroll', follow, { passive: true });
    return () => element.removeEventListener('scroll', follow);
  }, [area]);
  let at = 0;
  return (
    <div
      ref={layer}
      aria-hidden
      className="pointer-events-none absolute inset-0 overflow-hidden px-3 py-2.5 whitespace-pre-wrap text-transparent [overflow-wrap:anywhere] forced-colors:hidden"
    >
      {source.split(mathsPattern).map((piece, index) => {
        const key = at;
        at += piece.length + 1;
        return index % 2 === 1 ? (
          <span key={key} className="text-pen [-webkit-text-stroke:.4px_currentColor]">
            {piece}
          </span>
        ) : (
          piece
        );
      })}
    </div>
  );
}
