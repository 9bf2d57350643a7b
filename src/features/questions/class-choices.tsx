import { useQuery } from '@tanstack/react-query';
import { classChoiceWords } from '#shared/schemas/class-question.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { ErrorState } from '#src/components/error-state.tsx';
import { Skeleton } from '#src/components/skeleton.tsx';
import { problemWords } from '#src/lib/show-problem.ts';
import { subjectWords } from '#src/lib/subject-words.ts';
import { classQuestionsQuery } from '#src/queries/class-questions.ts';
import { ClassChoiceRow } from './class-choices-row.tsx';

interface ClassChoicesProps {
  question: QuestionDto;
  zone: string;
}

/** What each of the person's classes gets of a live question: the scheduler's choice, next, or never. */
export function ClassChoices({ question, zone }: ClassChoicesProps) {
  return (
    <section aria-labelledby="class-choices" className="mt-8">
      <h2 id="class-choices" className="!text-[1.25rem]">
        In your classes’ sets
      </h2>
      <p className="mt-1 mb-3 max-w-[38rem] text-sm text-ink-2">
        <b className="font-semibold">{classChoiceWords.set}</b> puts it into each student’s next set, as early as the
        mixing of topics allows, until they have answered it.{' '}
        <b className="font-semibold">{classChoiceWords.excluded}</b> leaves it out of every set. Sets already open stay
        as they are.
      </p>
      <Rows question={question} zone={zone} />
    </section>
  );
}

function Rows({ question, zone }: ClassChoicesProps) {
  const { data: classes, error, isFetching, refetch } = useQuery(classQuestionsQuery(question.id));
  if (!classes && error) {
    return (
      <ErrorState
        headingLevel={3}
        title="Your classes could not be read"
        isRetrying={isFetching}
        onRetry={() => void refetch()}
      >
        {problemWords(error)}
      </ErrorState>
    );
  }
  if (!classes) return <Skeleton label="your classes" rows={2} />;
  if (classes.length === 0) {
    return (
      <p className="max-w-[38rem] border-t border-rule py-3.5">
        You have no class in {subjectWords(question.subject.name)} yet. Once the school admin has put you down as a
        class’s teacher, you choose for it here.
      </p>
    );
  }
  return (
    <div className="border-t-[1.5px] border-ink">
      {classes.map((row) => (
        <ClassChoiceRow key={row.classId} question={question} row={row} zone={zone} />
      ))}
    </div>
  );
}
