import { type ReactNode, useState } from 'react';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { emptyQuestion } from './empty-question.ts';
import { QuestionEditor } from './question-editor.tsx';
import { toQuestionForm } from './question-form.ts';
import { QuestionReader } from './question-reader.tsx';
import type { QuestionForm } from './question-shape.ts';

interface QuestionWorkspaceProps {
  id: string;
  subject: SubjectDto;
  topics: TopicDto[];
  /** Null for a question that is not saved yet. */
  question: QuestionDto | null;
  /** Topic a new question starts with. */
  topicId?: string | undefined;
  before?: ReactNode;
  onMade?: (question: QuestionDto) => void;
  onReload?: () => void;
}

const startForm = (question: QuestionDto | null, topicId: string | undefined): QuestionForm =>
  question
    ? toQuestionForm(
        question.current,
        question.topics.map((topic) => topic.id),
      )
    : emptyQuestion(topicId ? [topicId] : []);

/** One question: the editor where it may be edited, a page to read where it may not. */
export function QuestionWorkspace(props: QuestionWorkspaceProps) {
  const { id, subject, topics, question, topicId, before, onMade, onReload } = props;
  // A key of its own, since the first save of a new question must not restart the form under the writer.
  const [start, setStart] = useState(0);
  const [versionId, setVersionId] = useState(question?.current.id);
  if (question && question.current.id !== versionId) {
    setVersionId(question.current.id);
    if (versionId !== undefined) setStart(start + 1);
  }
  return (
    <div className="page !max-w-[84rem] !pt-6 !pb-10">
      {question && !question.can.edit ? (
        <QuestionReader question={question} subject={subject} />
      ) : (
        <QuestionEditor
          key={start}
          {...{ id, subject, topics, question, before }}
          initial={startForm(question, topicId)}
          onMade={(made) => onMade?.(made)}
          onReload={() => {
            onReload?.();
            setStart((count) => count + 1);
          }}
        />
      )}
    </div>
  );
}
