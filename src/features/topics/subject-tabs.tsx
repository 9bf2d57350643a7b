import { Link } from 'react-router-dom';
import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import { StrandLabel } from '#src/components/strand-label.tsx';

interface SubjectTabsProps {
  subjects: MyTopicDto['subject'][];
  /** Null for all. */
  chosenId: string | null;
}

/** Chooses one subject or all; kept in the address. */
export function SubjectTabs({ subjects, chosenId }: SubjectTabsProps) {
  return (
    <nav className="tabs lg:!gap-x-3.5 lg:text-sm" aria-label="Subject">
      <Link
        to="/topics"
        replace
        preventScrollReset
        aria-current={chosenId === null ? 'page' : undefined}
        className="!flex items-center min-h-11"
      >
        All {subjects.length}
        <span className="max-lg:sr-only">&nbsp;subjects</span>
      </Link>
      {subjects.map((subject) => (
        <Link
          key={subject.id}
          to={`/topics?subject=${subject.id}`}
          replace
          preventScrollReset
          aria-current={chosenId === subject.id ? 'page' : undefined}
          className="!flex items-center gap-1.5 min-h-11"
        >
          <StrandLabel subject={subject} isPale={chosenId !== subject.id} />
          <span className="max-lg:sr-only">{subject.name}</span>
        </Link>
      ))}
    </nav>
  );
}
