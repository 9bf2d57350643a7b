import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { ErrorState } from '#src/components/error-state.tsx';
import { Pager } from '#src/components/pager.tsx';
import { Skeleton } from '#src/components/skeleton.tsx';
import { usePages } from '#src/lib/cursor-pages.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { subjectLang, subjectWords } from '#src/lib/subject-words.ts';
import { questionListQuery } from '#src/queries/questions.ts';
import { isNarrowed, readListSearch, toFilter, withSearch } from './list-search.ts';
import { QuestionFilters } from './question-filters.tsx';
import { QuestionTable } from './question-table.tsx';
import { TopicNav } from './topic-nav.tsx';

interface QuestionListProps {
  subject: SubjectDto;
  topics: TopicDto[];
  search: URLSearchParams;
  onSearch: (next: URLSearchParams, isTyping: boolean) => void;
}

/** One subject's questions: topics, filters, the table, paging. All of its state is the address. */
export function QuestionList({ subject, topics, search, onSearch }: QuestionListProps) {
  const list = useQuery(questionListQuery(toFilter(subject.id, search)));
  const asked = readListSearch(search);
  const page = list.data;
  const pages = usePages(search, page, list.isPlaceholderData);
  const counts = page?.counts;
  const all = counts && counts.draft + counts.inReview + counts.live + counts.retired;
  const lang = subjectLang(subject);
  return (
    <div className="grid grid-cols-1 gap-x-9 lg:grid-cols-[13.5rem_minmax(0,1fr)]">
      <TopicNav {...{ subject, topics, search }} chosen={asked.topic} total={all} />
      <div className="min-w-0">
        <div className="mb-3 flex flex-wrap items-end gap-2">
          <QuestionFilters
            search={asked}
            topics={topics}
            authors={page?.authors ?? []}
            onChange={(change, isTyping = false) => onSearch(withSearch(search, change), isTyping)}
          />
          <p role="status" className="num ml-auto pb-2 text-sm text-ink-2">
            {page && page.items.length === 0 ? 'None' : pages.words}
          </p>
        </div>
        {list.isError && !page ? (
          <ErrorState
            title="The questions could not be read"
            onRetry={() => void list.refetch()}
            isRetrying={list.isFetching}
          >
            {problemWords(list.error)}
          </ErrorState>
        ) : null}
        {list.isPending ? <Skeleton label="questions" rows={10} /> : null}
        {page && page.items.length > 0 ? (
          <>
            <QuestionTable rows={page.items} lang={lang} isBusy={list.isPlaceholderData} />
            <Pager {...pages} />
          </>
        ) : null}
        {page && page.items.length === 0 ? <NothingListed subject={subject} isNarrowed={isNarrowed(asked)} /> : null}
      </div>
    </div>
  );
}

function NothingListed({ subject, isNarrowed: isMatch }: { subject: SubjectDto; isNarrowed: boolean }) {
  const inSentence = subjectWords(subject.name);
  if (isMatch) {
    return (
      <EmptyState
        title="No question matches"
        action={
          <Link className="btn quiet" to={`/questions?subject=${subject.id}`}>
            Clear search and filters
          </Link>
        }
      >
        Nothing in {inSentence} fits the search and filters together.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title={`No questions in ${inSentence} yet`}
      action={
        subject.can.writeQuestions ? (
          <Link className="btn" to={`/questions/new?subject=${subject.id}`}>
            New question
          </Link>
        ) : null
      }
    >
      Write one. A question goes live when another teacher of the subject puts it live.
    </EmptyState>
  );
}
