import type { ReactNode } from 'react';

interface ErrorStateProps {
  /** What failed. */
  title: string;
  /** What is safe, and what to do. */
  children: ReactNode;
  onRetry?: (() => void) | undefined;
  isRetrying?: boolean;
  action?: ReactNode;
  headingLevel?: 1 | 2 | 3;
}

/** What failed, what is safe, what to do. */
export function ErrorState(props: ErrorStateProps) {
  const { title, children, onRetry, isRetrying = false, action, headingLevel = 2 } = props;
  const Heading = `h${headingLevel}` as const;
  return (
    <div className="note gap max-w-[38rem]" role="alert">
      <Heading className="!text-[1.25rem] !leading-7">{title}</Heading>
      <div className="text-ink-2 mt-1">{children}</div>
      {onRetry || action ? (
        <div className="mt-4 flex flex-wrap gap-2">
          {onRetry ? (
            <button type="button" className="btn" disabled={isRetrying} onClick={onRetry}>
              {isRetrying ? 'Trying again' : 'Try again'}
            </button>
          ) : null}
          {action}
        </div>
      ) : null}
    </div>
  );
}
