import { type ReactNode, useEffect, useRef } from 'react';
import { longDayWords } from '#shared/domain/time/words.ts';
import type { AnswerResultDto, SetItemDto } from '#shared/schemas/practice.ts';
import { partLetter } from '#src/components/exam-question.tsx';
import { MarkScheme, pointCode } from '#src/components/mark-scheme.tsx';
import { Markdown } from '#src/components/markdown.tsx';
import { MarksBadge } from '#src/components/marks-badge.tsx';
import { Sheet, SheetRow } from '#src/components/sheet.tsx';
import { Caret, Tick } from '#src/components/tick.tsx';
import { keyed } from '#src/lib/keyed.ts';
import { SaidHowSure } from './how-sure-choice.tsx';
import { AnsweredRows, SubjectRow } from './question-rows.tsx';

type ResultPart = AnswerResultDto['parts'][number];

/** Ticks and carets of one part, for the marks margin. */
function MarginMarks({ part, isDrawn }: { part: ResultPart | undefined; isDrawn: boolean }) {
  const decided = part?.points.filter((point) => point.isEarned !== null) ?? [];
  return (
    <div className="flex flex-col items-center justify-end gap-1.5 h-full pb-6" aria-hidden="true">
      {keyed(decided, (point) => point.text).map(({ key, item: point }) => (
        <span key={key} className={`inline-flex items-center gap-1 mcode ${point.isEarned ? '' : 'no'}`}>
          {point.isEarned ? <Tick size={20} isDrawn={isDrawn} /> : <Caret />}
          {pointCode(point)}
        </span>
      ))}
    </div>
  );
}

/** Letters and figures alone, so that "$25\,000$" and "25000", or "$\frac{1}{4}$" and "1/4", are the same. */
const bare = (text: string): string =>
  text
    .replace(/\\[a-z]+/gi, '')
    .replace(/[^\p{L}\p{N}]/gu, '')
    .toLowerCase();

/** A model answer helps where marks were lost and no point of the scheme says it already. */
const needsModelAnswer = ({ points, modelAnswer }: ResultPart): boolean =>
  points.some((point) => !point.isEarned) && !points.some((point) => bare(point.text) === bare(modelAnswer));

interface PartSchemeProps {
  part: ResultPart;
  letter: string | null;
  isDrawn: boolean;
}

function PartScheme({ part, letter, isDrawn }: PartSchemeProps) {
  return (
    <div>
      {letter ? <h3 className="!text-sm font-semibold text-ink-2 !font-text !tracking-normal">{letter}</h3> : null}
      <MarkScheme points={part.points} isDrawn={isDrawn} />
      {needsModelAnswer(part) ? (
        <p className="mt-2 text-sm text-ink-2">
          Model answer: <Markdown isInline source={part.modelAnswer} />
        </p>
      ) : null}
    </div>
  );
}

/** The sentence with its day in bold. */
function WithDay({ words, day }: { words: string; day: string | null }) {
  const long = day ? longDayWords(day) : null;
  const at = long ? words.indexOf(long) : -1;
  if (!long || at < 0) return words;
  return (
    <>
      {words.slice(0, at)}
      <b className="text-ink">{long}</b>
      {words.slice(at + long.length)}
    </>
  );
}

function headingFor({ marks, maxMarks }: AnswerResultDto): string {
  const lost = maxMarks - (marks ?? 0);
  if (lost === 0) return 'What earned the marks';
  return lost === 1 ? 'Where the mark went' : 'Where the marks went';
}

/** What Plait says of each part it marked, and the author's guidance. */
function Verdicts({ result }: { result: AnswerResultDto }) {
  const isSingle = result.parts.length === 1;
  // Where the student marked it, the words only asked for that.
  const hasWords = result.parts.some(({ markedBy }) => markedBy === 'plait');
  if (!hasWords && !result.guidance) return null;
  return (
    <>
      <h3>{headingFor(result)}</h3>
      <div className="mt-1 mb-5 grid gap-1.5">
        {result.parts.map((part, index) =>
          part.markedBy === 'student' ? null : (
            // Parts never change places.
            <div key={partLetter(index)}>
              {isSingle ? null : `${partLetter(index)} `}
              <Markdown isInline source={part.words} />
            </div>
          ),
        )}
        {result.guidance ? <Markdown source={result.guidance} /> : null}
      </div>
    </>
  );
}

function Explanation({ result }: { result: AnswerResultDto }) {
  return (
    <section>
      <Verdicts result={result} />
      {result.next ? (
        <>
          <h3>What happens next</h3>
          <p className="mt-1 mb-5 text-ink-2">
            <WithDay words={result.next.words} day={result.next.returnsOn} />
          </p>
        </>
      ) : null}
      <h3>Why this question</h3>
      <p className="mt-1 text-ink-2">{result.why}</p>
    </section>
  );
}

interface MarkedViewProps {
  item: SetItemDto;
  number: number;
  result: AnswerResultDto;
  /** What comes next: the buttons below the sheet. */
  steps: ReactNode;
  /** Marked just now, so that the focus belongs here. */
  isFresh: boolean;
}

/** An answer with its marks, the scheme, where the marks went and when it comes back. */
export function MarkedView({ item, number, result, steps, isFresh }: MarkedViewProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    if (isFresh) heading.current?.focus({ preventScroll: true });
  }, [isFresh]);
  const badge = <MarksBadge marks={result.marks} maxMarks={result.maxMarks} />;
  return (
    <>
      <Sheet>
        <SubjectRow item={item} topic={result.topic} />
        <AnsweredRows
          item={item}
          number={number}
          responses={result.responses}
          renderMarks={(index) => <MarginMarks part={result.parts[index]} isDrawn={isFresh} />}
        />
        <SheetRow marks={<div className="flex items-end justify-center h-full pb-6">{badge}</div>}>
          <div className="pb-6 flex items-end justify-between gap-4">
            <SaidHowSure howSure={result.howSure} />
            <span className="md:hidden">{badge}</span>
          </div>
        </SheetRow>
        <SheetRow hasRule>
          <div className="py-5 md:py-6 grid grid-cols-1 md:grid-cols-2 gap-x-10 gap-y-6">
            <section>
              <h2 ref={heading} tabIndex={-1} className="!text-[1.125rem] !leading-6">
                Mark scheme
              </h2>
              <div className="grid gap-4">
                {result.parts.map((part, index) => (
                  <PartScheme
                    key={partLetter(index)}
                    part={part}
                    letter={result.parts.length > 1 ? partLetter(index) : null}
                    isDrawn={isFresh}
                  />
                ))}
              </div>
            </section>
            <Explanation result={result} />
          </div>
        </SheetRow>
      </Sheet>
      <div className="flex flex-wrap justify-end gap-3 mt-5 px-5 md:px-0">{steps}</div>
    </>
  );
}
