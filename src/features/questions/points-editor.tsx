import { Plus } from 'lucide-react';
import { useState } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { useToast } from '#src/components/toast.tsx';
import { errorAt, fieldId } from './check-question.ts';
import { emptyPoint } from './empty-question.ts';
import { focusSoon } from './focus-soon.ts';
import { PointRow } from './point-row.tsx';
import type { QuestionForm } from './question-shape.ts';

interface PointsEditorProps {
  part: number;
  /** M, A and B exist in mathematics schemes only. */
  hasCodes: boolean;
  /** "Mark scheme", or the same for a lettered part. */
  title: string;
}

const MOST_POINTS = 20;
const plural = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;

/** The mark points of one part: add, reorder, remove with undo. */
export function PointsEditor({ part, hasCodes, title }: PointsEditorProps) {
  const { control, formState } = useFormContext<QuestionForm>();
  const name = `parts.${part}.points` as const;
  const { fields, append, insert, move, remove } = useFieldArray({ control, name });
  const points = useWatch({ control, name });
  const [moved, setMoved] = useState('');
  const toast = useToast();
  const marks = points.reduce((sum, point) => sum + point.marks, 0);
  const error = errorAt(formState.errors, `${name}.root`);
  const addId = `${fieldId(name)}-add`;

  const removePoint = (index: number) => {
    const value = points[index];
    remove(index);
    focusSoon(addId);
    if (value) toast(`Point ${index + 1} removed.`, { label: 'Undo', run: () => insert(index, value) });
  };
  const movePoint = (from: number, to: number) => {
    move(from, to);
    setMoved(`Point ${from + 1} is now point ${to + 1} of ${fields.length}.`);
    focusSoon(fieldId(`${name}.${to}.${to < from ? 'up' : 'down'}`));
  };

  return (
    <fieldset className="mt-6 min-w-0" id={fieldId(name)} tabIndex={-1}>
      <legend className="float-left font-semibold">{title}</legend>
      <p className="num text-right text-sm text-ink-2">
        {plural(marks, 'mark')} in {plural(fields.length, 'point')}
      </p>
      <ol className="clear-both mt-1 border-t-[1.5px] border-ink">
        {fields.map((field, index) => (
          <PointRow
            key={field.id}
            part={part}
            index={index}
            count={fields.length}
            hasCodes={hasCodes}
            onMove={(to) => movePoint(index, to)}
            onRemove={() => removePoint(index)}
          />
        ))}
      </ol>
      {error ? <p className="err mt-2">{error}</p> : null}
      <button
        type="button"
        id={addId}
        className="btn quiet sm mt-3 max-md:!min-h-11"
        disabled={fields.length >= MOST_POINTS}
        onClick={() => append(emptyPoint(), { focusName: `${name}.${fields.length}.text` })}
      >
        <Plus size={16} strokeWidth={1.75} aria-hidden /> Add a point
      </button>
      <p role="status" className="sr-only">
        {moved}
      </p>
    </fieldset>
  );
}
