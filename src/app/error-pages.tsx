import { isRouteErrorResponse, Link, useRevalidator, useRouteError } from 'react-router-dom';
import { ErrorState } from '#src/components/error-state.tsx';
import { NetworkError, ProblemError } from '#src/lib/api.ts';
import { Brand } from './brand.tsx';

const isMissing = (error: unknown): boolean =>
  (error instanceof ProblemError && error.status === 404) || (isRouteErrorResponse(error) && error.status === 404);

/** A page whose code no longer exists: a newer Plait was put in place meanwhile. */
const isOldPage = (error: unknown): boolean =>
  error instanceof TypeError && /dynamically imported module|module script/i.test(error.message);

function wordsOf(error: unknown): { title: string; words: string } {
  if (error instanceof NetworkError) {
    return {
      title: 'Plait cannot be reached',
      words: 'What you handed in or saved is safe. Check your connection, then try again.',
    };
  }
  if (error instanceof ProblemError && error.status === 403) {
    return { title: 'This page is not open to you', words: error.detail };
  }
  if (isOldPage(error)) {
    return { title: 'This page needs loading again', words: 'Plait was updated. What you handed in or saved is safe.' };
  }
  return {
    title: 'This page could not be shown',
    words: 'Something failed on our side. What you handed in or saved is safe. Try again in a minute.',
  };
}

function NotFound() {
  return (
    <>
      <title>Not found – Plait</title>
      <h1>There is no such page</h1>
      <p className="text-ink-2 text-md mt-2 mb-6 max-w-[36rem]">
        The address may be wrong, or the page belongs to somebody else.
      </p>
      <Link className="btn" to="/">
        Go to your first page
      </Link>
    </>
  );
}

function Fault({ error }: { error: unknown }) {
  const { state, revalidate } = useRevalidator();
  const { title, words } = wordsOf(error);
  const retry = () => (isOldPage(error) ? window.location.reload() : void revalidate());
  return (
    <>
      <title>{`${title} – Plait`}</title>
      <ErrorState
        headingLevel={1}
        title={title}
        onRetry={retry}
        isRetrying={state === 'loading'}
        action={
          <Link className="btn quiet" to="/">
            Go to your first page
          </Link>
        }
      >
        {words}
      </ErrorState>
    </>
  );
}

/** What stands in a page's place, inside the navigation, when it failed. */
export function PageError() {
  const error = useRouteError();
  return <div className="page">{isMissing(error) ? <NotFound /> : <Fault error={error} />}</div>;
}

/** The same without navigation: when even that is missing. */
export function WholePageError() {
  return (
    <>
      <header className="bar">
        <Brand />
      </header>
      <main>
        <PageError />
      </main>
    </>
  );
}

export function NotFoundPage() {
  return (
    <>
      <header className="bar">
        <Brand />
      </header>
      <main className="page">
        <NotFound />
      </main>
    </>
  );
}
