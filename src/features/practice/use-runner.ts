import { useEffect, useMemo, useState } from 'react';
import type { SetDto, SetSummaryDto } from '#shared/schemas/practice.ts';
import { kept, useKeeping } from '#src/lib/kept.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { stampNow } from './answer-queue.ts';
import { type Draft, draftsOf } from './drafts.ts';
import { answeredIn, nextPlaceIn, secondsIn } from './stage.ts';
import { type Refusal, useAnswerQueue } from './use-answer-queue.ts';

export interface RunnerProps {
  userId: string;
  set: SetDto;
  /** Number of the question asked for in the address, from 1; null for the first one open. */
  wanted: number | null;
  onPlace: (number: number) => void;
  /** Reads the set again. */
  onReload: () => void;
  finish: () => Promise<SetSummaryDto>;
  onFinished: (summary: SetSummaryDto) => void;
}

export type FinishedAnswer = Pick<Draft, 'responses' | 'seconds'> & { howSure: NonNullable<Draft['howSure']> };

/** Ending a set, with what to say when that fails. */
function useEnd(finish: RunnerProps['finish'], onFinished: RunnerProps['onFinished']) {
  const [failure, setFailure] = useState<string | null>(null);
  const [isEnding, setIsEnding] = useState(false);
  const end = () => {
    setIsEnding(true);
    setFailure(null);
    finish().then(onFinished, (error: unknown) => {
      setFailure(problemWords(error));
      setIsEnding(false);
    });
  };
  return { failure, isEnding, end };
}

/** Where a set stands, and every act on it. */
export function useRunner({ userId, set, wanted, onPlace, onReload, finish, onFinished }: RunnerProps) {
  const drafts = useMemo(() => draftsOf(kept, userId, set.id), [userId, set.id]);
  const [refusal, setRefusal] = useState<{ itemId: string; words: string; count: number } | null>(null);
  const [passedIds, setPassedIds] = useState<string[]>([]);
  const [freshId, setFreshId] = useState<string | null>(null);
  const ending = useEnd(finish, onFinished);

  const giveBack = ({ entry, words }: Refusal) => {
    const { setItemId, body } = entry;
    if (entry.kind === 'answer') {
      const { responses, howSure, seconds } = entry.body;
      drafts.write(setItemId, { responses, howSure, seconds });
    } else if ('ticks' in body) {
      drafts.write(setItemId, { responses: [], howSure: null, seconds: 0, ticks: body.ticks });
    }
    setRefusal((last) => ({ itemId: setItemId, words, count: (last?.count ?? 0) + 1 }));
    onReload();
  };
  const { waiting, away, add } = useAnswerQueue(userId, set.id, { onRefused: giveBack, onSentElsewhere: onReload });
  const keeping = useKeeping();

  const answeredIds = useMemo(() => answeredIn(set, waiting), [set, waiting]);
  const nextPlace = nextPlaceIn(set, waiting);
  const wantedItem = wanted === null ? undefined : set.items[wanted - 1];
  const isWantedOpen = wantedItem !== undefined && (answeredIds.has(wantedItem.id) || wanted === nextPlace + 1);
  const place = isWantedOpen && wanted !== null ? wanted - 1 : nextPlace;
  const item = set.items[place] ?? null;
  const entry = waiting.find(({ setItemId }) => setItemId === item?.id) ?? null;

  // Keeps the address at the question shown, so that a reload comes back to it.
  useEffect(() => {
    if (place >= 0 && wanted !== place + 1) onPlace(place + 1);
  }, [place, wanted, onPlace]);

  const goOn = (from: string | null, to: number) => {
    if (from !== null && away) setPassedIds((ids) => [...ids, from]);
    onPlace(to + 1);
  };
  const handIn = (answer: FinishedAnswer) => {
    if (!item) return;
    setRefusal(null);
    setFreshId(item.id);
    const body = { id: crypto.randomUUID(), setItemId: item.id, ...answer };
    const after = nextPlaceIn({ ...set, secondsSoFar: set.secondsSoFar + answer.seconds }, waiting, item.id);
    add({ kind: 'answer', setItemId: item.id, body, stamp: stampNow() });
    drafts.remove(item.id);
    if (away && after >= 0) goOn(item.id, after);
  };
  const saveTicks = (ticks: boolean[][]) => {
    if (!item?.result) return;
    setRefusal(null);
    setFreshId(item.id);
    const { answerId } = item.result;
    add({ kind: 'selfMark', setItemId: item.id, body: { id: crypto.randomUUID(), answerId, ticks } });
    drafts.remove(item.id);
  };

  return {
    ...ending,
    drafts,
    refusal: refusal && refusal.itemId === item?.id ? refusal : null,
    passedIds,
    isFresh: item !== null && freshId === item.id,
    waiting,
    away,
    keeping,
    answeredIds,
    secondsBefore: secondsIn(set, waiting),
    nextPlace,
    place,
    item,
    entry,
    goOn,
    handIn,
    saveTicks,
  };
}
export type RunnerControl = ReturnType<typeof useRunner>;
