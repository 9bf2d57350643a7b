import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { type LoaderFunctionArgs, useSearchParams } from 'react-router-dom';
import type { SubjectDto } from '#shared/schemas/curriculum.ts';
import { EmptyState } from '#src/components/empty-state.tsx';
import { Select } from '#src/components/field.tsx';
import { QuestionWorkspace } from '#src/features/questions/question-workspace.tsx';
import { chooseSubject } from '#src/lib/choose-subject.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { subjectsQuery, topicsQuery } from '#src/queries/curriculum.ts';
import { questionQuery } from '#src/queries/questions.ts';

const mayWrite = (subject: SubjectDto) => subject.can.writeQuestions;

export async function loader({ request }: LoaderFunctionArgs) {
  const { items } = await queryClient.ensureQueryData(subjectsQuery());
  const subject = chooseSubject(items.filter(mayWrite), new URL(request.url).searchParams);
  if (subject) await queryClient.ensureQueryData(topicsQuery(subject.id));
  return null;
}

/** The address of the saved question, without a navigation: the writer keeps the caret. */
function showOwnAddress(id: string) {
  window.history.replaceState(window.history.state, '', `/questions/${id}`);
}

export function Component() {
  const [search, setSearch] = useSearchParams();
  const { data: all } = useSuspenseQuery(subjectsQuery());
  const subjects = all.filter(mayWrite);
  const subject = chooseSubject(subjects, search);
  if (!subject) {
    return (
      <div className="page">
        <EmptyState headingLevel={1} title="No subject to write for">
          Your school has not put you down as a teacher of a subject yet. The school admin does that.
        </EmptyState>
      </div>
    );
  }
  return (
    <NewQuestion
      key={subject.id}
      subject={subject}
      subjects={subjects}
      topicId={search.get('topic') ?? undefined}
      onSubject={(id) => setSearch({ subject: id }, { replace: true })}
    />
  );
}

interface NewQuestionProps {
  subject: SubjectDto;
  subjects: SubjectDto[];
  topicId: string | undefined;
  onSubject: (id: string) => void;
}

function NewQuestion({ subject, subjects, topicId, onSubject }: NewQuestionProps) {
  const [id] = useState(() => crypto.randomUUID());
  const { data: topics } = useSuspenseQuery(topicsQuery(subject.id));
  // Only read: the saves put the question there.
  const { data: question = null } = useQuery({ ...questionQuery(id), enabled: false });
  const isKnownTopic = topics.some((topic) => topic.id === topicId);
  return (
    <>
      <title>{question ? `Question ${question.number} – Plait` : 'New question – Plait'}</title>
      <QuestionWorkspace
        id={id}
        subject={subject}
        topics={topics}
        question={question}
        topicId={isKnownTopic ? topicId : undefined}
        onMade={() => showOwnAddress(id)}
        before={
          question || subjects.length < 2 ? null : (
            <Select
              label="Subject"
              frameClass="mb-3 sm:max-w-[20rem]"
              value={subject.id}
              onChange={(event) => onSubject(event.target.value)}
            >
              {subjects.map((one) => (
                <option key={one.id} value={one.id}>
                  {one.name}
                </option>
              ))}
            </Select>
          )
        }
      />
    </>
  );
}
