import { type FormEvent, type ReactNode, useEffect, useRef, useState } from 'react';
import type { SetItemDto } from '#shared/schemas/practice.ts';
import { ExamQuestion } from '#src/components/exam-question.tsx';
import { Sheet, SheetRow } from '#src/components/sheet.tsx';
import { subjectLang } from '#src/lib/subject-words.ts';
import { AnswerField } from './answer-field.tsx';
import type { Draft } from './drafts.ts';
import { HowSureChoice } from './how-sure-choice.tsx';
import { SubjectRow } from './question-rows.tsx';
import { RunnerFrame, type RunnerState } from './runner-frame.tsx';
import type { FinishedAnswer } from './use-runner.ts';
import { useStopwatch } from './use-stopwatch.ts';

interface AskViewProps {
  state: RunnerState;
  item: SetItemDto;
  draft: Draft | undefined;
  /** Work on the questions before, in seconds. */
  secondsBefore: number;
  isSending: boolean;
  isAway: boolean;
  notes: ReactNode;
  onDraft: (draft: Draft) => void;
  onHandIn: (answer: FinishedAnswer) => void;
}

function footWords(isAway: boolean, isTimeUp: boolean): string {
  if (isTimeUp) return 'Time is up. Take what you need for this question; the set closes after it.';
  if (isAway) return 'Marks appear when you are back. The next questions are already on this page.';
  return 'You can hand in a blank answer. It counts as a gap and comes back sooner. Your teacher sees this answer. Your carer does not.';
}

/** One question to answer. What is typed is kept on the device with every key. */
export function AskView(props: AskViewProps) {
  const { state, item, secondsBefore, isSending, isAway, notes, onDraft, onHandIn } = props;
  const { parts } = item.question;
  const [draft, setDraft] = useState<Draft>(
    () => props.draft ?? { responses: parts.map(() => ''), howSure: null, seconds: 0 },
  );
  const [error, setError] = useState<string | null>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => heading.current?.focus(), []);

  const seconds = useStopwatch(draft.seconds, (now) => {
    if (!isSending) onDraft({ ...draft, seconds: now });
  });
  const change = (part: Partial<Draft>) => {
    const next = { ...draft, ...part, seconds };
    setDraft(next);
    onDraft(next);
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (isSending) return;
    if (!draft.howSure) {
      setError('Say how sure you are.');
      form.current?.querySelector<HTMLInputElement>('[data-how-sure]')?.focus();
      return;
    }
    onHandIn({ responses: draft.responses, howSure: draft.howSure, seconds });
  };
  const total = secondsBefore + seconds;
  const label = isSending ? 'Handing in' : isAway ? 'Keep and go on' : 'Hand in answer';

  return (
    <RunnerFrame state={state} seconds={total} headingRef={heading} notes={notes}>
      <form ref={form} onSubmit={submit} noValidate aria-label={`Question ${state.place + 1}`}>
        <Sheet>
          <SubjectRow item={item} />
          <ExamQuestion
            question={item.question}
            number={state.place + 1}
            lang={subjectLang(item.subject)}
            renderAnswer={(part, index) => (
              <AnswerField
                part={part}
                index={index}
                isOnly={parts.length === 1}
                lang={subjectLang(item.subject)}
                value={draft.responses[index] ?? ''}
                isDisabled={isSending}
                onChange={(text) =>
                  change({ responses: parts.map((_, at) => (at === index ? text : (draft.responses[at] ?? ''))) })
                }
              />
            )}
          />
          <SheetRow hasRule>
            <div className="py-5 grid grid-cols-1 md:grid-cols-[minmax(0,1fr)_auto] gap-4 md:gap-8 md:items-end">
              <HowSureChoice
                value={draft.howSure}
                error={error}
                isDisabled={isSending}
                onChange={(howSure) => {
                  setError(null);
                  change({ howSure });
                }}
              />
              <button className="btn big max-md:w-full md:!min-h-[62px]" type="submit" disabled={isSending}>
                {label}
              </button>
            </div>
          </SheetRow>
        </Sheet>
        <p className="hint mt-3 px-5 md:px-0 md:pl-[7.5rem]">{footWords(isAway, total >= state.set.budgetSeconds)}</p>
      </form>
    </RunnerFrame>
  );
}
