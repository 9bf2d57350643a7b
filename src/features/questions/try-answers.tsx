import { type FormEvent, useId, useState } from 'react';
import { decidedPoints } from '#shared/domain/marking/asked-question.ts';
import type { DraftBody } from '#shared/schemas/question.ts';
import { Dialog } from '#src/components/dialog.tsx';
import { partLetter } from '#src/components/exam-question.tsx';
import { TextArea } from '#src/components/field.tsx';
import { MarkScheme } from '#src/components/mark-scheme.tsx';
import { Markdown } from '#src/components/markdown.tsx';
import { MarksBadge } from '#src/components/marks-badge.tsx';
import { tryAnswer } from './draft-marking.ts';

interface TryAnswersProps {
  body: DraftBody;
  lang?: string | undefined;
  onClose: () => void;
}

/** The question answered as a student would, marked in the browser. Nothing of it is kept. */
export function TryAnswers({ body, lang, onClose }: TryAnswersProps) {
  const isLettered = body.parts.length > 1;
  return (
    <Dialog title="Try answers" isWide onClose={onClose}>
      <p className="mt-1 mb-4 text-ink-2">Answer as a student would and see the marks. Nothing here is kept.</p>
      {body.stem.trim() ? (
        <div className="mb-4 text-md">
          <Markdown source={body.stem} lang={lang} />
        </div>
      ) : null}
      {body.parts.map((part, index) => (
        // The body does not change while the dialog is open.
        <TriedPart key={partLetter(index)} part={part} letter={isLettered ? partLetter(index) : null} lang={lang} />
      ))}
      <button type="button" className="btn quiet mt-5" onClick={onClose}>
        Done
      </button>
    </Dialog>
  );
}

interface TriedPartProps {
  part: DraftBody['parts'][number];
  letter: string | null;
  lang?: string | undefined;
}

function TriedPart({ part, letter, lang }: TriedPartProps) {
  const [answer, setAnswer] = useState('');
  const [tried, setTried] = useState<string | null>(null);
  const resultId = useId();
  const mark = (event: FormEvent) => {
    event.preventDefault();
    setTried(answer);
  };
  const unit = part.answer.kind === 'number' && !part.answer.isUnitRequired ? part.answer.unit : undefined;
  return (
    <form onSubmit={mark} className="border-t border-rule py-4">
      {part.prompt.trim() ? (
        <div className="mb-2 flex gap-2">
          {letter ? <b>{letter}</b> : null}
          <Markdown source={part.prompt} lang={lang} />
        </div>
      ) : null}
      <div className="flex flex-wrap items-end gap-x-3 gap-y-2">
        <TextArea
          label={letter ? `Answer to part ${letter}` : (part.answerLabel ?? 'Answer')}
          rows={1}
          frameClass="flex-1 basis-56"
          className="pen"
          value={answer}
          onChange={(event) => setAnswer(event.target.value)}
          aria-controls={resultId}
        />
        {unit ? <span className="pb-3">{unit}</span> : null}
        <button type="submit" className={letter ? 'btn quiet' : 'btn'}>
          Mark it
        </button>
      </div>
      <div id={resultId} role="status" className="mt-3">
        {tried === null ? null : <TriedVerdict part={part} answer={tried} />}
      </div>
    </form>
  );
}

function TriedVerdict({ part, answer }: { part: TriedPartProps['part']; answer: string }) {
  const verdict = tryAnswer(part, answer);
  if (!verdict) return <p className="err">Say first which answers earn the marks. Plait cannot mark this part yet.</p>;
  const available = part.points.reduce((sum, point) => sum + point.marks, 0);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] items-start gap-4">
      <div>
        <p>
          {verdict.outcome === 'undecided' ? <b>The student marks this one. </b> : null}
          {verdict.words}
        </p>
        <MarkScheme points={decidedPoints(part, verdict.earned)} />
      </div>
      <MarksBadge marks={verdict.marks} maxMarks={available} />
    </div>
  );
}
