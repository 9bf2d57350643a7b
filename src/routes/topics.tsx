import { useSuspenseQuery } from '@tanstack/react-query';
import type { FormEvent } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { ChoiceBar } from '#src/features/topics/choice-bar.tsx';
import { groupTopics, subjectsAmong } from '#src/features/topics/group-topics.ts';
import { PaperForecasts } from '#src/features/topics/paper-forecasts.tsx';
import { SubjectTabs } from '#src/features/topics/subject-tabs.tsx';
import { TopicList } from '#src/features/topics/topic-list.tsx';
import { TopicTable } from '#src/features/topics/topic-table.tsx';
import { chosenSetPath, weakStep } from '#src/features/topics/topic-words.ts';
import { useTopicChoice } from '#src/features/topics/use-topic-choice.ts';
import { loadFresh } from '#src/lib/query-client.ts';
import { myTopicsQuery } from '#src/queries/my-topics.ts';

export async function loader(): Promise<null> {
  await loadFresh(myTopicsQuery());
  return null;
}

/** The step the page leads to; it gives way once topics are ticked. */
function MainStep({ topics, isQuiet }: { topics: MyTopicDto[]; isQuiet: boolean }) {
  const weak = weakStep(topics);
  return (
    <Link
      className={`btn max-sm:w-full ${isQuiet ? 'quiet' : ''}`}
      to={weak ? chosenSetPath(weak.topicIds) : '/set/mixed'}
    >
      {weak?.words ?? 'Practise in a mixed set'}
    </Link>
  );
}

/** The student's own topics, weakest first, and what they would mean in the papers. */
export function Component() {
  const { on, items, papers, openSet, isTooHopeful } = useSuspenseQuery(myTopicsQuery()).data;
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const choice = useTopicChoice(items);
  const subjects = subjectsAmong(items);
  const subject = subjects.find(({ id }) => id === search.get('subject')) ?? null;
  const isShown = (row: { subject: { id: string } }) => subject === null || row.subject.id === subject.id;
  const topics = items.filter(isShown);
  const groups = groupTopics(topics);
  // What was opened under one subject does not stay open under another.
  const view = subject?.id ?? 'all';
  const practise = (event: FormEvent) => {
    event.preventDefault();
    if (choice.ids.size > 0) void navigate(chosenSetPath([...choice.ids]));
  };
  return (
    <div className="page">
      <title>Topics – Plait</title>
      <div className="flex flex-wrap items-end justify-between gap-4 mb-5">
        <div>
          <h1>Topics</h1>
          <p className="text-ink-2 text-md mt-1.5 max-w-[37rem]">
            What you could expect to recall on the day of each paper if you did nothing more. An estimate: the shaded
            part shows how unsure it is.
          </p>
        </div>
        {items.length > 0 ? <MainStep topics={topics} isQuiet={choice.ids.size > 0} /> : null}
      </div>
      {items.length === 0 ? (
        <EmptyState title="No topics yet">
          Your topics appear here once the school has put you in your classes and your teachers have listed the topics.
        </EmptyState>
      ) : (
        <>
          {isTooHopeful ? (
            <p className="note cau mb-5 max-w-[46rem]">
              Lately you have recalled less than these estimates said, so the ranges reach further down until the
              estimates have caught up. Questions still come when they help most.
            </p>
          ) : null}
          {openSet ? (
            <p className="note mb-5 max-w-[46rem]">
              Your set from chosen topics is open, {openSet.answered} of {openSet.questions} answered.{' '}
              <Link className="link" to={`/sets/${openSet.id}`}>
                Continue it
              </Link>
            </p>
          ) : null}
          <SubjectTabs subjects={subjects} chosenId={subject?.id ?? null} />
          {/* Enter on a tick box starts the set too. */}
          <form
            onSubmit={practise}
            aria-label="Topics to practise"
            className="[&_input]:scroll-mb-48 [&_button]:scroll-mb-48"
          >
            <p className="hint mt-3 mb-1">
              {topics.some(({ canPractise }) => canPractise) ? 'Tick topics to practise them now. ' : null}
              The dashed line is 80%, where a topic counts as secure.
            </p>
            <div className="hidden md:block" key={`table ${view}`}>
              <TopicTable groups={groups} today={on} isTooHopeful={isTooHopeful} choice={choice} />
            </div>
            <div className="md:hidden" key={`list ${view}`}>
              <TopicList groups={groups} today={on} isTooHopeful={isTooHopeful} choice={choice} />
            </div>
            <ChoiceBar choice={choice} />
          </form>
          <PaperForecasts key={`papers ${view}`} papers={papers.filter(isShown)} isTooHopeful={isTooHopeful} />
        </>
      )}
    </div>
  );
}
