import { unsentSets } from '#src/lib/unsent.ts';
import { useAnswerQueue } from './use-answer-queue.ts';

function UnsentSet({ userId, setId }: { userId: string; setId: string }) {
  const { waiting, away } = useAnswerQueue(userId, setId, () => undefined);
  if (waiting.length === 0) return null;
  return (
    <p className="note cau mx-5 md:mx-10 mt-4">
      {away ? <b>{away === 'offline' ? 'You are offline. ' : 'Plait is busy. '}</b> : null}
      {waiting.length === 1 ? 'One answer is' : `${waiting.length} answers are`} kept on this device and sent when you
      are back.
    </p>
  );
}

/** Answers left behind by a set that is no longer on the page: sent from wherever the student is now. */
export function UnsentAnswers({ userId }: { userId: string }) {
  return (
    <div role="status">
      {unsentSets(userId).map((setId) => (
        <UnsentSet key={setId} userId={userId} setId={setId} />
      ))}
    </div>
  );
}
