import { type KeyboardEvent, useEffect, useRef, useState } from 'react';
import type { AnswerResultDto, SetItemDto } from '#shared/schemas/practice.ts';
import { partLetter } from '#src/components/exam-question.tsx';
import { MarkScheme, PointNotes, type SchemePoint } from '#src/components/mark-scheme.tsx';
import { Markdown } from '#src/components/markdown.tsx';
import { MarksBadge } from '#src/components/marks-badge.tsx';
import { Sheet, SheetRow } from '#src/components/sheet.tsx';
import { Tick } from '#src/components/tick.tsx';
import { keyed } from '#src/lib/keyed.ts';
import { SaidHowSure } from './how-sure-choice.tsx';
import { AnsweredRows, SubjectRow } from './question-rows.tsx';

type ResultPart = AnswerResultDto['parts'][number];
export type Ticks = boolean[][];

const startTicks = (result: AnswerResultDto): Ticks =>
  result.parts.map((part) => part.points.map((point) => point.isEarned ?? false));

const marksOf = (result: AnswerResultDto, ticks: Ticks): number =>
  result.parts
    .flatMap((part, at) => part.points.map((point, index) => (ticks[at]?.[index] ? point.marks : 0)))
    .reduce((sum, marks) => sum + marks, 0);

/** Arrow keys move between the tick boxes of the whole question. */
function moveFocus(event: KeyboardEvent<HTMLInputElement>): void {
  const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
  if (step === 0) return;
  const boxes = [...document.querySelectorAll<HTMLInputElement>('[data-ticks] input')];
  const at = boxes.indexOf(event.currentTarget);
  event.preventDefault();
  boxes[Math.min(Math.max(at + step, 0), boxes.length - 1)]?.focus();
}

function TickRow({ point, isOn, onChange }: { point: SchemePoint; isOn: boolean; onChange: (isOn: boolean) => void }) {
  return (
    <li>
      <label className={`mtick cursor-pointer ${isOn ? 'on' : ''}`}>
        <span className="box has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus">
          <input
            type="checkbox"
            className="sr-only"
            checked={isOn}
            onKeyDown={moveFocus}
            onChange={(event) => onChange(event.target.checked)}
          />
          {isOn ? <Tick isDrawn /> : null}
        </span>
        <span className="text-md leading-[1.6rem] min-w-0">
          <Markdown isInline source={point.text} />
          <PointNotes point={point} />
        </span>
        <span className={`num text-sm pt-1 ${isOn ? 'text-accent font-bold' : 'text-ink-2'}`}>
          {point.code}
          {point.marks}
          <span className="sr-only"> {point.marks === 1 ? 'mark' : 'marks'}</span>
        </span>
      </label>
    </li>
  );
}

interface PartTicksProps {
  part: ResultPart;
  letter: string | null;
  ticks: boolean[];
  onTick: (index: number, isOn: boolean) => void;
}

function PartTicks({ part, letter, ticks, onTick }: PartTicksProps) {
  return (
    <div>
      {letter ? <h3 className="!text-base !leading-6">{letter}</h3> : null}
      <p className="text-sm text-ink-2">
        <Markdown isInline source={part.words} />
      </p>
      {part.markedBy === 'plait' ? (
        <MarkScheme points={part.points} />
      ) : (
        <>
          <ul className="mt-3 border-b border-rule" data-ticks="">
            {keyed(part.points, (point) => point.text).map(({ key, item: point, index }) => (
              <TickRow key={key} point={point} isOn={ticks[index] ?? false} onChange={(isOn) => onTick(index, isOn)} />
            ))}
          </ul>
          <p className="mt-2 text-sm text-ink-2">
            Model answer: <Markdown isInline source={part.modelAnswer} />
          </p>
        </>
      )}
    </div>
  );
}

interface SelfMarkViewProps {
  item: SetItemDto;
  number: number;
  result: AnswerResultDto;
  kept: Ticks | undefined;
  isSending: boolean;
  onTicks: (ticks: Ticks) => void;
  onSave: (ticks: Ticks) => void;
}

/** A student marks the answer against the scheme, point by point. */
export function SelfMarkView({ item, number, result, kept, isSending, onTicks, onSave }: SelfMarkViewProps) {
  const [ticks, setTicks] = useState(() => kept ?? startTicks(result));
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus({ preventScroll: true }), []);
  const change = (at: number, index: number, isOn: boolean) => {
    const next = ticks.map((row, part) =>
      part === at ? row.map((was, point) => (point === index ? isOn : was)) : row,
    );
    setTicks(next);
    onTicks(next);
  };
  const marks = marksOf(result, ticks);
  const badge = <MarksBadge marks={marks} maxMarks={result.maxMarks} />;
  return (
    <>
      <Sheet>
        <SubjectRow item={item} topic={result.topic} />
        <AnsweredRows item={item} number={number} responses={result.responses} />
        <SheetRow>
          <div className="pb-5">
            <SaidHowSure howSure={result.howSure} />
          </div>
        </SheetRow>
        <SheetRow hasRule marks={<div className="flex items-end justify-center h-full pb-5">{badge}</div>}>
          <section className="py-5" aria-labelledby="self-mark">
            <h2 ref={heading} id="self-mark" tabIndex={-1} className="!text-[1.125rem] !leading-6">
              Tick each point you earned
            </h2>
            <div className="mt-0.5 grid gap-5">
              {result.parts.map((part, at) => (
                <PartTicks
                  key={partLetter(at)}
                  part={part}
                  letter={result.parts.length > 1 ? partLetter(at) : null}
                  ticks={ticks[at] ?? []}
                  onTick={(index, isOn) => change(at, index, isOn)}
                />
              ))}
            </div>
            <div className="md:hidden flex items-center justify-between mt-4">
              <span className="text-sm text-ink-2">Your mark</span>
              {badge}
            </div>
          </section>
        </SheetRow>
      </Sheet>
      <div className="flex flex-wrap items-center justify-between gap-3 mt-5 px-5 md:px-0">
        <p className="text-sm text-ink-2">A point you leave empty is a gap, and is asked again.</p>
        <button type="button" className="btn big max-md:w-full" disabled={isSending} onClick={() => onSave(ticks)}>
          {isSending ? 'Saving' : `Save ${marks} ${marks === 1 ? 'mark' : 'marks'}`}
        </button>
      </div>
    </>
  );
}
