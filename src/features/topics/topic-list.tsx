import { standingWords } from '#shared/schemas/practice.ts';
import { RecallBar } from '#src/components/recall-bar.tsx';
import { StrandLabel } from '#src/components/strand-label.tsx';
import { Tally } from '#src/components/tally.tsx';
import type { TopicGroup } from './group-topics.ts';
import { ComesBack, RecallFigure } from './topic-cells.tsx';
import { useShownRows } from './use-shown-rows.ts';

function Group({ group, today }: { group: TopicGroup; today: string }) {
  const { shown, hiddenCount, showAll } = useShownRows(group.topics);
  const words = standingWords[group.standing];
  return (
    <section aria-labelledby={`list-${group.standing}`}>
      <h2
        id={`list-${group.standing}`}
        className="flex items-baseline gap-2 pt-5 pb-1.5 border-b-[1.5px] border-ink !text-[1.1875rem]"
      >
        <span aria-hidden="true">
          <Tally standing={group.standing} />
        </span>
        <span>{words}</span>
        <span className="ml-auto text-sm text-ink-2 font-normal num font-text tracking-normal">
          {hiddenCount > 0 ? `${shown.length} of ${group.topics.length}` : group.topics.length}
        </span>
      </h2>
      <ul>
        {shown.map((topic) => (
          <li
            key={topic.topic.id}
            className="grid grid-cols-[28px_minmax(0,1fr)_auto] gap-x-3 items-center py-2.5 border-b border-rule"
          >
            <StrandLabel subject={topic.subject} />
            <span className="font-semibold [overflow-wrap:anywhere]">
              <span className="sr-only">{topic.subject.name}, </span>
              {topic.topic.title}
            </span>
            <span className="font-bold num text-right">
              <RecallFigure percent={topic.recallOnDay} />
            </span>
            <span />
            <span>
              <RecallBar value={topic.recallOnDay} standing={topic.standing} width={200} />
            </span>
            <span className="text-sm num text-right">
              <ComesBack topic={topic} today={today} />
            </span>
          </li>
        ))}
      </ul>
      {hiddenCount > 0 ? (
        <button type="button" className="link text-sm min-h-11" onClick={showAll}>
          Show the other {hiddenCount}
          <span className="sr-only"> {words.toLowerCase()} topics</span>
        </button>
      ) : null}
    </section>
  );
}

/** All topics with their standing, on a phone. */
export function TopicList({ groups, today }: { groups: TopicGroup[]; today: string }) {
  return groups.map((group) => <Group key={group.standing} group={group} today={today} />);
}
