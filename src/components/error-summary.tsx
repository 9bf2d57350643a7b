import { useEffect, useRef } from 'react';

export interface FieldProblem {
  /** The id of the field to go to. */
  fieldId: string;
  message: string;
}

interface ErrorSummaryProps {
  problems: FieldProblem[];
  /** Changes with each attempt, so that a second failed one takes the focus again. */
  attempt: number;
}

const words = ['one thing', 'two things', 'three things', 'four things', 'five things', 'six things'];

/** What stands in the way, at the top of a form. Takes the focus when a submit fails. */
export function ErrorSummary({ problems, attempt }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  const seen = useRef(0);
  const hasProblems = problems.length > 0;
  useEffect(() => {
    // The faults may reach the page a render after the attempt that found them.
    if (!hasProblems || attempt === seen.current) return;
    seen.current = attempt;
    box.current?.focus();
  }, [attempt, hasProblems]);
  if (!hasProblems) return null;
  const count = words[problems.length - 1] ?? `${problems.length} things`;
  return (
    <div ref={box} role="alert" tabIndex={-1} className="esum mb-6 max-w-[44rem]">
      <h2 className="!text-[1.125rem] !leading-6">
        There {problems.length === 1 ? 'is' : 'are'} {count} to put right
      </h2>
      <ul className="mt-1.5 grid gap-1">
        {problems.map(({ fieldId, message }) => (
          <li key={`${fieldId} ${message}`}>
            <a
              className="link text-gap font-semibold"
              href={`#${fieldId}`}
              onClick={(event) => {
                event.preventDefault();
                document.getElementById(fieldId)?.focus();
              }}
            >
              {message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}
