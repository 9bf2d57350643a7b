import { askedQuestion, decidedPoints } from '#shared/domain/marking/asked-question.ts';
import type { DraftBody } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';
import { ExamQuestion, partLetter } from '#src/components/exam-question.tsx';
import { MarkScheme } from '#src/components/mark-scheme.tsx';
import { Markdown } from '#src/components/markdown.tsx';
import { Sheet, SheetRow } from '#src/components/sheet.tsx';
import { specWords } from './draft-marking.ts';

interface QuestionSheetProps {
  body: DraftBody;
  kind: QuestionKind;
  number: number;
  lang?: string | undefined;
  /** The model answers too, which the editor's own fields show already. */
  hasModelAnswers?: boolean;
}

/** A question as the exam page has it, its mark scheme below. */
export function QuestionSheet({ body, kind, number, lang, hasModelAnswers = false }: QuestionSheetProps) {
  return (
    <Sheet>
      <SheetRow>
        <div className="h-2" />
      </SheetRow>
      <ExamQuestion question={askedQuestion(number, kind, body)} number={number} lang={lang} />
      <SheetRow hasRule>
        <div className="pt-4 pb-5">
          <h3 className="mb-1">Mark scheme</h3>
          {body.parts.map((part, index) => (
            // Parts are shown in their order and hold no state here.
            <div key={partLetter(index)} className="mt-2">
              {body.parts.length > 1 ? <p className="font-semibold">Part {partLetter(index)}</p> : null}
              <MarkScheme points={decidedPoints(part)} />
              {hasModelAnswers ? (
                <div className="mt-3">
                  <p className="hint">Model answer</p>
                  <div className="pen [overflow-wrap:anywhere]">
                    {part.modelAnswer ? <Markdown source={part.modelAnswer} lang={lang} /> : 'None yet'}
                  </div>
                  {kind === 'shortAnswer' ? <SpecLine part={part} /> : null}
                </div>
              ) : null}
            </div>
          ))}
          {body.guidance?.trim() ? (
            <div className="mt-4">
              <p className="hint">Guidance, shown after the answer</p>
              <Markdown source={body.guidance} lang={lang} />
            </div>
          ) : null}
        </div>
      </SheetRow>
    </Sheet>
  );
}

function SpecLine({ part }: { part: DraftBody['parts'][number] }) {
  const words = specWords(part);
  if (words === null) return <p className="hint mt-2">The student marks this against the scheme.</p>;
  return (
    <div className="mt-3">
      <p className="hint">Marked by Plait</p>
      <p className="[overflow-wrap:anywhere]">{words}</p>
    </div>
  );
}
