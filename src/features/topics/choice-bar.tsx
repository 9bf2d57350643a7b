import { MOST_CHOSEN_TOPICS } from '#shared/schemas/set-kind.ts';
import { mixWords, topicCount } from './topic-words.ts';
import type { TopicChoice } from './use-topic-choice.ts';

/** The set that the ticked topics would make, in sight for as long as the topics are. */
export function ChoiceBar({ choice }: { choice: TopicChoice }) {
  const count = choice.ids.size;
  return (
    <div
      className={
        count === 0
          ? ''
          : 'sticky z-10 bottom-[calc(61px+env(safe-area-inset-bottom))] md:bottom-0 max-md:-mx-5 max-md:px-5 mt-4 py-3 bg-ground border-t-[1.5px] border-ink flex flex-wrap items-center justify-between gap-x-6 gap-y-2'
      }
    >
      <p role="status" className="text-ink-2 min-w-0 max-md:text-sm">
        {count === 0 ? null : (
          <>
            <b className="text-ink num">{topicCount(count)}.</b> {mixWords(count)}
            {choice.isFull ? ` ${MOST_CHOSEN_TOPICS} is the most for one set.` : null}
          </>
        )}
      </p>
      {count === 0 ? null : (
        <div className="flex items-center gap-4 max-sm:w-full">
          <button type="button" className="link min-h-11" onClick={choice.clear}>
            Clear
          </button>
          <button type="submit" className="btn max-sm:flex-1">
            Practise {topicCount(count)}
          </button>
        </div>
      )}
    </div>
  );
}
