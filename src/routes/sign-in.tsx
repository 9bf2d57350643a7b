import { useSuspenseQuery } from '@tanstack/react-query';
import {
  Link,
  type LoaderFunctionArgs,
  useNavigate,
  useParams,
  useRouteError,
  useSearchParams,
} from 'react-router-dom';
import { DemoPeople } from '#src/features/sign-in/demo-people.tsx';
import { SignInForm } from '#src/features/sign-in/sign-in-form.tsx';
import { SignInFrame } from '#src/features/sign-in/sign-in-frame.tsx';
import { ProblemError } from '#src/lib/api.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { safeNext } from '#src/lib/sign-in-path.ts';
import { schoolQuery } from '#src/queries/session.ts';

export async function loader({ params }: LoaderFunctionArgs): Promise<null> {
  await queryClient.ensureQueryData(schoolQuery(params.code ?? ''));
  return null;
}

/** The sign-in page of one school. */
export function Component() {
  const { code = '' } = useParams();
  const school = useSuspenseQuery(schoolQuery(code)).data;
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const next = search.get('next');
  const goOn = () => void navigate(safeNext(next), { replace: true });
  return (
    <SignInFrame foot={<p>Forgotten your password? Your school can give you a new one.</p>}>
      <title>{`Sign in, ${school.name} – Plait`}</title>
      <h1>Sign in</h1>
      <p className="text-ink-2 text-md mt-2 mb-7">{school.name}</p>
      {next ? (
        <p role="status" className="note cau mb-6">
          Sign in to go on where you were.
        </p>
      ) : null}
      <SignInForm schoolCode={school.code} onSignedIn={goOn} />
      <DemoPeople school={school} onSignedIn={goOn} />
    </SignInFrame>
  );
}

/** A code no school has, or a server out of reach. */
export function ErrorBoundary() {
  const { code = '' } = useParams();
  const error = useRouteError();
  const isUnknown = error instanceof ProblemError && error.status < 500;
  return (
    <SignInFrame>
      <title>Sign in – Plait</title>
      <h1>Sign in</h1>
      <p className="text-md mt-2 mb-6" role="alert">
        {isUnknown
          ? `There is no school with the code “${code}”. Check the letter or e-mail from your school.`
          : 'Plait cannot be reached. Check your connection, then try again.'}
      </p>
      <div className="flex flex-wrap gap-3">
        {isUnknown ? (
          <Link className="btn" to="/sign-in">
            Type another code
          </Link>
        ) : (
          <button type="button" className="btn" onClick={() => window.location.reload()}>
            Try again
          </button>
        )}
      </div>
    </SignInFrame>
  );
}
