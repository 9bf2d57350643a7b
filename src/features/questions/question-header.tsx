import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

interface QuestionHeaderProps {
  title: string;
  status: string;
  /** The state of saving, said when it changes. */
  saving?: string | null;
  /** The list this question was opened from. */
  back: { to: string; label: string };
  children: ReactNode;
}

/** Title, status line and the steps that can be taken. */
export function QuestionHeader({ title, status, saving, back, children }: QuestionHeaderProps) {
  return (
    <div className="mb-5 flex flex-wrap items-center justify-between gap-4">
      <div className="flex min-w-0 flex-wrap items-baseline gap-x-4 gap-y-1">
        <Link className="link text-sm" to={back.to}>
          {back.label}
        </Link>
        <h1 className="!text-[2rem]">{title}</h1>
        <p className="min-w-0 text-sm text-ink-2">
          {status}{' '}
          <span role="status" className="num font-semibold">
            {saving ? `${saving}.`.replace('….', '…') : ''}
          </span>
        </p>
      </div>
      {children}
    </div>
  );
}
