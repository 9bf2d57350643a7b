import { Link, type To } from 'react-router-dom';

interface PagerProps {
  /** "26 to 50 of 197". */
  words: string;
  /** Null on the first page. */
  previous: { to: To; state?: unknown } | null;
  /** Null on the last page. */
  next: { to: To; state?: unknown } | null;
}

const shape = 'btn quiet sm max-md:!min-h-11';

/** Previous and Next as links, so that Back and opening in a tab work. */
export function Pager({ words, previous, next }: PagerProps) {
  return (
    <nav aria-label="Pages" className="mt-3 flex flex-wrap items-center justify-between gap-3">
      <p className="num text-sm text-ink-2">{words}</p>
      {previous || next ? (
        <div className="flex gap-2">
          {previous ? (
            <Link className={shape} to={previous.to} state={previous.state}>
              Previous
            </Link>
          ) : (
            <button type="button" className={shape} disabled>
              Previous
            </button>
          )}
          {next ? (
            <Link className={shape} to={next.to} state={next.state}>
              Next
            </Link>
          ) : (
            <button type="button" className={shape} disabled>
              Next
            </button>
          )}
        </div>
      ) : null}
    </nav>
  );
}
