import { ArrowDown, ArrowUp, Trash2 } from 'lucide-react';
import { useFormContext, useWatch } from 'react-hook-form';
import { partLetter } from '#src/components/exam-question.tsx';
import { Field } from '#src/components/field.tsx';
import { AnswerEditor } from './answer-editor.tsx';
import { fieldId } from './check-question.ts';
import { MarkdownEditor } from './markdown-editor.tsx';
import { ModelAnswer } from './model-answer.tsx';
import { PointsEditor } from './points-editor.tsx';
import type { QuestionForm } from './question-shape.ts';
import { WholeNumberField } from './whole-number-field.tsx';

interface PartEditorProps {
  part: number;
  count: number;
  /** A lone part is the question itself: its wording stands above, and it has no letter. */
  hasPrompt: boolean;
  hasCodes: boolean;
  onMove: (to: number) => void;
  onRemove: () => void;
}

/** One part: its wording, answer place, mark scheme, and how an answer is marked. */
export function PartEditor({ part, count, hasPrompt, hasCodes, onMove, onRemove }: PartEditorProps) {
  const { control, register } = useFormContext<QuestionForm>();
  const kind = useWatch({ control, name: 'kind' });
  const name = `parts.${part}` as const;
  const letter = partLetter(part);
  const isLettered = count > 1;
  return (
    <section
      aria-label={isLettered ? `Part ${letter}` : 'Answer and mark scheme'}
      className={isLettered ? 'mt-8 border-t-[1.5px] border-ink pt-3' : ''}
    >
      {isLettered ? (
        <PartHeading letter={letter} part={part} count={count} onMove={onMove} onRemove={onRemove} />
      ) : null}
      {hasPrompt ? (
        <MarkdownEditor
          control={control}
          name={`${name}.prompt`}
          label={isLettered ? `Wording of part ${letter}` : 'Wording of the part'}
          rows={3}
        />
      ) : null}
      <div className="mt-4 grid grid-cols-[minmax(0,1fr)_5rem] gap-3">
        <Field
          label="Words before the answer line"
          id={fieldId(`${name}.answerLabel`)}
          maxLength={60}
          autoComplete="off"
          {...register(`${name}.answerLabel`)}
        />
        <WholeNumberField name={`${name}.lines`} label="Lines" min={1} max={20} />
      </div>
      <PointsEditor part={part} hasCodes={hasCodes} title={isLettered ? `Mark scheme ${letter}` : 'Mark scheme'} />
      {kind === 'shortAnswer' ? <AnswerEditor part={part} /> : null}
      <ModelAnswer part={part} />
    </section>
  );
}

interface PartHeadingProps extends Pick<PartEditorProps, 'part' | 'count' | 'onMove' | 'onRemove'> {
  letter: string;
}

const iconButton = 'grid size-9 max-md:size-11 place-items-center rounded-sm text-ink-2 hover:bg-sunk hover:text-ink';

function PartHeading({ letter, part, count, onMove, onRemove }: PartHeadingProps) {
  const isFirst = part === 0;
  const isLast = part === count - 1;
  return (
    <div className="mb-2 flex items-center justify-between">
      <h2 className="!text-[1.25rem]">Part {letter}</h2>
      <div className="flex">
        <button
          type="button"
          className={iconButton}
          id={fieldId(`parts.${part}.up`)}
          aria-label={`Move part ${letter} up`}
          aria-disabled={isFirst}
          onClick={() => !isFirst && onMove(part - 1)}
        >
          <ArrowUp size={17} strokeWidth={1.75} className={isFirst ? 'opacity-35' : undefined} aria-hidden />
        </button>
        <button
          type="button"
          className={iconButton}
          id={fieldId(`parts.${part}.down`)}
          aria-label={`Move part ${letter} down`}
          aria-disabled={isLast}
          onClick={() => !isLast && onMove(part + 1)}
        >
          <ArrowDown size={17} strokeWidth={1.75} className={isLast ? 'opacity-35' : undefined} aria-hidden />
        </button>
        <button type="button" className={iconButton} aria-label={`Remove part ${letter}`} onClick={onRemove}>
          <Trash2 size={17} strokeWidth={1.75} aria-hidden />
        </button>
      </div>
    </div>
  );
}
