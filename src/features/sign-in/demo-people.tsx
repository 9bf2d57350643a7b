import type { SignInPageDto } from '#shared/schemas/auth.ts';
import { roleWords } from '#shared/schemas/role.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { useDemoSignIn } from '#src/queries/session.ts';

interface DemoPeopleProps {
  school: SignInPageDto;
  onSignedIn: () => void;
}

/** The people of the demo school, one press each. Only a demo lists any. */
export function DemoPeople({ school, onSignedIn }: DemoPeopleProps) {
  const signIn = useDemoSignIn();
  if (school.demoPeople.length === 0) return null;
  return (
    <section className="mt-9 border-t border-rule pt-5" aria-labelledby="demo">
      <h2 id="demo" className="!text-[1.25rem]">
        Look round the demo
      </h2>
      <p className="hint mb-2">Everybody here is invented.</p>
      <ul>
        {school.demoPeople.map((person) => (
          <li key={person.username} className="border-b border-rule-soft">
            <button
              type="button"
              className="w-full min-h-11 py-2 text-left hover:bg-sunk"
              disabled={signIn.isPending}
              onClick={() =>
                signIn.mutate({ schoolCode: school.code, username: person.username }, { onSuccess: onSignedIn })
              }
            >
              <span className="sr-only">Sign in as </span>
              <span className="font-semibold link">{person.name}</span>
              <span className="text-ink-2">, {roleWords[person.role].toLowerCase()}</span>
              {person.note ? <span className="block hint">{person.note}</span> : null}
            </button>
          </li>
        ))}
      </ul>
      {signIn.isError ? (
        <p role="alert" className="err mt-2">
          {problemWords(signIn.error)}
        </p>
      ) : null}
    </section>
  );
}
