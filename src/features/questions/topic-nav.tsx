import { Link } from 'react-router-dom';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { withSearch } from './list-search.ts';

interface TopicNavProps {
  subject: SubjectDto;
  topics: TopicDto[];
  chosen: string | undefined;
  search: URLSearchParams;
  /** Questions of the subject, whatever their topic. */
  total: number | undefined;
}

/** The topics at the left of the list, with how many questions each has. */
export function TopicNav({ subject, topics, chosen, search, total }: TopicNavProps) {
  const hasSeveral = subject.specifications.length > 1;
  const line = (key: string, title: string, count: number | undefined, topic: string | undefined) => (
    <li key={key}>
      <Link
        to={{ search: `?${withSearch(search, { topic })}` }}
        aria-current={chosen === topic ? 'true' : undefined}
        className="flex min-h-8 items-start justify-between gap-2 border-b border-rule-soft py-[.4rem] hover:underline aria-[current]:font-bold"
      >
        <span className="min-w-0 [overflow-wrap:anywhere]">{title}</span>
        <span className="num font-normal text-ink-2">{count ?? ''}</span>
      </Link>
    </li>
  );
  return (
    <nav aria-label="Topics" className="border-t-[1.5px] border-ink pt-2 max-lg:hidden">
      <h2 className="pb-1 !text-[1.125rem]">Topics</h2>
      <ul className="text-sm">{line('all', 'All topics', total, undefined)}</ul>
      {subject.specifications.map((specification) => {
        const own = topics.filter((topic) => topic.specificationId === specification.id);
        if (own.length === 0) return null;
        return (
          <div key={specification.id}>
            {hasSeveral ? <h3 className="hint mt-4 !font-semibold !tracking-normal">{specification.name}</h3> : null}
            <ul className="text-sm">{own.map((topic) => line(topic.id, topic.title, topic.allQuestions, topic.id))}</ul>
          </div>
        );
      })}
      <Link className="link mt-3 inline-block text-sm" to={`/subjects/${subject.id}/topics`}>
        Topics and dates taught
      </Link>
    </nav>
  );
}
