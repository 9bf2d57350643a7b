import { useFormContext, useWatch } from 'react-hook-form';
import { TextArea } from '#src/components/field.tsx';
import { Tick } from '#src/components/tick.tsx';
import { useDebounced } from '#src/lib/use-debounced.ts';
import { errorAt, fieldId } from './check-question.ts';
import { tryAnswer } from './draft-marking.ts';
import { toDraftPart } from './question-form.ts';
import type { PartForm, QuestionForm } from './question-shape.ts';

/** The model answer, marked as it is typed: it has to earn every mark. */
export function ModelAnswer({ part }: { part: number }) {
  const { register, formState, control } = useFormContext<QuestionForm>();
  const name = `parts.${part}.modelAnswer` as const;
  const kind = useWatch({ control, name: 'kind' });
  const value = useDebounced(useWatch({ control, name: `parts.${part}` }), 300);
  return (
    <div className="mt-6">
      <TextArea
        label="Model answer"
        hint="What a student with full marks would write."
        id={fieldId(name)}
        error={errorAt(formState.errors, name)}
        {...register(name)}
      />
      <div role="status" className="mt-1.5 text-sm">
        {kind === 'shortAnswer' ? <ModelVerdict part={value} /> : null}
      </div>
    </div>
  );
}

function ModelVerdict({ part: form }: { part: PartForm }) {
  if (form.answer.kind === 'selfMarked' || form.modelAnswer.trim() === '') return null;
  const part = toDraftPart(form, 'shortAnswer');
  const verdict = tryAnswer(part, form.modelAnswer);
  if (!verdict) return <p className="text-ink-2">Plait checks it once it knows which answers earn the marks.</p>;
  if (verdict.outcome === 'full') {
    return (
      <p className="flex items-center gap-2">
        <Tick label="" /> Plait gives it full marks: {verdict.marks} of {verdict.marks}.
      </p>
    );
  }
  return (
    <p className="note gap">
      <b>{verdict.outcome === 'none' ? 'Plait gives it no marks.' : 'Plait cannot decide on it.'}</b> {verdict.words}
    </p>
  );
}
