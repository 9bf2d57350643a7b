import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { Link, type LoaderFunctionArgs, useSearchParams } from 'react-router-dom';
import type { SubjectDto } from '#shared/schemas/curriculum.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { SubjectChoice } from '#src/components/subject-choice.tsx';
import { toFilter } from '#src/features/questions/list-search.ts';
import { QuestionList } from '#src/features/questions/question-list.tsx';
import { chooseSubject } from '#src/lib/choose-subject.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { subjectsQuery, topicsQuery } from '#src/queries/curriculum.ts';
import { questionListQuery } from '#src/queries/questions.ts';

export async function loader({ request }: LoaderFunctionArgs) {
  const search = new URL(request.url).searchParams;
  const { items } = await queryClient.ensureQueryData(subjectsQuery());
  const subject = chooseSubject(items, search);
  if (!subject) return null;
  void queryClient.prefetchQuery(questionListQuery(toFilter(subject.id, search)));
  await queryClient.ensureQueryData(topicsQuery(subject.id));
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const { data: subjects } = useSuspenseQuery(subjectsQuery());
  const subject = chooseSubject(subjects, search);
  return (
    <div className="page !max-w-[84rem]">
      <title>Questions – Plait</title>
      {subject ? (
        <SubjectQuestions key={subject.id} subject={subject} subjects={subjects} />
      ) : (
        <EmptyState headingLevel={1} title="No subject yet">
          Your school has not put you down as a teacher of a subject. The school admin does that.
        </EmptyState>
      )}
    </div>
  );
}

function SubjectQuestions({ subject, subjects }: { subject: SubjectDto; subjects: SubjectDto[] }) {
  const [search, setSearch] = useSearchParams();
  const { data: topics } = useSuspenseQuery(topicsQuery(subject.id));
  const { data: page } = useQuery(questionListQuery(toFilter(subject.id, search)));
  const counts = page?.counts;
  const topic = search.get('topic');
  return (
    <>
      <div className="mb-6 flex flex-wrap items-end justify-between gap-4">
        <div className="min-w-0">
          <h1>Questions</h1>
          <p className="num mt-1.5 min-h-6 text-md text-ink-2">
            {subject.name}.{' '}
            {counts ? (
              <>
                {counts.live} live, {counts.draft} {counts.draft === 1 ? 'draft' : 'drafts'},{' '}
                <Link className="link" to="/review">
                  {counts.inReview} in review
                </Link>
                .
              </>
            ) : null}
          </p>
        </div>
        <div className="flex flex-wrap items-center gap-3 max-sm:w-full">
          <SubjectChoice subjects={subjects} value={subject.id} onChange={(id) => setSearch({ subject: id })} />
          {subject.can.writeQuestions ? (
            <Link
              className="btn max-sm:flex-1"
              to={`/questions/new?subject=${subject.id}${topic ? `&topic=${topic}` : ''}`}
            >
              <Plus size={16} strokeWidth={1.75} aria-hidden /> New question
            </Link>
          ) : null}
        </div>
      </div>
      <QuestionList
        subject={subject}
        topics={topics}
        search={search}
        onSearch={(next, isTyping) => setSearch(next, { replace: isTyping, preventScrollReset: true })}
      />
    </>
  );
}
