import type { SubjectDto, TopicDto } from '#shared/schemas/curriculum.ts';
import { MergeButton } from './merge-button.tsx';
import { MergeDialog } from './merge-dialog.tsx';
import { TaughtField } from './taught-field.tsx';
import { indent, QuestionCount, Title } from './topic-cells.tsx';
import { TopicRow } from './topic-row.tsx';
import { orderTopics } from './topic-tree.ts';
import { useMerging } from './use-merging.ts';

export interface TopicListProps {
  subject: SubjectDto;
  specification: SubjectDto['specifications'][number];
  topics: TopicDto[];
}

/** The topics of one specification: a table at a desk, a list on a phone. */
export function TopicList({ subject, specification, topics }: TopicListProps) {
  const nodes = orderTopics(topics);
  const { from, ask, ...merging } = useMerging(specification.id);
  const canMerge = subject.can.manageTopics;
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
              {canMerge ? (
                <th scope="col" className="w-20">
                  <span className="sr-only">Merge</span>
                </th>
              ) : null}
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
              <TopicRow key={node.topic.id} {...{ subject, specification, topics, classes, node, ask }} />
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
            {canMerge ? <MergeButton {...{ topic, topics, ask }} /> : null}
          </li>
        ))}
      </ul>
      {from ? <MergeDialog {...{ subject, specification, topics, from, ...merging }} /> : null}
    </>
  );
}
