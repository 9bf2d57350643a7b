import { ArrowDown, ArrowUp, Trash2 } from 'lucide-react';
import { useFormContext } from 'react-hook-form';
import { Select, TextArea } from '#src/components/field.tsx';
import { errorAt, fieldId } from './check-question.ts';
import { NoteRows } from './note-rows.tsx';
import type { QuestionForm } from './question-shape.ts';
import { WholeNumberField } from './whole-number-field.tsx';

interface PointRowProps {
  part: number;
  index: number;
  count: number;
  hasCodes: boolean;
  onMove: (to: number) => void;
  onRemove: () => void;
}

const iconButton =
  'grid h-9 w-7 max-md:h-11 max-md:w-9 place-items-center rounded-sm text-ink-2 hover:bg-sunk hover:text-ink disabled:opacity-35';

/** One creditable point: code, words, marks, and what to allow, ignore or reject. */
export function PointRow({ part, index, count, hasCodes, onMove, onRemove }: PointRowProps) {
  const { register, formState } = useFormContext<QuestionForm>();
  const name = `parts.${part}.points.${index}` as const;
  const number = index + 1;
  return (
    <li
      className={`grid items-start gap-x-2 gap-y-1 border-b border-rule py-2.5 ${
        hasCodes
          ? 'grid-cols-[1.25rem_3.75rem_minmax(0,1fr)_3rem] sm:grid-cols-[1.25rem_3.75rem_minmax(0,1fr)_3rem_auto]'
          : 'grid-cols-[1.25rem_minmax(0,1fr)_3rem] sm:grid-cols-[1.25rem_minmax(0,1fr)_3rem_auto]'
      }`}
    >
      <span className="num pt-[7px] font-bold max-md:pt-[11px]">{number}</span>
      {hasCodes ? (
        <Select
          isSmall
          isLabelHidden
          label={`Code of point ${number}`}
          className="!min-h-9"
          {...register(`${name}.code`)}
        >
          <option value="">–</option>
          <option value="M">M</option>
          <option value="A">A</option>
          <option value="B">B</option>
        </Select>
      ) : null}
      <TextArea
        isSmall
        isLabelHidden
        label={`Point ${number}`}
        id={fieldId(`${name}.text`)}
        rows={1}
        className="!min-h-9 resize-none !py-1.5 font-mono !text-[.78rem] leading-5"
        error={errorAt(formState.errors, `${name}.text`)}
        {...register(`${name}.text`)}
      />
      <WholeNumberField
        isSmall
        isLabelHidden
        label={`Marks for point ${number}`}
        name={`${name}.marks`}
        min={1}
        max={10}
        className="!min-h-9 text-right"
      />
      <div className="flex justify-end max-sm:col-span-full max-sm:row-start-3 max-sm:-mt-12 max-sm:justify-self-end">
        <button
          type="button"
          id={fieldId(`${name}.up`)}
          className={iconButton}
          aria-label={`Move point ${number} up`}
          aria-disabled={index === 0}
          onClick={() => index > 0 && onMove(index - 1)}
        >
          <ArrowUp size={16} strokeWidth={1.75} className={index === 0 ? 'opacity-35' : undefined} aria-hidden />
        </button>
        <button
          type="button"
          id={fieldId(`${name}.down`)}
          className={iconButton}
          aria-label={`Move point ${number} down`}
          aria-disabled={index === count - 1}
          onClick={() => index < count - 1 && onMove(index + 1)}
        >
          <ArrowDown
            size={16}
            strokeWidth={1.75}
            className={index === count - 1 ? 'opacity-35' : undefined}
            aria-hidden
          />
        </button>
        <button type="button" className={iconButton} aria-label={`Remove point ${number}`} onClick={onRemove}>
          <Trash2 size={16} strokeWidth={1.75} aria-hidden />
        </button>
      </div>
      <div
        className={`min-w-0 max-sm:col-span-full ${hasCodes ? 'sm:col-span-2 sm:col-start-3' : 'sm:col-start-2 sm:col-span-2'}`}
      >
        <NoteRows name={`${name}.notes`} number={number} />
      </div>
    </li>
  );
}
