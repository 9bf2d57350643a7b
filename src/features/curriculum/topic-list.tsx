import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { tierWords } from '#src/lib/question-words.ts';
import { TaughtField } from './taught-field.tsx';
import { orderTopics, type TopicNode } from './topic-tree.ts';

interface TopicListProps {
  subject: SubjectDto;
  specification: SubjectDto['specifications'][number];
  topics: TopicDto[];
}

const indent = ['', 'pl-5', 'pl-10', 'pl-14'];

function QuestionCount({ subjectId, topic }: { subjectId: string; topic: TopicDto }) {
  if (topic.liveQuestions === 0) return <span className="text-ink-2">0</span>;
  return (
    <Link className="link" to={`/questions?subject=${subjectId}&topic=${topic.id}&status=live`}>
      {topic.liveQuestions}
      <span className="sr-only"> live in {topic.title}</span>
    </Link>
  );
}

const Title = ({ topic }: { topic: TopicDto }): ReactNode => (
  <>
    {topic.title} {topic.tier ? <span className="tag">{tierWords[topic.tier]}</span> : null}{' '}
    {topic.option ? <span className="tag !whitespace-normal">{topic.option}</span> : null}
  </>
);

/** The topics of one specification: a table at a desk, a list on a phone. */
export function TopicList({ subject, specification, topics }: TopicListProps) {
  const nodes = orderTopics(topics);
  const classes = [
    ...new Map(topics.flatMap((topic) => topic.taught.map((row) => [row.classId, row.className] as const))),
  ];
  return (
    <>
      <div className="relative hidden overflow-x-auto lg:block">
        <table className="tbl">
          <caption className="sr-only">Topics of {specification.name}</caption>
          <thead>
            <tr>
              <th scope="col" className="w-14">
                No.
              </th>
              {/* The names stay in sight while the classes scroll past them. */}
              <th scope="col" className="sticky left-0 z-1 min-w-48 bg-ground">
                Topic
              </th>
              {specification.papers.map((paper) => (
                <th key={paper.id} scope="col" className="r">
                  {paper.title}
                  <span className="block text-xs font-normal">of {paper.marks} marks</span>
                </th>
              ))}
              <th scope="col" className="r">
                Live
              </th>
              {classes.map(([id, name]) => (
                <th key={id} scope="col" className="w-36">
                  {name}
                  <span className="block text-xs font-normal">taught on</span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {nodes.map((node) => (
              <TopicRow key={node.topic.id} {...{ subject, specification, classes, node }} />
            ))}
          </tbody>
        </table>
      </div>
      <ul className="border-t-[1.5px] border-ink lg:hidden">
        {nodes.map(({ topic, depth }) => (
          <li key={topic.id} className={`border-b border-rule py-3 ${indent[Math.min(depth, 1)]}`}>
            <p className={depth === 0 ? 'font-semibold' : ''}>
              <span className="num text-ink-2">{topic.number}</span> <Title topic={topic} />
            </p>
            <p className="num text-sm text-ink-2">
              {topic.weights.length > 0
                ? `${topic.weights.map((weight) => `${weight.paperTitle}: ${weight.marks} marks`).join(', ')}. `
                : ''}
              Live questions: <QuestionCount subjectId={subject.id} topic={topic} />
            </p>
            {topic.taught.length > 0 ? (
              <div className="mt-2 grid grid-cols-2 gap-x-3 sm:grid-cols-3">
                {topic.taught.map((row) => (
                  <TaughtField key={row.classId} subjectId={subject.id} topic={topic} row={row} hasLabel />
                ))}
              </div>
            ) : null}
          </li>
        ))}
      </ul>
    </>
  );
}

interface TopicRowProps extends Pick<TopicListProps, 'subject' | 'specification'> {
  classes: (readonly [string, string])[];
  node: TopicNode;
}

function TopicRow({ subject, specification, classes, node: { topic, depth } }: TopicRowProps) {
  return (
    <tr>
      <td className="text-ink-2">{topic.number}</td>
      <th
        scope="row"
        className={`sticky left-0 z-1 bg-ground !border-b !border-rule !text-ink !text-[.875rem] !align-middle ${depth === 0 ? '' : '!font-normal'}`}
      >
        <span className={`block ${indent[Math.min(depth, 3)]}`}>
          <Title topic={topic} />
        </span>
      </th>
      {specification.papers.map((paper) => (
        <td key={paper.id} className="r">
          {topic.weights.find((weight) => weight.paperId === paper.id)?.marks ?? <span className="text-ink-3">–</span>}
        </td>
      ))}
      <td className="r font-bold">
        <QuestionCount subjectId={subject.id} topic={topic} />
      </td>
      {classes.map(([id]) => {
        const row = topic.taught.find((one) => one.classId === id);
        return (
          <td key={id}>
            {row ? <TaughtField subjectId={subject.id} topic={topic} row={row} hasLabel={false} /> : null}
          </td>
        );
      })}
    </tr>
  );
}
