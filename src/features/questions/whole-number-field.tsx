import { type ReactNode, useState } from 'react';
import { useController, useFormContext } from 'react-hook-form';
import { Field } from '#src/components/field.tsx';
import { type FormPath, fieldId } from './check-question.ts';
import type { QuestionForm } from './question-shape.ts';

interface WholeNumberFieldProps {
  name: FormPath;
  label: ReactNode;
  min: number;
  max: number;
  isLabelHidden?: boolean;
  isSmall?: boolean;
  hint?: string;
  frameClass?: string;
  className?: string;
}

/** A whole number within bounds. The form only ever holds one; half-typed text goes back to it on leaving the field. */
export function WholeNumberField({ name, min, max, className, ...frame }: WholeNumberFieldProps) {
  const { control } = useFormContext<QuestionForm>();
  const { field, fieldState } = useController({ control, name });
  const [typed, setTyped] = useState<string | null>(null);
  const kept = Number(field.value);
  return (
    <Field
      {...frame}
      ref={field.ref}
      id={fieldId(name)}
      name={field.name}
      type="text"
      inputMode="numeric"
      className={`num ${className ?? ''}`}
      value={typed ?? String(kept)}
      error={fieldState.error?.message}
      onChange={(event) => {
        const text = event.target.value;
        setTyped(text);
        const value = Number(text);
        if (/^\d+$/.test(text.trim()) && value >= min && value <= max) field.onChange(value);
      }}
      onBlur={() => {
        const value = typed === null ? kept : Math.round(Number(typed));
        if (typed !== null && typed.trim() !== '' && Number.isFinite(value)) {
          field.onChange(Math.min(max, Math.max(min, value)));
        }
        setTyped(null);
        field.onBlur();
      }}
    />
  );
}
