import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { TopicDto } from '#shared/schemas/curriculum.ts';
import { tierWords } from '#src/lib/question-words.ts';

/** How far a topic stands in, by its depth. */
export const indent = ['', 'pl-5', 'pl-10', 'pl-14'];

/** Live questions of a topic, with the way to them. */
export function QuestionCount({ subjectId, topic }: { subjectId: string; topic: TopicDto }) {
  if (topic.liveQuestions === 0) return <span className="text-ink-2">0</span>;
  return (
    <Link className="link" to={`/questions?subject=${subjectId}&topic=${topic.id}&status=live`}>
      {topic.liveQuestions}
      <span className="sr-only"> live in {topic.title}</span>
    </Link>
  );
}

/** A topic's title with its tier and option. */
export const Title = ({ topic }: { topic: TopicDto }): ReactNode => (
  <>
    {topic.title} {topic.tier ? <span className="tag">{tierWords[topic.tier]}</span> : null}{' '}
    {topic.option ? <span className="tag !whitespace-normal">{topic.option}</span> : null}
  </>
);
