import { useController, useFormContext, useWatch } from 'react-hook-form';
import { CheckBox, Field, Select, TextArea } from '#src/components/field.tsx';
import { Segmented } from '#src/components/segmented.tsx';
import { errorAt, fieldId } from './check-question.ts';
import type { QuestionForm } from './question-shape.ts';

const answerKinds = [
  { value: 'number', label: 'A number' },
  { value: 'text', label: 'Words' },
  { value: 'selfMarked', label: 'The student marks it' },
] as const;

/** How a typed answer earns its marks. A recall card has none of this: the student marks it. */
export function AnswerEditor({ part }: { part: number }) {
  const { control } = useFormContext<QuestionForm>();
  const { field } = useController({ control, name: `parts.${part}.answer.kind` });
  return (
    <fieldset className="mt-6 min-w-0">
      <legend className="mb-1.5 font-semibold">What Plait marks</legend>
      <Segmented label="What Plait marks" options={answerKinds} value={field.value} onChange={field.onChange} />
      <div className="mt-3">
        {field.value === 'number' ? <NumberAnswer part={part} /> : null}
        {field.value === 'text' ? <TextAnswer part={part} /> : null}
        {field.value === 'selfMarked' ? (
          <p className="hint">The student ticks the mark points they earned. Plait decides nothing here.</p>
        ) : null}
      </div>
    </fieldset>
  );
}

function NumberAnswer({ part }: { part: number }) {
  const { control, register, formState } = useFormContext<QuestionForm>();
  const name = `parts.${part}.answer` as const;
  const accuracy = useWatch({ control, name: `${name}.accuracy` });
  const box = (key: 'value' | 'tolerance' | 'min' | 'max' | 'unit', label: string, frameClass?: string) => (
    <Field
      isSmall
      label={label}
      id={fieldId(`${name}.${key}`)}
      className="num !min-h-10"
      inputMode={key === 'unit' ? undefined : 'text'}
      autoComplete="off"
      maxLength={key === 'unit' ? 30 : 40}
      error={errorAt(formState.errors, `${name}.${key}`)}
      {...(frameClass ? { frameClass } : {})}
      {...register(`${name}.${key}`)}
    />
  );
  return (
    <>
      <div className="grid grid-cols-2 gap-3 sm:grid-cols-[1fr_8.5rem_repeat(3,minmax(4.5rem,1fr))]">
        {box('value', 'Value')}
        <Select isSmall label="Accept" className="!min-h-10" {...register(`${name}.accuracy`)}>
          <option value="tolerance">Give or take</option>
          <option value="range">From and to</option>
        </Select>
        {accuracy === 'tolerance' ? box('tolerance', 'Give or take', 'sm:col-span-2') : null}
        {accuracy === 'range' ? box('min', 'From') : null}
        {accuracy === 'range' ? box('max', 'To') : null}
        {box('unit', 'Unit')}
      </div>
      <CheckBox
        label="The student types the unit"
        hint="Otherwise it is printed after the answer line."
        frameClass="mt-2"
        {...register(`${name}.isUnitRequired`)}
      />
    </>
  );
}

function TextAnswer({ part }: { part: number }) {
  const { register, formState } = useFormContext<QuestionForm>();
  const name = `parts.${part}.answer` as const;
  return (
    // Hints of the same height, so that the two boxes stand level.
    <div className="grid gap-3 sm:grid-cols-2 sm:[&_.hint]:min-h-9">
      <TextArea
        isSmall
        label="Accepted answers"
        hint="One a line. Capitals, hyphens and “the” do not matter."
        id={fieldId(`${name}.accept`)}
        rows={3}
        error={errorAt(formState.errors, `${name}.accept`)}
        {...register(`${name}.accept`)}
      />
      <TextArea
        isSmall
        label="Rejected answers"
        hint="One a line. Near misses that earn nothing."
        id={fieldId(`${name}.reject`)}
        rows={3}
        error={errorAt(formState.errors, `${name}.reject`)}
        {...register(`${name}.reject`)}
      />
      <Select isSmall label="An answer on neither list" frameClass="sm:col-span-2" {...register(`${name}.unlisted`)}>
        <option value="selfMark">is marked by the student against the scheme</option>
        <option value="wrong">earns nothing, where the part is worth one mark</option>
      </Select>
    </div>
  );
}
