import { Plus } from 'lucide-react';
import { useState } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { partLetter } from '#src/components/exam-question.tsx';
import { useToast } from '#src/components/toast.tsx';
import { fieldId } from './check-question.ts';
import { emptyPart } from './empty-question.ts';
import { focusSoon } from './focus-soon.ts';
import { PartEditor } from './part-editor.tsx';
import type { QuestionForm } from './question-shape.ts';

const MOST_PARTS = 8;
const addId = fieldId('parts.add');

/** The parts of a question: add, reorder, remove with undo. */
export function PartsEditor({ hasCodes }: { hasCodes: boolean }) {
  const { control, getValues } = useFormContext<QuestionForm>();
  const { fields, append, insert, move, remove } = useFieldArray({ control, name: 'parts' });
  const [hadPrompt] = useState(() => getValues('parts.0.prompt').trim() !== '');
  const toast = useToast();

  const removePart = (part: number) => {
    const value = getValues(`parts.${part}`);
    remove(part);
    focusSoon(addId);
    toast(`Part ${partLetter(part)} removed.`, { label: 'Undo', run: () => insert(part, value) });
  };
  const movePart = (from: number, to: number) => {
    move(from, to);
    focusSoon(fieldId(`parts.${to}.${to < from ? 'up' : 'down'}`));
  };

  return (
    <>
      {fields.map((field, part) => (
        <PartEditor
          key={field.id}
          part={part}
          count={fields.length}
          hasPrompt={fields.length > 1 || hadPrompt || field.prompt.trim() !== ''}
          hasCodes={hasCodes}
          onMove={(to) => movePart(part, to)}
          onRemove={() => removePart(part)}
        />
      ))}
      <div className="mt-8 border-t border-rule pt-4">
        <button
          type="button"
          id={addId}
          className="btn quiet sm max-md:!min-h-11"
          disabled={fields.length >= MOST_PARTS}
          onClick={() => append(emptyPart(), { focusName: `parts.${fields.length}.prompt` })}
        >
          <Plus size={16} strokeWidth={1.75} aria-hidden /> Add a part
        </button>
      </div>
    </>
  );
}
