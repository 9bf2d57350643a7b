import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: string;
  /** What will appear here, and when. */
  children: ReactNode;
  /** The step that fills it. */
  action?: ReactNode;
  headingLevel?: 1 | 2 | 3;
}

/** Says what will appear and gives the step that fills it. */
export function EmptyState({ title, children, action, headingLevel = 2 }: EmptyStateProps) {
  const Heading = `h${headingLevel}` as const;
  return (
    <div className="sheet p-6 md:p-7 flex flex-col items-start">
      <Heading className={headingLevel === 1 ? '!text-[1.75rem]' : '!text-[1.25rem]'}>{title}</Heading>
      <div className="text-ink-2 mt-1 max-w-[34rem]">{children}</div>
      {action ? <div className="mt-5 flex flex-wrap gap-2 max-sm:w-full">{action}</div> : null}
    </div>
  );
}
