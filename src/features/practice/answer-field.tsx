import { useId } from 'react';
import { type AskedPart, partLetter } from '#src/components/exam-question.tsx';
import { LINE_PX } from '#src/components/ruled-lines.tsx';

interface AnswerFieldProps {
  part: AskedPart;
  index: number;
  /** The question has no other part. */
  isOnly: boolean;
  value: string;
  onChange: (value: string) => void;
  isDisabled: boolean;
  lang?: string | undefined;
}

/** Longest answer the server takes. */
const ANSWER_LIMIT = 2000;

/** Where a student writes one part: ruled lines, or an answer line with its label and printed unit. */
export function AnswerField({ part, index, isOnly, value, onChange, isDisabled, lang }: AnswerFieldProps) {
  const id = useId();
  const name = isOnly ? 'Your answer' : `Your answer to ${partLetter(index)}`;
  const shared = {
    id,
    value,
    lang,
    readOnly: isDisabled,
    maxLength: ANSWER_LIMIT,
    autoComplete: 'off',
    spellCheck: false,
  } as const;
  const isLine = part.answerKind === 'number' || (part.answerLabel !== null && part.lines === 1);
  if (isLine) {
    return (
      <div className="mt-2">
        <div className="flex flex-wrap items-end justify-end gap-x-3 text-md">
          <label htmlFor={id} className="pb-1">
            {part.answerLabel ?? 'Answer'}
            <span className="sr-only">
              {part.answerLabel ? `, ${name.toLowerCase()}` : null}
              {part.unit ? `, in ${part.unit}` : null}
            </span>
          </label>
          <input
            {...shared}
            type="text"
            autoCapitalize="off"
            className="answer-line w-44 max-w-full flex-none"
            onChange={(event) => onChange(event.target.value)}
          />
          {part.unit ? (
            <span className="pb-1" aria-hidden="true">
              {part.unit}
            </span>
          ) : null}
        </div>
        {part.lines > 2 ? (
          <p className="hint mt-2 text-right">Do your working on paper. Type only the answer.</p>
        ) : null}
      </div>
    );
  }
  return (
    <>
      <label htmlFor={id} className={part.answerLabel ? 'block mt-1 text-md' : 'sr-only'}>
        {part.answerLabel ?? name}
      </label>
      <textarea
        {...shared}
        className="ruled"
        rows={part.lines}
        style={{ minHeight: part.lines * LINE_PX }}
        onChange={(event) => onChange(event.target.value)}
      />
      {part.unit ? <p className="text-right text-md">{part.unit}</p> : null}
    </>
  );
}
