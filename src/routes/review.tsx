import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { EmptyState } from '#src/components/empty-state.tsx';
import { ErrorState } from '#src/components/error-state.tsx';
import { Pager } from '#src/components/pager.tsx';
import { Skeleton } from '#src/components/skeleton.tsx';
import { ReviewQueue } from '#src/features/questions/review-queue.tsx';
import { readPage, usePages } from '#src/lib/cursor-pages.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { subjectsQuery } from '#src/queries/curriculum.ts';
import { useMe } from '#src/queries/me.ts';
import { reviewQueueQuery } from '#src/queries/questions.ts';

export async function loader() {
  void queryClient.prefetchQuery(reviewQueueQuery());
  await queryClient.ensureQueryData(subjectsQuery());
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const { zone } = useMe().school;
  const { data: subjects } = useSuspenseQuery(subjectsQuery());
  const { cursor } = readPage(search);
  const queue = useQuery(reviewQueueQuery(cursor));
  const page = queue.data;
  const pages = usePages(search, page, queue.isPlaceholderData);
  return (
    <div className="page !max-w-[84rem]">
      <title>Review – Plait</title>
      <p className="mb-1.5 text-sm">
        <Link className="link" to="/questions">
          Questions
        </Link>
      </p>
      <h1>Review</h1>
      <p className="mt-1.5 mb-7 max-w-[40rem] text-md text-ink-2">
        A question goes live when another teacher of the subject puts it live. Nobody puts their own live.
      </p>
      {queue.isPending ? <Skeleton label="questions to review" /> : null}
      {queue.isError && !page ? (
        <ErrorState
          title="The review queue could not be read"
          onRetry={() => void queue.refetch()}
          isRetrying={queue.isFetching}
        >
          {problemWords(queue.error)}
        </ErrorState>
      ) : null}
      {page && page.items.length === 0 ? (
        <EmptyState
          title="Nothing to review"
          action={
            <Link className="btn quiet" to="/questions?status=draft">
              See the drafts
            </Link>
          }
        >
          Questions by other teachers of your subjects come here before they go live.
        </EmptyState>
      ) : null}
      {page && page.items.length > 0 ? (
        <>
          <ReviewQueue rows={page.items} zone={zone} hasSubjects={subjects.length > 1} />
          {pages.previous || pages.next ? <Pager {...pages} /> : null}
        </>
      ) : null}
    </div>
  );
}
