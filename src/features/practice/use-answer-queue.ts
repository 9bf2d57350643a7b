import { notifyManager } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState, useSyncExternalStore } from 'react';
import { isTransient, NetworkError, ProblemError } from '#src/lib/api.ts';
import { kept, onGoneElsewhere } from '#src/lib/kept.ts';
import { isSignedOut, noticeSignedOut } from '#src/lib/query-client.ts';
import { checkSignedInAs } from '#src/queries/me.ts';
import { handIn, saveSelfMark } from '#src/queries/sets.ts';
import { AnswerQueue, ageOf, type Waiting } from './answer-queue.ts';

const FIRST_WAIT_MS = 1000;
const LONGEST_WAIT_MS = 30_000;

/** Why answers wait: no connection, or a server that has no time. Null while they go through. */
export type Away = 'offline' | 'busy' | null;

export interface Refusal {
  entry: Waiting;
  words: string;
}

interface QueueNews {
  /** The server refused an answer for good. */
  onRefused: (refusal: Refusal) => void;
  /** Another tab has sent an answer that waited here too. */
  onSentElsewhere: () => void;
}

const sendOne = (setId: string, entry: Waiting) =>
  entry.kind === 'answer'
    ? handIn(setId, { ...entry.body, ageMs: ageOf(entry.stamp) })
    : saveSelfMark(setId, entry.body);

/**
 * Takes an entry off the queue after the page has heard of its result. Queries tell their news a moment
 * later; in between, the question would look as if it had never been answered.
 */
const removeOnceShown = (queue: AnswerQueue, id: string): Promise<void> =>
  new Promise((resolve) => {
    notifyManager.schedule(() => {
      queue.remove(id);
      resolve();
    });
  });

const waitAfter = (error: unknown, failures: number): number => {
  const asked = error instanceof ProblemError ? (error.retryAfterSeconds ?? 0) * 1000 : 0;
  return Math.max(asked, Math.min(FIRST_WAIT_MS * 2 ** failures, LONGEST_WAIT_MS));
};

/**
 * Sends what was handed in, one after another and oldest first, and tries again with growing waits and
 * when the connection returns.
 */
export function useAnswerQueue(userId: string, setId: string, news: QueueNews) {
  const queue = useMemo(() => new AnswerQueue(kept, userId, setId), [userId, setId]);
  const waiting = useSyncExternalStore(queue.subscribe, queue.waiting);
  const [away, setAway] = useState<Away>(null);
  const isStopped = useRef(false);
  const isSending = useRef(false);
  const failures = useRef(0);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const told = useRef(news);
  useEffect(() => {
    told.current = news;
  });

  const drain = useCallback(async () => {
    if (isSending.current || isStopped.current) return;
    isSending.current = true;
    clearTimeout(timer.current);
    try {
      for (let entry = queue.waiting()[0]; entry; entry = queue.waiting()[0]) {
        try {
          await sendOne(setId, entry);
        } catch (error) {
          if (isSignedOut(error) || isTransient(error)) throw error;
          // Refused because another person's session sent it: then it waits for its owner.
          await checkSignedInAs(userId);
          // Nobody would hear of it here any more: the page that is there now sends it again and says so.
          if (isStopped.current) return;
          told.current.onRefused({
            entry,
            words: error instanceof ProblemError ? error.detail : 'The server did not take it.',
          });
        }
        await removeOnceShown(queue, entry.body.id);
        failures.current = 0;
        setAway(null);
        if (isStopped.current) return;
      }
    } catch (error) {
      if (isSignedOut(error)) queue.keep();
      noticeSignedOut(error);
      if (isStopped.current) return;
      if (isTransient(error)) setAway(error instanceof NetworkError ? 'offline' : 'busy');
      timer.current = setTimeout(() => void drain(), waitAfter(error, failures.current));
      failures.current += 1;
    } finally {
      isSending.current = false;
    }
  }, [queue, setId, userId]);

  useEffect(() => {
    const retry = () => {
      failures.current = 0;
      void drain();
    };
    const leave = () => setAway('offline');
    const back = () => {
      if (queue.waiting().length === 0) setAway(null);
      retry();
    };
    isStopped.current = false;
    retry();
    window.addEventListener('online', back);
    window.addEventListener('offline', leave);
    return () => {
      isStopped.current = true;
      clearTimeout(timer.current);
      window.removeEventListener('online', back);
      window.removeEventListener('offline', leave);
    };
  }, [drain, queue]);

  useEffect(
    () =>
      onGoneElsewhere((key) => {
        if (key.startsWith(queue.prefix)) told.current.onSentElsewhere();
      }),
    [queue],
  );

  const add = useCallback(
    (entry: Waiting) => {
      queue.add(entry);
      void drain();
    },
    [queue, drain],
  );
  return { waiting, away, add };
}
