import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { EmptyState } from '#src/components/empty-state.tsx';
import { groupTopics, subjectsAmong } from '#src/features/topics/group-topics.ts';
import { SubjectTabs } from '#src/features/topics/subject-tabs.tsx';
import { TopicList } from '#src/features/topics/topic-list.tsx';
import { TopicTable } from '#src/features/topics/topic-table.tsx';
import { loadFresh } from '#src/lib/query-client.ts';
import { myTopicsQuery } from '#src/queries/practice.ts';

export async function loader(): Promise<null> {
  await loadFresh(myTopicsQuery());
  return null;
}

/** The student's own topics, weakest first. */
export function Component() {
  const { on, items } = useSuspenseQuery(myTopicsQuery()).data;
  const [search] = useSearchParams();
  const subjects = subjectsAmong(items);
  const chosen = subjects.find(({ id }) => id === search.get('subject')) ?? null;
  const groups = groupTopics(chosen ? items.filter(({ subject }) => subject.id === chosen.id) : items);
  // The groups are drawn anew for another subject, so that a group opened there does not stay open here.
  const view = chosen?.id ?? 'all';
  return (
    <div className="page">
      <title>Topics – Plait</title>
      <div className="flex flex-wrap items-end justify-between gap-4 mb-5">
        <div>
          <h1>Topics</h1>
          <p className="text-ink-2 text-md mt-1.5 max-w-[37rem]">
            What you could expect to recall on the day of each paper if you did nothing more. An estimate, from the
            questions you have attempted.
          </p>
        </div>
        {items.length > 0 ? (
          <Link className="btn max-sm:w-full" to="/set/mixed">
            Practise in a mixed set
          </Link>
        ) : null}
      </div>
      {items.length === 0 ? (
        <EmptyState title="No topics yet">
          Your topics appear here once the school has put you in your classes and your teachers have listed the topics.
        </EmptyState>
      ) : (
        <>
          <SubjectTabs subjects={subjects} chosenId={chosen?.id ?? null} />
          <div className="hidden md:block mt-1" key={`table ${view}`}>
            <TopicTable groups={groups} today={on} />
          </div>
          <div className="md:hidden" key={`list ${view}`}>
            <TopicList groups={groups} today={on} />
          </div>
          <p className="hint mt-3">The dashed line is 80%, where a topic counts as secure.</p>
        </>
      )}
    </div>
  );
}
