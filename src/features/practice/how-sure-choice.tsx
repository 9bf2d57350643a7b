import { useId } from 'react';
import { type HowSure, howSureSchema } from '#shared/schemas/how-sure.ts';
import { FieldError } from '#src/components/field-frame.tsx';
import { howSureWords, pencilLines } from './how-sure-words.ts';

/** A pencil line: dotted, thin or thick. */
function PencilLine({ howSure }: { howSure: HowSure }) {
  return (
    <svg viewBox="0 0 64 8" className="w-16" aria-hidden="true">
      <path d="M3 4h58" stroke="currentColor" strokeLinecap="round" {...pencilLines[howSure]} />
    </svg>
  );
}

interface HowSureChoiceProps {
  value: HowSure | null;
  onChange: (value: HowSure) => void;
  error: string | null;
  isDisabled: boolean;
}

/** How sure are you? Asked before the mark is shown, and needed to hand in. */
export function HowSureChoice({ value, onChange, error, isDisabled }: HowSureChoiceProps) {
  const id = useId();
  return (
    <fieldset aria-describedby={error ? `${id}-error` : undefined} disabled={isDisabled}>
      <legend className="font-semibold mb-2">How sure are you?</legend>
      <div className={`sure ${error ? '!border-gap' : ''}`}>
        {howSureSchema.options.map((option) => (
          <label key={option} className="relative">
            <input
              type="radio"
              name={id}
              value={option}
              checked={value === option}
              onChange={() => onChange(option)}
              data-how-sure={option}
            />
            <span>{howSureWords[option]}</span>
            <PencilLine howSure={option} />
          </label>
        ))}
      </div>
      <FieldError id={id} className="mt-1.5" isSaid>
        {error}
      </FieldError>
    </fieldset>
  );
}

/** "You said Certain", with its line. */
export function SaidHowSure({ howSure }: { howSure: HowSure }) {
  return (
    <p className="text-ink-2 text-sm flex items-center gap-3">
      <span>
        You said <b className="text-ink">{howSureWords[howSure]}</b>
      </span>
      <span className="text-ink">
        <PencilLine howSure={howSure} />
      </span>
    </p>
  );
}
