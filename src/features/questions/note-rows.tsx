import { X } from 'lucide-react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { Field } from '#src/components/field.tsx';
import { fieldId } from './check-question.ts';
import { focusSoon } from './focus-soon.ts';
import { type NoteKind, noteWords, type QuestionForm } from './question-shape.ts';

interface NoteRowsProps {
  name: `parts.${number}.points.${number}.notes`;
  /** The point's number, for the labels. */
  number: number;
}

const kinds = Object.keys(noteWords) as NoteKind[];
const MOST_OF_A_KIND = 10;

/** Allow, Ignore and Reject under a point. */
export function NoteRows({ name, number }: NoteRowsProps) {
  const { control, register } = useFormContext<QuestionForm>();
  const { fields, append, remove } = useFieldArray({ control, name });
  const groupId = fieldId(name);
  return (
    <>
      {fields.map((note, index) => (
        <div key={note.id} className="mt-1 grid grid-cols-[2.75rem_minmax(0,1fr)_1.75rem] items-center gap-1.5 text-sm">
          <span className="font-semibold">{noteWords[note.kind]}</span>
          <Field
            isSmall
            isLabelHidden
            label={`${noteWords[note.kind]}, point ${number}`}
            maxLength={300}
            {...register(`${name}.${index}.text`)}
          />
          <button
            type="button"
            className="grid h-8 w-7 place-items-center rounded-sm text-ink-2 hover:bg-sunk max-md:h-11"
            aria-label={`Remove this ${note.kind} line of point ${number}`}
            onClick={() => {
              remove(index);
              focusSoon(`${groupId}-${note.kind}`);
            }}
          >
            <X size={15} strokeWidth={1.75} aria-hidden />
          </button>
        </div>
      ))}
      <div className="mt-0.5 flex gap-3 text-sm">
        {kinds.map((kind) => (
          <button
            key={kind}
            type="button"
            id={`${groupId}-${kind}`}
            className="min-h-7 text-ink-2 hover:text-ink hover:underline disabled:opacity-45 max-md:min-h-11"
            aria-label={`Add ${kind} to point ${number}`}
            disabled={fields.filter((note) => note.kind === kind).length >= MOST_OF_A_KIND}
            onClick={() => append({ kind, text: '' }, { focusName: `${name}.${fields.length}.text` })}
          >
            + {noteWords[kind]}
          </button>
        ))}
      </div>
    </>
  );
}
