import { useFormContext } from 'react-hook-form';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { MarkdownEditor } from './markdown-editor.tsx';
import { PartsEditor } from './parts-editor.tsx';
import type { QuestionForm } from './question-shape.ts';
import { SetupFields } from './setup-fields.tsx';

interface EditorFieldsProps {
  subject: SubjectDto;
  topics: TopicDto[];
}

/** Everything a person writes in a question, in the order of the exam page. */
export function EditorFields({ subject, topics }: EditorFieldsProps) {
  const { control } = useFormContext<QuestionForm>();
  return (
    <>
      <SetupFields subject={subject} topics={topics} />
      <MarkdownEditor control={control} name="stem" label="Question" hint="Markdown, with $…$ for maths" rows={6} />
      <PartsEditor hasCodes={subject.strand === 'ma'} />
      <div className="mt-6">
        <MarkdownEditor control={control} name="guidance" label="Guidance" hint="Shown after the answer" rows={3} />
      </div>
    </>
  );
}
