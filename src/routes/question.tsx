import { useSuspenseQuery } from '@tanstack/react-query';
import { type LoaderFunctionArgs, useParams } from 'react-router-dom';
import { z } from 'zod';
import { ErrorState } from '#src/components/error-state.tsx';
import { QuestionWorkspace } from '#src/features/questions/question-workspace.tsx';
import { queryClient } from '#src/lib/query-client.ts';
import { subjectsQuery, topicsQuery } from '#src/queries/curriculum.ts';
import { questionQuery } from '#src/queries/questions.ts';

const paramsSchema = z.object({ id: z.uuid() });

export async function loader({ params }: LoaderFunctionArgs) {
  const parsed = paramsSchema.safeParse(params);
  if (!parsed.success) throw new Response('No such question', { status: 404 });
  const [question] = await Promise.all([
    // Always the newest: a form must not open on an old draft.
    queryClient.fetchQuery({ ...questionQuery(parsed.data.id), staleTime: 0 }),
    queryClient.ensureQueryData(subjectsQuery()),
  ]);
  await queryClient.ensureQueryData(topicsQuery(question.subject.id));
  return null;
}

export function Component() {
  const { id } = paramsSchema.parse(useParams());
  // Keyed, so that going from one question to another never carries a form along.
  return <QuestionPage key={id} id={id} />;
}

function QuestionPage({ id }: { id: string }) {
  const { data: question } = useSuspenseQuery(questionQuery(id));
  const { data: subjects } = useSuspenseQuery(subjectsQuery());
  const { data: topics } = useSuspenseQuery(topicsQuery(question.subject.id));
  const subject = subjects.find((one) => one.id === question.subject.id);
  if (!subject) {
    return (
      <div className="page">
        <ErrorState headingLevel={1} title="This question is in another subject">
          You are not a teacher of {question.subject.name} here.
        </ErrorState>
      </div>
    );
  }
  return (
    <>
      <title>{`Question ${question.number} – Plait`}</title>
      <QuestionWorkspace id={id} subject={subject} topics={topics} question={question} />
    </>
  );
}
