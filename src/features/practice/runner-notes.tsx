import type { ReactNode } from 'react';
import type { Keeping } from '#src/lib/kept-store.ts';
import { keptUntilSent } from './kept-words.ts';
import type { Away } from './use-answer-queue.ts';

const numbers = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine', 'Ten'];

const listWords = (places: number[]): string =>
  places.length < 2 ? places.join('') : `${places.slice(0, -1).join(', ')} and ${places.at(-1)}`;

function waitingWords(places: number[]): string {
  if (places.length === 0) return '';
  const count = numbers[places.length] ?? String(places.length);
  return places.length === 1
    ? ` One is waiting: question ${places[0]}.`
    : ` ${count} are waiting: questions ${listWords(places)}.`;
}

function Note({ tone, children }: { tone: 'cau' | 'gap' | ''; children: ReactNode }) {
  return <div className={`note ${tone} mx-5 md:mx-0 mb-4`}>{children}</div>;
}

interface RunnerNotesProps {
  away: Away;
  keeping: Keeping;
  /** Numbers of the questions whose answers wait on this device. */
  waiting: number[];
  /** Questions passed over while offline that are marked now. */
  marked: { number: number; onOpen: () => void }[];
  /** Why the server did not take an answer. */
  refusal: string | null;
  /** The answer shown was given elsewhere. */
  isAlready: boolean;
}

/** What there is to know beside the question, read out as it changes. */
export function RunnerNotes({ away, keeping, waiting, marked, refusal, isAlready }: RunnerNotesProps) {
  return (
    <div role="status">
      {away ? (
        <Note tone="cau">
          <p>
            <b>{away === 'offline' ? 'You are offline.' : 'Plait is busy.'}</b>{' '}
            {keptUntilSent('Your answers are', keeping, away)}
            {waitingWords(waiting)}
          </p>
        </Note>
      ) : null}
      {!away && keeping === 'page' ? (
        <Note tone="cau">
          <p>
            <b>This browser stores nothing.</b> What you type is only on this page: hand it in before you leave or
            reload it.
          </p>
        </Note>
      ) : null}
      {!away && marked.length > 0 ? (
        <Note tone="">
          <p className="flex flex-wrap gap-x-3">
            <span>
              <b>You are back.</b> Your answers are saved and marked.
            </span>
            {marked.map(({ number, onOpen }) => (
              <button key={number} type="button" className="link" onClick={onOpen}>
                See question {number}
              </button>
            ))}
          </p>
        </Note>
      ) : null}
      {refusal ? (
        <Note tone="gap">
          <p>
            <b>That answer was not taken.</b> {refusal} What you wrote is still here.
          </p>
        </Note>
      ) : null}
      {isAlready ? (
        <Note tone="cau">
          <p>
            <b>You had already answered this question</b> in another tab or on another device. That answer counts, and
            it is the one shown.
          </p>
        </Note>
      ) : null}
    </div>
  );
}
