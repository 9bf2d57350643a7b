import { MergeButton, type MergeButtonProps } from './merge-button.tsx';
import { TaughtField } from './taught-field.tsx';
import { indent, QuestionCount, Title } from './topic-cells.tsx';
import type { TopicListProps } from './topic-list.tsx';
import type { TopicNode } from './topic-tree.ts';

interface TopicRowProps extends TopicListProps, Pick<MergeButtonProps, 'ask'> {
  classes: (readonly [string, string])[];
  node: TopicNode;
}

/** A topic's row in the table of a desk. */
export function TopicRow({ subject, specification, topics, classes, node: { topic, depth }, ask }: TopicRowProps) {
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
      {subject.can.manageTopics ? (
        <td>
          <MergeButton {...{ topic, topics, ask }} />
        </td>
      ) : null}
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
