import type { ReactNode } from 'react';
import type { AnswerResultDto, SetItemDto } from '#shared/schemas/practice.ts';
import { type AskedPart, ExamQuestion } from '#src/components/exam-question.tsx';
import { RuledLines } from '#src/components/ruled-lines.tsx';
import { SheetRow } from '#src/components/sheet.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { subjectLang } from '#src/lib/subject-words.ts';

/** The subject at the left; the topic at the right, once answered. */
export function SubjectRow({ item, topic }: { item: SetItemDto; topic?: AnswerResultDto['topic'] | undefined }) {
  return (
    <SheetRow>
      <div className="pt-4 md:pt-6 flex items-center justify-between gap-3 text-sm [overflow-wrap:anywhere]">
        <span className="flex flex-none items-center gap-2 font-semibold max-w-[60%]">
          <StrandLabel subject={item.subject} /> <span className="min-w-0">{item.subject.name}</span>
        </span>
        <span className="min-w-0 text-right text-balance text-ink-2">
          {topic ? (
            <>
              Topic <b className="font-semibold text-ink">{topic.title}</b>
            </>
          ) : (
            'Topic shown once you answer'
          )}
        </span>
      </div>
    </SheetRow>
  );
}

function GivenAnswer({ part, response }: { part: AskedPart; response: string }) {
  if (response.trim() === '') return <p className="hint mt-2">No answer given.</p>;
  if (part.answerKind === 'number') {
    return (
      <p className="text-md text-right mt-2">
        {part.answerLabel ?? 'Answer'} <span className="pen text-lg">{response}</span> {part.unit}
      </p>
    );
  }
  return <RuledLines lines={1}>{response}</RuledLines>;
}

interface AnsweredRowsProps {
  item: SetItemDto;
  number: number;
  responses: string[];
  renderMarks?: (index: number) => ReactNode;
}

/** The question with what the student wrote, in blue. */
export function AnsweredRows({ item, number, responses, renderMarks }: AnsweredRowsProps) {
  return (
    <ExamQuestion
      question={item.question}
      number={number}
      lang={subjectLang(item.subject)}
      renderAnswer={(part, index) => <GivenAnswer part={part} response={responses[index] ?? ''} />}
      {...(renderMarks ? { renderMarks } : {})}
    />
  );
}
