import type { MyTopicDto } from '#shared/schemas/my-topics.ts';
import { dayMonthWords, returnWords } from '#src/lib/dates.ts';
import { rangeWords } from './topic-words.ts';

/** A dash that is read as words. */
function Dash({ words }: { words: string }) {
  return (
    <span className="font-normal text-ink-3">
      <span aria-hidden="true">–</span>
      <span className="sr-only">{words}</span>
    </span>
  );
}

/** Expected recall as a figure, or a dash. */
export function RecallFigure({ percent }: { percent: number | null }) {
  return percent === null ? <Dash words="no figure yet" /> : <>{percent}%</>;
}

/** What it is probably within, or a dash. */
export function RecallRange({ range }: { range: MyTopicDto['range'] }) {
  return range ? rangeWords(range) : <Dash words="no range yet" />;
}

/** When it comes back; what is due stands out. */
export function ComesBack({ topic, today }: { topic: MyTopicDto; today: string }) {
  if (!topic.isTaught) {
    return (
      <span className="text-ink-2">
        {topic.notBefore ? `Not before ${returnWords(topic.notBefore, today)}` : 'Not taught yet'}
      </span>
    );
  }
  if (!topic.returnsOn)
    return <span className="text-ink-2">{topic.questions === 0 ? 'No questions yet' : 'In a coming set'}</span>;
  const words = returnWords(topic.returnsOn, today);
  return words === 'Today' ? (
    <span className="font-semibold text-accent">{words}</span>
  ) : (
    <span className="text-ink-2">{words}</span>
  );
}

/** The next paper that asks the topic, by its day. */
export function PaperDay({ topic }: { topic: MyTopicDto }) {
  if (!topic.nextPaper) return <Dash words="no date yet" />;
  return (
    <span title={topic.nextPaper.title}>
      <span className="sr-only">{topic.nextPaper.title}, </span>
      {dayMonthWords(topic.nextPaper.on)}
    </span>
  );
}
