import type { ReactNode } from 'react';
import type { AskedQuestionDto } from '#shared/schemas/practice.ts';
import { Markdown } from './markdown.tsx';
import { RuledLines } from './ruled-lines.tsx';
import { SheetRow } from './sheet.tsx';

export type AskedPart = AskedQuestionDto['parts'][number];

/** "(a)", "(b)" … */
export const partLetter = (index: number): string => `(${String.fromCharCode(97 + index)})`;

/** "[1 mark]", "[4 marks]". */
export const marksWords = (marks: number): string => `[${marks} ${marks === 1 ? 'mark' : 'marks'}]`;

/** The place for an answer as the printed page has it, blank. */
function BlankAnswer({ part }: { part: AskedPart }) {
  if (part.answerKind !== 'number' && !part.answerLabel) return <RuledLines lines={part.lines} />;
  return (
    <div aria-hidden="true">
      {part.lines > 1 ? <RuledLines lines={part.lines - 1} /> : null}
      <div className="flex flex-wrap items-end justify-end gap-x-3 pt-4">
        <span>{part.answerLabel ?? 'Answer'}</span>
        <span className="answer-line inline-block w-44" />
        {part.unit ? <span>{part.unit}</span> : null}
      </div>
    </div>
  );
}

interface ExamQuestionProps {
  question: AskedQuestionDto;
  /** What stands in the number margin: the place in the set, or the number in the bank. */
  number: number;
  /** The answer place of one part; blank lines without it. */
  renderAnswer?: (part: AskedPart, index: number) => ReactNode;
  /** The marks margin beside one part's answer. */
  renderMarks?: (index: number) => ReactNode;
  lang?: string | undefined;
}

/** A question as the exam page prints it: rows for a Sheet. */
export function ExamQuestion({ question, number, renderAnswer, renderMarks, lang }: ExamQuestionProps) {
  const { parts, stem } = question;
  const isSingle = parts.length === 1;
  const hasStem = stem.trim() !== '';
  const figure = (
    // Stands on the first line of the question.
    <p className="text-center pt-[.9375rem] md:pt-2">
      <span className="qnum num">{number}</span>
    </p>
  );
  return (
    <>
      {hasStem ? (
        <SheetRow margin={figure}>
          <div className="qtext pt-4 md:pt-5 pb-2">
            <Markdown source={stem} lang={lang} />
          </div>
        </SheetRow>
      ) : null}
      {parts.map((part, index) => (
        <SheetRow
          // Parts of a version never change places.
          key={partLetter(index)}
          margin={!hasStem && index === 0 ? figure : null}
          marks={renderMarks?.(index)}
        >
          <div className={`${hasStem ? '' : 'pt-4 md:pt-5'} pb-5`}>
            {isSingle && part.prompt.trim() === '' ? null : (
              <div className={`qtext grid gap-x-1.5 ${isSingle ? '' : 'grid-cols-[1.75rem_minmax(0,1fr)]'}`}>
                {isSingle ? null : <span>{partLetter(index)}</span>}
                <Markdown source={part.prompt} lang={lang} />
              </div>
            )}
            <p className="marks mt-1 mb-2">{marksWords(part.marks)}</p>
            {renderAnswer ? renderAnswer(part, index) : <BlankAnswer part={part} />}
          </div>
        </SheetRow>
      ))}
    </>
  );
}
