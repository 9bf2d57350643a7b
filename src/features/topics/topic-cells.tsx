import type { MyTopicDto } from '#shared/schemas/practice.ts';
import { dayMonthWords, returnWords } from '#src/lib/dates.ts';

/** Expected recall as a figure, or a dash. */
export function RecallFigure({ percent }: { percent: number | null }) {
  if (percent !== null) return <>{percent}%</>;
  return (
    <span className="font-normal text-ink-3">
      <span aria-hidden="true">–</span>
      <span className="sr-only">no figure yet</span>
    </span>
  );
}

/** When it comes back; what is due stands out. */
export function ComesBack({ topic, today }: { topic: MyTopicDto; today: string }) {
  if (!topic.isTaught) return <span className="text-ink-2">Not taught yet</span>;
  if (!topic.returnsOn)
    return <span className="text-ink-2">{topic.questions === 0 ? 'No questions yet' : 'In a coming set'}</span>;
  const words = returnWords(topic.returnsOn, today);
  return words === 'Today' ? <span className="font-semibold text-accent">{words}</span> : <span>{words}</span>;
}

/** The next paper that asks the topic, by its day. */
export function PaperDay({ topic }: { topic: MyTopicDto }) {
  if (!topic.nextPaper) return <span className="text-ink-3">–</span>;
  return (
    <span title={topic.nextPaper.title}>
      <span className="sr-only">{topic.nextPaper.title}, </span>
      {dayMonthWords(topic.nextPaper.on)}
    </span>
  );
}
