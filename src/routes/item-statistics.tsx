import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { type LoaderFunctionArgs, useSearchParams } from 'react-router-dom';
import type { SubjectDto } from '#shared/schemas/curriculum.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { ErrorState } from '#src/components/error-state.tsx';
import { Select } from '#src/components/field.tsx';
import { Pager } from '#src/components/pager.tsx';
import { Skeleton } from '#src/components/skeleton.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { SubjectChoice } from '#src/components/subject-choice.tsx';
import { ItemTable } from '#src/features/statistics/item-table.tsx';
import { readStatisticsSearch, toStatisticsFilter } from '#src/features/statistics/statistics-search.ts';
import { chooseSubject } from '#src/lib/choose-subject.ts';
import { usePages } from '#src/lib/cursor-pages.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { subjectLang } from '#src/lib/subject-words.ts';
import { subjectsQuery, topicsQuery } from '#src/queries/curriculum.ts';
import { itemStatisticsQuery } from '#src/queries/statistics.ts';

const mayRead = (subject: SubjectDto) => subject.can.readItemStatistics;

export async function loader({ request }: LoaderFunctionArgs) {
  const search = new URL(request.url).searchParams;
  const { items } = await queryClient.ensureQueryData(subjectsQuery());
  const subject = chooseSubject(items.filter(mayRead), search);
  if (!subject) return null;
  void queryClient.prefetchQuery(itemStatisticsQuery(toStatisticsFilter(subject.id, search)));
  await queryClient.ensureQueryData(topicsQuery(subject.id));
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const { data: all } = useSuspenseQuery(subjectsQuery());
  const subjects = all.filter(mayRead);
  const subject = chooseSubject(subjects, search);
  return (
    <div className="page !max-w-[84rem] !pt-7">
      <title>Item statistics – Plait</title>
      {subject ? (
        <SubjectStatistics key={subject.id} subject={subject} subjects={subjects} />
      ) : (
        <EmptyState headingLevel={1} title="No subject yet">
          Item statistics are for the teachers and the head of department of a subject.
        </EmptyState>
      )}
    </div>
  );
}

function SubjectStatistics({ subject, subjects }: { subject: SubjectDto; subjects: SubjectDto[] }) {
  const [search, setSearch] = useSearchParams();
  const { data: topics } = useSuspenseQuery(topicsQuery(subject.id));
  const list = useQuery(itemStatisticsQuery(toStatisticsFilter(subject.id, search)));
  const page = list.data;
  const pages = usePages(search, page, list.isPlaceholderData);
  const { topic, sort } = readStatisticsSearch(search);
  const change = (name: 'topic' | 'sort', value: string) => {
    const next = new URLSearchParams(search);
    for (const old of ['cursor', 'from', name]) next.delete(old);
    if (value) next.set(name, value);
    setSearch(next, { preventScrollReset: true });
  };
  return (
    <>
      <div className="mb-6 flex flex-wrap items-end justify-between gap-4">
        <div className="min-w-0">
          <p className="mb-1.5 flex items-center gap-2 text-ink-2">
            <StrandLabel subject={subject} /> <span className="min-w-0">{subject.name}</span>
          </p>
          <h1>Item statistics</h1>
          <p className="mt-1.5 max-w-[44rem] text-md text-ink-2">
            Facility is the mean mark divided by the marks available: 0.90 is easy, 0.30 is hard. It is shown from ten
            students on. Questions that nobody has answered yet are not listed.
          </p>
        </div>
        <SubjectChoice subjects={subjects} value={subject.id} onChange={(id) => setSearch({ subject: id })} />
      </div>
      <div className="mb-3 flex flex-wrap items-end gap-2">
        <Select
          isSmall
          label="Topic"
          frameClass="max-sm:basis-full"
          className="max-w-full sm:!w-72"
          value={topic ?? ''}
          onChange={(event) => change('topic', event.target.value)}
        >
          <option value="">All topics</option>
          {topics.map(({ id, number, title }) => (
            <option key={id} value={id}>
              {number} {title}
            </option>
          ))}
        </Select>
        <Select isSmall label="Order" value={sort} onChange={(event) => change('sort', event.target.value)}>
          <option value="answers">Most answers first</option>
          <option value="facility">Hardest first</option>
          <option value="seconds">Slowest first</option>
          <option value="number">By number</option>
        </Select>
        <p role="status" className="num ml-auto pb-2 text-sm text-ink-2">
          {pages.words}
        </p>
      </div>
      {list.isPending ? <Skeleton label="item statistics" rows={10} /> : null}
      {list.isError && !page ? (
        <ErrorState
          title="The statistics could not be read"
          onRetry={() => void list.refetch()}
          isRetrying={list.isFetching}
        >
          {problemWords(list.error)}
        </ErrorState>
      ) : null}
      {page && page.items.length > 0 ? (
        <>
          <ItemTable rows={page.items} lang={subjectLang(subject)} isBusy={list.isPlaceholderData} />
          <Pager {...pages} />
        </>
      ) : null}
      {page && page.items.length === 0 ? (
        <EmptyState
          title={topic ? 'No figures for this topic yet' : 'No statistics yet'}
          action={
            topic ? (
              <button type="button" className="btn quiet" onClick={() => change('topic', '')}>
                Show all topics
              </button>
            ) : null
          }
        >
          A question appears here once students have answered it. Facility needs ten students; smaller groups stay
          hidden.
        </EmptyState>
      ) : null}
    </>
  );
}
