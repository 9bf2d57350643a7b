import { Link, type To } from 'react-router-dom';

interface PageTarget {
  to: To;
  state?: unknown;
  /** True while it is not known yet where this leads: the link keeps its place and the focus, and does nothing. */
  isWaiting?: boolean;
}

interface PagerProps {
  /** "26 to 50 of 197". */
  words: string;
  /** Null on the first page. */
  previous: PageTarget | null;
  /** Null on the last page. */
  next: PageTarget | null;
}

const shape = 'btn quiet sm max-md:!min-h-11';

function PageLink({ label, target }: { label: string; target: PageTarget | null }) {
  if (!target) {
    return (
      <button type="button" className={shape} disabled>
        {label}
      </button>
    );
  }
  return (
    <Link
      className={shape}
      to={target.to}
      state={target.state}
      aria-disabled={target.isWaiting || undefined}
      onClick={(event) => {
        if (target.isWaiting) event.preventDefault();
      }}
    >
      {label}
    </Link>
  );
}

/** Previous and Next as links, so that Back and opening in a tab work. */
export function Pager({ words, previous, next }: PagerProps) {
  return (
    <nav aria-label="Pages" className="mt-3 flex flex-wrap items-center justify-between gap-3">
      <p className="num text-sm text-ink-2">{words}</p>
      {previous || next ? (
        <div className="flex gap-2">
          <PageLink label="Previous" target={previous} />
          <PageLink label="Next" target={next} />
        </div>
      ) : null}
    </nav>
  );
}
