import { useState } from 'react';
import { Link } from 'react-router-dom';
import { useKeeping } from '#src/lib/kept.ts';
import { unsentSets } from '#src/lib/unsent.ts';
import { forgetOverviews } from '#src/queries/practice.ts';
import { keptUntilSent } from './kept-words.ts';
import { dropRefused, keepRefused, useRefused } from './refused-answers.ts';
import { useAnswerQueue } from './use-answer-queue.ts';

function UnsentSet({ userId, setId }: { userId: string; setId: string }) {
  const keeping = useKeeping();
  const { waiting, away } = useAnswerQueue(userId, setId, {
    onRefused: (refusal) => keepRefused(userId, setId, refusal),
    onSentElsewhere: forgetOverviews,
  });
  if (waiting.length === 0) return null;
  const what = waiting.length === 1 ? 'One answer is' : `${waiting.length} answers are`;
  return (
    <p className="note cau mx-5 md:mx-10 mt-4">
      {away ? <b>{away === 'offline' ? 'You are offline. ' : 'Plait is busy. '}</b> : null}
      {keptUntilSent(what, keeping, away ?? 'offline')}
    </p>
  );
}

function RefusedAnswers({ userId }: { userId: string }) {
  return useRefused(userId).map(({ key, setId, words, responses }) => {
    const wrote = responses.filter((text) => text.trim() !== '').join(' … ');
    return (
      <div key={key} className="note gap mx-5 md:mx-10 mt-4">
        <p className="[overflow-wrap:anywhere]">
          <b>{responses.length > 0 ? 'An answer was not taken.' : 'Your own ticks for a question were not taken.'}</b>{' '}
          {words} {wrote ? `You wrote: “${wrote}”.` : null}
        </p>
        <p className="flex flex-wrap gap-x-4">
          <Link className="link inline-flex min-h-11 items-center" to={`/sets/${setId}`}>
            Open the set
          </Link>
          <button type="button" className="link min-h-11" onClick={() => dropRefused(key)}>
            Put this note away
          </button>
        </p>
      </div>
    );
  });
}

/** Answers left behind by a set that is no longer on the page: sent from wherever the student is now. */
export function UnsentAnswers({ userId }: { userId: string }) {
  // Those of one start: a queue stays until it has heard of its last answer.
  const [setIds] = useState(() => unsentSets(userId));
  return (
    <div role="status">
      {setIds.map((setId) => (
        <UnsentSet key={setId} userId={userId} setId={setId} />
      ))}
      <RefusedAnswers userId={userId} />
    </div>
  );
}
